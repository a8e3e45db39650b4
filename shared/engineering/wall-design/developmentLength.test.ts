import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';

import { findBar } from './bars.ts';
import { designContext } from './designContext.ts';
import { detailLimits, roundUpLength } from './detailLimits.ts';
import { classBLap, developmentLength, hookLength } from './developmentLength.ts';
import { leastTie, tieLegsAcross, tieSpacingLimit } from './endTies.ts';
import { anchoredBar, lapCell } from './rowLaps.ts';
import { materialNotices } from './materialNotices.ts';
import { usSettings } from './testing/inventedWall.ts';

const limits = detailLimits.us;
const base = {
  bar: findBar('us', 9),
  fyKsi: 60,
  fcPsi: 4900,
  lambda: 1,
  coverToCenterIn: 2,
  spacingIn: 6,
  horizontal: false,
};

describe('developmentLength', () => {
  it('No. 9 with cb 2 in: 0.075 x 60000/70/(2/1.128) x 1.128 = 40.90 in', () => {
    expect(developmentLength(base, aci31819, limits)).toBeCloseTo((4500 / 70 / (2 / 1.128)) * 1.128, 10);
  });
  it('half the spacing where it is less; psi_t, psi_s and psi_g', () => {
    expect(developmentLength({ ...base, spacingIn: 3 }, aci31819, limits)).toBeCloseTo(
      (4500 / 70 / (1.5 / 1.128)) * 1.128,
      10,
    );
    const six = { ...base, bar: findBar('us', 6), fyKsi: 80, horizontal: true };
    expect(developmentLength(six, aci31819, limits)).toBeCloseTo(((6000 * 1.3 * 0.8 * 1.15) / 70 / 2.5) * 0.75, 10);
  });
  it('is at least 12 in, 300 mm in SI; the lap 1.3 times', () => {
    const small = { ...base, bar: findBar('us', 3), fcPsi: 10000 };
    expect(developmentLength(small, aci31819, limits)).toBe(12);
    expect(developmentLength(small, aci31819, detailLimits.si)).toBeCloseTo(300 / 25.4, 12);
    expect(classBLap(small, aci31819, limits)).toBeCloseTo(15.6, 12);
  });
  it('sqrt(f`c) stops at 100 psi', () => {
    const at = (fcPsi: number): number => developmentLength({ ...base, fcPsi }, aci31819, limits);
    expect(at(14000)).toBe(at(10000));
  });
});

describe('hookLength', () => {
  it('No. 8, f`c 4,900: 60000 x 1.25 x (4900/15000 + 0.6)/(55 x 70) = 18.05 in; least 8 db and 6 in', () => {
    expect(hookLength(findBar('us', 8), 60, 4900, 1, aci31819, limits)).toBeCloseTo(
      (75000 * (4900 / 15000 + 0.6)) / 3850,
      10,
    );
    expect(hookLength(findBar('us', 3), 60, 14000, 1, aci31819, limits)).toBe(6);
  });
});

describe('roundUpLength', () => {
  it('to whole inches or 10 mm, without a step for a sliver', () => {
    expect(roundUpLength(15.01, limits)).toBe(16);
    expect(roundUpLength(15 + 1e-12, limits)).toBe(15);
    expect(roundUpLength(391 / 25.4, detailLimits.si)).toBe(400);
  });
});

describe('laps of a row', () => {
  const context = designContext(usSettings);
  const horizontal = { curtains: 2 as const, bar: findBar('us', 5), spacingIn: 12 };
  const bars = { curtains: 2 as const, web: findBar('us', 5), webSpacingIn: 12, edgeIn: 3 };
  it('cover of a vertical bar is larger by the horizontal bar', () => {
    expect(anchoredBar('web', { ...bars, ends: null }, horizontal, 5000, context).coverToCenterIn).toBeCloseTo(
      1.6875,
      12,
    );
    expect(anchoredBar('horizontal', { ...bars, ends: null }, horizontal, 5000, context).coverToCenterIn).toBeCloseTo(
      1.0625,
      12,
    );
  });
  it('No. 14 end bars are coupled, the web still laps', () => {
    const cell = lapCell(
      { ...bars, ends: { bar: findBar('us', 14), count: 4, lengthIn: 20 } },
      horizontal,
      5000,
      context,
    );
    expect(cell).toMatchObject({ ends: null, splice: 'coupler' });
    expect(cell.web).toBeGreaterThan(0);
  });
});

describe('ties around end zones', () => {
  const ends = { bar: findBar('us', 9), count: 8, lengthIn: 24 };
  it('16 db, 48 tie db, thickness, zone length', () => {
    expect(tieSpacingLimit(ends, findBar('us', 3), 30)).toBe(18);
    expect(tieSpacingLimit({ ...ends, bar: findBar('us', 6) }, findBar('us', 3), 30)).toBe(12);
    expect(tieSpacingLimit(ends, findBar('us', 3), 10)).toBe(10);
  });
  it('No. 3 to No. 10, No. 4 above', () => {
    expect(leastTie('us', { ...ends, bar: findBar('us', 10) })).toBe(3);
    expect(leastTie('us', { ...ends, bar: findBar('us', 11) })).toBe(4);
    expect(leastTie('si', { ...ends, bar: findBar('si', 36) })).toBe(13);
  });
  it('alternate columns held where they stand within 6 in clear, else all', () => {
    expect(tieLegsAcross(ends, 3, limits)).toBe(3);
    expect(tieLegsAcross({ ...ends, lengthIn: 36 }, 3, limits)).toBe(4);
    expect(tieLegsAcross({ ...ends, count: 4 }, 3, limits)).toBe(2);
  });
});

describe('materialNotices', () => {
  it('names each value above its cap with the value used', () => {
    expect(materialNotices({ ...usSettings, fytKsi: 60 }, [5000])).toEqual([]);
    const told = materialNotices({ ...usSettings, fyKsi: 80, fytKsi: 75 }, [5000, 12000]);
    expect(told).toHaveLength(3);
    expect(told.every(({ code }) => code === 'material-capped')).toBe(true);
    expect(told[0]?.message).toContain('fyt 75 ksi counts as 60 ksi');
  });
  it('speaks MPa in SI, and of 420 MPa, which is a little above 60 ksi', () => {
    const told = materialNotices({ ...usSettings, units: 'si', fyKsi: 60, fytKsi: 420 / 6.894757293168361 }, [5000]);
    expect(told).toHaveLength(1);
    expect(told[0]?.message).toContain('fyt 420 MPa counts as 413.7 MPa');
  });
});
