import type { Basis } from '../engineering/input.ts';
import type { CurveStyle } from './heightDiagramTypes.ts';

/** Bases by line style, never by color, the same on every page. */
export const basisStyles: Readonly<Record<Basis, CurveStyle>> = {
  rigid: 'solid',
  flexible: 'dashed',
  compatible: 'dotted',
};

/** Order in which bases stand side by side. */
export const basisOrder: readonly Basis[] = ['rigid', 'flexible', 'compatible'];
