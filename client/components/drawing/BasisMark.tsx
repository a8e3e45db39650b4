import type { ReactElement } from 'react';

import { basisMark } from '#shared/drawing/drawSpread';
import type { Basis } from '#shared/engineering/input';

import { DrawingSvg } from './DrawingSvg.tsx';

/** The sign of a basis under its name: upright stroke, circle, cross. */
export const BasisMark = ({ basis }: { basis: Basis }): ReactElement => (
  <span className="inline-block align-[-2px]" aria-hidden="true">
    <DrawingSvg drawing={{ width: 12, height: 14, elements: [basisMark(basis, 6, 7)] }} />
  </span>
);
