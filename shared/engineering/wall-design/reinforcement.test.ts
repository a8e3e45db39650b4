import { describe, expect, it } from 'vitest';

import { findBar } from './bars.ts';
import { designContext } from './designContext.ts';
import { compressionZones, sectionOf, strengthOf } from './reinforcement.ts';
import { usSettings } from './testing/inventedWall.ts';

const context = designContext(usSettings);
const bars = {
  curtains: 2 as const,
  web: findBar('us', 5),
  webSpacingIn: 12,
  edgeIn: 3,
  ends: { bar: findBar('us', 9), count: 8, lengthIn: 24 },
};
const concrete = { lengthIn: 120, thicknessIn: 12, fcPsi: 5000 };

/** 11.7.4.1 as engineering.md section 6 takes it: bars in compression count only where ties hold them, and ties stand around end zones only. */
describe('bars that count in compression', () => {
  it('end bars where tied, web bars never', () => {
    expect(compressionZones(bars, true)).toEqual({ web: false, ends: true });
    expect(compressionZones(bars, false)).toEqual({ web: false, ends: false });
    expect(compressionZones({ ends: null }, true)).toEqual({ web: false, ends: false });
  });
  it('Po by hand: tied end bars 16 in2 carry 60 ksi in place of concrete, the 6 x 0.62 in2 of the web nothing', () => {
    // 0.85 x 5 x 1,440 = 6,120 kip; 16 x (60 - 4.25) = 892 kip; 0.65 x 0.80
    const at = (tied: boolean) => strengthOf(sectionOf(bars, concrete, compressionZones(bars, tied), context), context);
    const [tied, untied] = [0.52 * (6120 + 892), 0.52 * 6120];
    expect(at(true)(tied - 0.01)).not.toBeNull();
    expect(at(true)(tied + 0.01)).toBeNull();
    expect(at(false)(untied - 0.01)).not.toBeNull();
    expect(at(false)(untied + 0.01)).toBeNull();
  });
  it('all bars count in tension, tied or not: 0.90 x 60 x (16 + 6 x 0.62) kip', () => {
    const strength = strengthOf(sectionOf(bars, concrete, compressionZones(bars, false), context), context);
    const limit = -54 * (16 + 6 * 0.62);
    expect(strength(limit + 0.01)).not.toBeNull();
    expect(strength(limit - 0.01)).toBeNull();
  });
});
