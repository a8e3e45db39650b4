import { describe, expect, it } from 'vitest';

import { findBar } from './bars.ts';
import { designContext } from './designContext.ts';
import { curtainsNeeded, isSmallBar, leastRatios, shearDemand, spacingLimits } from './steelNeeded.ts';
import { siSettings, usSettings } from './testing/inventedWall.ts';

const us = designContext(usSettings);
const si = designContext(siSettings);
const mm = 1 / 25.4;
const low = { low: true, expansion: null, horizontalForStrength: 0, heightOverLength: 3 };

describe('least ratios in low shear, Table 11.6.1', () => {
  it('the smaller ratios belong to bars up to No. 5 and No. 16 of 60 ksi and more', () => {
    expect(isSmallBar(findBar('us', 5), 60, us)).toBe(true);
    expect(isSmallBar(findBar('us', 6), 60, us)).toBe(false);
    expect(isSmallBar(findBar('us', 4), 40, us)).toBe(false);
    expect(isSmallBar(findBar('us', 4), 80, us)).toBe(true);
    expect(isSmallBar(findBar('si', 16), si.fyKsi, si)).toBe(true);
    expect(isSmallBar(findBar('si', 19), si.fyKsi, si)).toBe(false);
  });
  it('each direction goes by its own bar and its own grade', () => {
    const [four, six] = [findBar('us', 4), findBar('us', 6)];
    expect(leastRatios(low, four, six, 0.003, us)).toEqual({ vertical: 0.0012, horizontal: 0.0025 });
    expect(leastRatios(low, six, four, 0.003, us)).toEqual({ vertical: 0.0015, horizontal: 0.002 });
    expect(leastRatios(low, four, four, 0.003, { ...us, fyKsi: 40 })).toEqual({ vertical: 0.0015, horizontal: 0.002 });
    expect(leastRatios(low, four, four, 0.003, { ...us, fytKsi: 40 })).toEqual({
      vertical: 0.0012,
      horizontal: 0.0025,
    });
  });
});

describe('spacing limits, 11.7.2.1 and 11.7.3.1', () => {
  it('US: 18 in, 3 t of a thin wall, lw/3 and lw/5 beyond low shear only', () => {
    expect(spacingLimits(true, 40, 12, us)).toEqual({ verticalIn: 18, horizontalIn: 18 });
    expect(spacingLimits(true, 200, 5, us)).toEqual({ verticalIn: 15, horizontalIn: 15 });
    expect(spacingLimits(false, 45, 12, us)).toEqual({ verticalIn: 15, horizontalIn: 9 });
  });
  it('SI: 450 mm', () => {
    expect(spacingLimits(true, 200, 12, si).verticalIn).toBeCloseTo(450 * mm, 12);
    expect(spacingLimits(false, 200, 12, si).horizontalIn).toBeCloseTo(450 * mm, 12);
  });
});

describe('curtains, 11.7.2.3', () => {
  it('one up to 10 in and 250 mm, two above', () => {
    expect([8, 10, 10.25, 12].map((t) => curtainsNeeded(t, us))).toEqual([1, 1, 2, 2]);
    expect([200, 250, 255, 300].map((t) => curtainsNeeded(t * mm, si))).toEqual([1, 1, 2, 2]);
  });
});

describe('steel needed for shear, 11.5.4.3', () => {
  // Acv 2,400 in2, Vc 336 kip, limit 1,344 kip: rho_t = (600/0.75 - 336)/(60 x 2,400) = 0.0032222
  const wall = { lengthIn: 200, thicknessIn: 12, fcPsi: 4900, fytKsi: 60, lambda: 1, wallHeightIn: 600 };
  const group = (shearKip: number) => ({
    axialKip: 500,
    seismic: false,
    momentKipIn: 0,
    momentExpansion: 0,
    shearKip,
    shearExpansion: 0,
  });
  it('by hand, nothing below Vc, the limit where no steel helps', () => {
    expect(shearDemand(wall, [group(600)], us).horizontalForStrength).toBeCloseTo(464 / 144000, 12);
    expect(shearDemand(wall, [group(200)], us).horizontalForStrength).toBe(0);
    expect(shearDemand(wall, [group(5000)], us).horizontalForStrength).toBeCloseTo(1008 / 144000, 12);
  });
  it('low shear ends at 0.5 x 0.75 x 336 = 126 kip', () => {
    expect(shearDemand(wall, [group(126)], us).low).toBe(true);
    expect(shearDemand(wall, [group(126.1)], us).low).toBe(false);
  });
});
