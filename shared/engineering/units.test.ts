import { expect, it } from 'vitest';

import { headerUnits, unitFactors } from './units.ts';

/** By hand from 1 ft = 0.3048 m and 1 lbf = 4.4482216152605 N. */
it('24 kN/m3 is 152.78 pcf; 1 psf is 47.88 Pa; 1 pcf is 157.09 N/m3', () => {
  expect(24 * unitFactors.si.density).toBeCloseTo(24000 / (4.4482216152605 / 0.028316846592), 9);
  expect(headerUnits.psf?.inBase).toBeCloseTo(4.4482216152605 / 0.09290304, 9);
  expect(headerUnits.pcf?.inBase).toBeCloseTo(4.4482216152605 / 0.028316846592, 9);
});
