import { expect, it } from 'vitest';

import { forceDecimals, formatForce, formatMoment, formatShare, formatSteelRatio } from './force.ts';

it('takes the decimals of a column from its largest value', () => {
  expect(forceDecimals([12, -100, 3])).toBe(1);
  expect(forceDecimals([12, -100.5, 3])).toBe(0);
});

it('prints by the rules of each quantity', () => {
  expect(formatForce(1394.94)).toBe('1,394.9');
  expect(formatForce(-73.6, 0)).toBe('−74');
  expect(formatMoment(26853.7)).toBe('26,854');
  expect(formatShare(0.2814)).toBe('28.1 %');
  expect(formatSteelRatio(0.0025)).toBe('0.0025');
});
