import fc from 'fast-check';
import { expect, it } from 'vitest';

import { formatRatio, isOver } from './ratio.ts';

it('rounds up in hundredths, after the tolerance of the verdict', () => {
  expect(formatRatio(1.003)).toBe('1.01');
  expect(formatRatio(1.0000000005)).toBe('1.00');
  expect(formatRatio(0.981)).toBe('0.99');
  expect(formatRatio(0.57)).toBe('0.57');
  expect(formatRatio(0)).toBe('0.00');
});

it('is over beyond the tolerance, and where nothing resists', () => {
  expect(isOver(1.0000000005)).toBe(false);
  expect(isOver(1.000000002)).toBe(true);
  expect(isOver(null)).toBe(true);
});

it('never prints a ratio that is over as 1.00 or less, nor one that is within as more', () => {
  fc.assert(
    fc.property(fc.double({ min: 0, max: 3, noNaN: true }), (ratio) => {
      expect(Number(formatRatio(ratio)) > 1).toBe(isOver(ratio));
    }),
  );
});
