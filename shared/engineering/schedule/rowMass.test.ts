import { expect, it } from 'vitest';

import { findBar } from '../wall-design/bars.ts';

import { tieMass, verticalMass } from './rowMass.ts';

/** A 120 in wall, one story of 120 in: 8 No. 9 an end at 3.4 lb/ft, 6 places of two No. 5 at 1.043 lb/ft between them. */
it('vertical bars of both ends and the web by hand', () => {
  const ends = { bar: findBar('us', 9), count: 8, lengthIn: 24 };
  const bars = { curtains: 2 as const, web: findBar('us', 5), webSpacingIn: 12, edgeIn: 3, ends };
  const lb = verticalMass(bars, 120, [120], { webIn: 24, endsIn: 60 });
  expect(lb).toBeCloseTo(16 * 3.4 * 15 + 12 * 1.043 * 12, 9);
});

it('ties of both ends: No. 4 at 8 in over 120 in is 15 sets an end, hoop 24 - 1 by 12 - 2 in, one inner leg, hooks 2 x 3 in', () => {
  const ties = { bar: findBar('us', 4), spacingIn: 8, legsAcross: 3 };
  const inches = 2 * (23 + 10) + 6 + (10 + 6);
  expect(tieMass(ties, 24, 12, 1, [120])).toBeCloseTo((30 * inches * 0.668) / 12, 9);
});
