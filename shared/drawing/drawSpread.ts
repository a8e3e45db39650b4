import type { Basis } from '../engineering/input.ts';
import type { Drawing, DrawingElement } from './elements.ts';
import { round2 } from './round2.ts';

export interface SpreadInput {
  readonly values: readonly { readonly basis: Basis; readonly value: number }[];
  /** least and largest over all rows, zero among them: one scale for the whole table */
  readonly least: number;
  readonly most: number;
  readonly width?: number;
}

const height = 20;
const middle = height / 2;
const side = 7;

/** The mark of a basis around a point: upright stroke, circle, cross. */
export function basisMark(basis: Basis, x: number, y: number): DrawingElement {
  if (basis === 'rigid') return { shape: 'line', x1: x, y1: y - 6, x2: x, y2: y + 6, stroke: 'ink', strokeWidth: 2.5 };
  if (basis === 'flexible')
    return { shape: 'circle', cx: x, cy: y, r: 4, fill: 'sheet', stroke: 'ink', strokeWidth: 1.5 };
  const [left, right] = [round2(x - 3.5), round2(x + 3.5)];
  return {
    shape: 'path',
    d: `M${left} ${y - 3.5}L${right} ${y + 3.5}M${left} ${y + 3.5}L${right} ${y - 3.5}`,
    fill: 'none',
    stroke: 'ink',
    strokeWidth: 1.5,
  };
}

/** What the bases give one wall, on the scale of all rows: zero line, range, one mark a basis. */
export function drawSpread({ values, least, most, width = 108 }: SpreadInput): Drawing {
  const perValue = most > least ? (width - 2 * side) / (most - least) : 0;
  const xOf = (value: number): number => round2(side + (value - least) * perValue);
  const zero = Math.floor(xOf(0)) + 0.5;
  const places = values.map(({ value }) => xOf(value));
  const [from, to] = [Math.min(...places), Math.max(...places)];
  return {
    width,
    height,
    elements: [
      { shape: 'line', x1: zero, y1: 2, x2: zero, y2: height - 2, stroke: 'line', strokeWidth: 1 },
      ...(to > from
        ? [{ shape: 'line', x1: from, y1: middle, x2: to, y2: middle, stroke: 'ink', strokeWidth: 1.5 } as const]
        : []),
      ...values.map(({ basis, value }) => basisMark(basis, xOf(value), middle)),
    ],
  };
}
