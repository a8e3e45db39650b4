import fc from 'fast-check';
import { expect, it } from 'vitest';

import { formatBarLength, formatPlanLength, formatProseLength, parseProseLength } from './length.ts';

it('prints plan lengths with one decimal of a foot and two of a meter', () => {
  expect(formatPlanLength(46.5, 'us')).toBe('46.5');
  expect(formatPlanLength(14.175, 'si')).toBe('14.18');
});

it('prints bar lengths as listed in inches and whole in millimeters', () => {
  expect(formatBarLength(3.5, 'us')).toBe('3.5');
  expect(formatBarLength(0.75, 'us')).toBe('0.75');
  expect(formatBarLength(450, 'si')).toBe('450');
});

it('prints feet and inches in prose', () => {
  expect(formatProseLength(26, 'us')).toBe('26′-0″');
  expect(formatProseLength(10.875, 'us')).toBe('10′-10½″');
  expect(formatProseLength(11.999, 'us')).toBe('12′-0″');
  expect(formatProseLength(7.92, 'si')).toBe('7.92 m');
});

it('reads back every half inch and every centimeter', () => {
  fc.assert(
    fc.property(fc.integer({ min: -20_000, max: 20_000 }), (steps) => {
      expect(parseProseLength(formatProseLength(steps / 24, 'us'), 'us')).toBeCloseTo(steps / 24, 9);
      expect(parseProseLength(formatProseLength(steps / 100, 'si'), 'si')).toBeCloseTo(steps / 100, 9);
    }),
  );
});

it('refuses the other system', () => {
  expect(parseProseLength('7.92 m', 'us')).toBeNull();
  expect(parseProseLength('26′-0″', 'si')).toBeNull();
});
