import { expect, it } from 'vitest';

import { basisMark, drawSpread } from './drawSpread.ts';

it('puts every basis on the scale of the table, with its own mark', () => {
  // -20 to 80 over 100 px between the margins of 7: 1 px a unit
  const { elements } = drawSpread({
    values: [
      { basis: 'rigid', value: 40 },
      { basis: 'compatible', value: 65 },
    ],
    least: -20,
    most: 80,
    width: 114,
  });
  expect(elements).toEqual([
    expect.objectContaining({ shape: 'line', x1: 27.5, x2: 27.5 }),
    expect.objectContaining({ shape: 'line', x1: 67, x2: 92, strokeWidth: 1.5 }),
    basisMark('rigid', 67, 10),
    basisMark('compatible', 92, 10),
  ]);
});

it('draws no range where the bases agree', () => {
  const { elements } = drawSpread({ values: [{ basis: 'flexible', value: 0 }], least: 0, most: 0 });
  expect(elements.map((one) => one.shape)).toEqual(['line', 'circle']);
});
