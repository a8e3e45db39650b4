import fc from 'fast-check';
import { expect, it } from 'vitest';

import { formatAsListed, formatNumber, parseNumber } from './number.ts';

it('groups thousands, keeps the decimals asked for and draws a true minus', () => {
  expect(formatNumber(1234567.25, 1)).toBe('1,234,567.3');
  expect(formatNumber(-982, 0)).toBe('−982');
  expect(formatNumber(0, 1)).toBe('0.0');
});

it('gives no sign to what rounds to zero', () => {
  expect(formatNumber(-0.04, 1)).toBe('0.0');
  expect(formatNumber(-0.06, 1)).toBe('−0.1');
});

it('drops zeros at the end of listed lengths only', () => {
  expect(formatAsListed(3.5)).toBe('3.5');
  expect(formatAsListed(12)).toBe('12');
  expect(formatAsListed(100)).toBe('100');
  expect(formatAsListed(0.75)).toBe('0.75');
});

it('reads back what it prints, to the decimals printed', () => {
  fc.assert(
    fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: 0, max: 4 }), (whole, decimals) => {
      const value = whole / 10 ** decimals;
      expect(parseNumber(formatNumber(value, decimals))).toBeCloseTo(value, 9);
    }),
  );
});

it('reads no decimal comma and no word', () => {
  expect(parseNumber('3,5')).toBeNull();
  expect(parseNumber('1,23,456')).toBeNull();
  expect(parseNumber('twelve')).toBeNull();
  expect(parseNumber('')).toBeNull();
  expect(parseNumber('1,200.5')).toBe(1200.5);
  expect(parseNumber('.5')).toBe(0.5);
});
