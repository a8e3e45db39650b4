import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';

import { findBar } from './bars.ts';
import { acrossFit, barFit, neededClear } from './barFit.ts';
import { detailLimits } from './detailLimits.ts';
import { hookLength } from './developmentLength.ts';
import { leastTie, tieLegsAcross, tieSpacingLimit } from './endTies.ts';
import { designContext } from './designContext.ts';
import { lapCell } from './rowLaps.ts';
import { siSettings } from './testing/inventedWall.ts';

/**
 * Round lengths of ACI 318-19 and of its metric edition 318M: 18, 10, 6, 4 and 12 in stand as 450, 250, 150, 100 and 300 mm
 * (engineering.md section 1), 1.5 in clear as 40 mm (25.2.3, from memory). Written from the standard, not from the table under test.
 */
describe('round lengths', () => {
  const of = (units: 'us' | 'si') => {
    const { spacingIn, oneCurtainThicknessIn, sixIn, leastThicknessIn, leastDevelopmentIn, clearIn, toIn } =
      detailLimits[units];
    return [spacingIn, oneCurtainThicknessIn, sixIn, leastThicknessIn, leastDevelopmentIn, clearIn].map(
      (lengthIn) => Math.round((lengthIn / toIn) * 1e9) / 1e9,
    );
  };
  it('in inches and in millimeters', () => {
    expect(of('us')).toEqual([18, 10, 6, 4, 12, 1.5]);
    expect(of('si')).toEqual([450, 250, 150, 100, 300, 40]);
  });
  it('bars above No. 11 and No. 36 are coupled (25.5.1.1)', () => {
    const context = designContext(siSettings);
    const horizontal = { curtains: 2 as const, bar: findBar('si', 13), spacingIn: 12 };
    const lap = (number: number) => {
      const bars = {
        curtains: 2 as const,
        web: findBar('si', 16),
        webSpacingIn: 12,
        edgeIn: 3,
        ends: { bar: findBar('si', number), count: 4, lengthIn: 20 },
      };
      return lapCell(bars, horizontal, 5000, context).splice;
    };
    expect([32, 36, 43, 57].map(lap)).toEqual(['lap', 'lap', 'coupler', 'coupler']);
  });
});

describe('least hook, 25.4.3.1', () => {
  it('8 bar diameters where the formula gives less: 30,000 x 1.25/(55 x 100) = 6.8 in of a 1 in bar; 6 in of a thin one', () => {
    expect(hookLength(findBar('us', 8), 30, 10000, 1, aci31819, detailLimits.us)).toBe(8);
    expect(hookLength(findBar('us', 4), 30, 10000, 1, aci31819, detailLimits.us)).toBe(6);
  });
});

describe('ties around end bars, 25.7.2', () => {
  const ends = { bar: findBar('us', 11), count: 8, lengthIn: 40 };
  // 16 x 1.41 = 22.56, 48 x 0.375 = 18, 48 x 0.5 = 24
  it('each of the four limits governs in its turn', () => {
    expect(tieSpacingLimit(ends, findBar('us', 4), 50)).toBeCloseTo(22.56, 12);
    expect(tieSpacingLimit(ends, findBar('us', 3), 50)).toBe(18);
    expect(tieSpacingLimit(ends, findBar('us', 4), 14)).toBe(14);
    expect(tieSpacingLimit({ ...ends, lengthIn: 12 }, findBar('us', 4), 50)).toBe(12);
  });
  it('No. 3 up to No. 10, No. 4 from No. 11; soft-metric 10 up to 32, 13 from 36', () => {
    const of = (units: 'us' | 'si', number: number) => leastTie(units, { ...ends, bar: findBar(units, number) });
    expect([9, 10, 11, 14].map((number) => of('us', number))).toEqual([3, 3, 4, 4]);
    expect([29, 32, 36].map((number) => of('si', number))).toEqual([10, 10, 13]);
  });
  it('legs: corners and every other column within 6 in clear, every column beyond', () => {
    // 5 columns of No. 8 in 31 in with 3 in edges: 6.25 in apart, 5.25 clear: 3 legs; in 35.2 in: 7.3 apart, 6.3 clear: 5 legs
    const five = { bar: findBar('us', 8), count: 10, lengthIn: 31 };
    expect(tieLegsAcross(five, 3, detailLimits.us)).toBe(3);
    expect(tieLegsAcross({ ...five, lengthIn: 35.2 }, 3, detailLimits.us)).toBe(5);
    expect(tieLegsAcross({ ...five, count: 12, lengthIn: 31 }, 3, detailLimits.us)).toBe(4);
    expect(tieLegsAcross({ ...five, count: 4 }, 3, detailLimits.us)).toBe(2);
  });
});

describe('bar fit, 25.2.3', () => {
  const { us } = detailLimits;
  it('needs 1.5 in and 1.5 db clear', () => {
    expect(neededClear(findBar('us', 5), us)).toBe(1.5);
    expect(neededClear(findBar('us', 8), us)).toBe(1.5);
    expect(neededClear(findBar('us', 9), us)).toBeCloseTo(1.692, 12);
    expect(neededClear(findBar('si', 16), detailLimits.si)).toBeCloseTo(40 / 25.4, 12);
  });
  it('web bars at 3 in with laps: 3 - 2 x 0.875 = 1.25 in, not enough', () => {
    const bars = { curtains: 2 as const, web: findBar('us', 7), webSpacingIn: 3, edgeIn: 3, ends: null };
    const fit = barFit(bars, 20, 0.75, 0.5, us);
    expect(fit.clearIn).toBeCloseTo(1.25, 12);
    expect(fit.neededIn).toBe(1.5);
  });
  it('one curtain of No. 4 in 6 in: 6 - 1.5 - 0.5 = 4 in; two curtains of No. 8 in 6 in leave 1.5 in', () => {
    expect(acrossFit(1, findBar('us', 4), 2.5, 0.75, 0.5, us)).toBe(true);
    expect(acrossFit(1, findBar('us', 4), 2.4, 0.75, 0.5, us)).toBe(false);
    expect(acrossFit(2, findBar('us', 8), 6, 0.75, 0.5, us)).toBe(true);
    expect(acrossFit(2, findBar('us', 8), 5.9, 0.75, 0.5, us)).toBe(false);
  });
});
