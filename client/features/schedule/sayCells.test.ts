import { expect, it } from 'vitest';

import { distributedSteelRatio, sayCells } from './sayCells.ts';

it('says in words what was typed', () => {
  expect(sayCells({ vertical: { curtains: 2, bar: 5, spacing: 10 } }, 'us')).toBe('2 curtains, No. 5 at 10 in');
  expect(sayCells({ horizontal: { curtains: 1, bar: 16, spacing: 200, end: 'hook' } }, 'si')).toBe(
    '1 curtain, No. 16 at 200 mm, hooked at the ends',
  );
  expect(sayCells({ ends: { bar: 9, count: 8, length: 30 } }, 'us')).toBe('8 bars No. 9 in 30 in, each end');
  expect(sayCells({ ends: null }, 'us')).toBe('no end zone');
  expect(sayCells({ laps: { web: 16, ends: null, horizontal: 20, splice: 'lap' } }, 'us')).toBe(
    'laps: vertical 16 in, ends none, horizontal 20 in',
  );
  expect(sayCells({ laps: { web: null, ends: null, horizontal: 20, splice: 'no lap' } }, 'us')).toBe(
    'vertical bars run through the row without a lap; horizontal laps 20 in',
  );
  expect(sayCells({ laps: { web: 400, ends: null, horizontal: 500, splice: 'coupler' } }, 'si')).toBe(
    'end bars coupled; vertical laps 400 mm, horizontal laps 500 mm',
  );
});

it('takes the steel ratio over the whole thickness', () => {
  // 2 x 0.31 in2 / (10 in x 14 in)
  expect(distributedSteelRatio({ curtains: 2, bar: 5, spacing: 10 }, 14, 'us')).toBeCloseTo(0.62 / 140, 12);
  // 2 x 199 mm2 / (200 mm x 300 mm)
  expect(distributedSteelRatio({ curtains: 2, bar: 16, spacing: 200 }, 300, 'si')).toBeCloseTo(398 / 60_000, 12);
  expect(distributedSteelRatio({ curtains: 2, bar: 99, spacing: 10 }, 14, 'us')).toBeNull();
});
