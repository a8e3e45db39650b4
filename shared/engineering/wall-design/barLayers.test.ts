import { describe, expect, it } from 'vitest';

import { barLayers, endColumns, endRatio, webCount, webPlaces, webRatio } from './barLayers.ts';
import { barFit } from './barFit.ts';
import { findBar } from './bars.ts';
import { detailLimits } from './detailLimits.ts';
import type { WallBars } from './barLayers.ts';

const web = { curtains: 2 as const, web: findBar('us', 5), webSpacingIn: 12, edgeIn: 3 };
const plain: WallBars = { ...web, ends: null };
const zoned: WallBars = { ...web, ends: { bar: findBar('us', 9), count: 8, lengthIn: 24 } };
const all = { web: true, ends: true };

describe('bars of a row as layers', () => {
  it('without end zones: edge bars are web bars, 114 in run cut in 10 spaces of 11.4 in', () => {
    const places = webPlaces(plain, 120);
    expect(places).toHaveLength(11);
    expect(places[0]).toBe(3);
    expect(places[1]).toBeCloseTo(14.4, 12);
    expect(places[10]).toBe(117);
    expect(barLayers(plain, 120, all).every((layer) => layer.areaIn2 === 0.62)).toBe(true);
  });
  it('with end zones: columns at 3, 9, 15, 21 in; 78 in run cut in 7 spaces with 6 bars inside', () => {
    expect(endColumns(8, 24, 3)).toEqual([3, 9, 15, 21]);
    const layers = barLayers(zoned, 120, all);
    expect(layers).toHaveLength(8 + 6);
    expect(layers[4]?.positionIn).toBeCloseTo(21 + 78 / 7, 12);
    expect(layers[0]).toEqual({ positionIn: 3, areaIn2: 2, compression: true });
    expect(layers.reduce((sum, layer) => sum + layer.areaIn2, 0)).toBeCloseTo(16 + 6 * 0.62, 12);
    // both ends alike: the far columns at 99, 105, 111 and 117 in
    expect(layers.slice(10).map(({ positionIn }) => positionIn)).toEqual([99, 105, 111, 117]);
  });
  it('a run that is a whole number of spaces takes no extra bar: 114 in at 9.5 in', () => {
    expect(webPlaces({ ...plain, webSpacingIn: 9.5 }, 120)).toHaveLength(13);
    expect(webPlaces({ ...plain, webSpacingIn: 114 / 12 }, 120)).toHaveLength(13);
  });
  it('counts as many bars as it places', () => {
    for (const bars of [plain, zoned]) {
      for (const lengthIn of [50, 77, 120, 333])
        expect(webCount(bars, lengthIn)).toBe(webPlaces(bars, lengthIn).length);
    }
  });
  it('two bars an end stand in one column at the edge distance', () => {
    expect(endColumns(2, 12, 3)).toEqual([3]);
  });
  it('ratios: 2 x 0.31/(12 x 12) of the web, 8/(24 x 12) of an end zone', () => {
    expect(webRatio(2, findBar('us', 5), 12, 12)).toBeCloseTo(0.62 / 144, 15);
    expect(endRatio(zoned.ends, 12)).toBeCloseTo(8 / 288, 15);
    expect(endRatio(null, 12)).toBe(0);
  });
});

describe('barFit', () => {
  const limits = detailLimits.us;
  it('end columns 6 in apart leave 6 - 2 x 1.128 with laps; needed 1.5 x 1.128', () => {
    const fit = barFit(zoned, 16, 0.75, 0.5, limits);
    expect(fit.clearIn).toBeCloseTo(3.744, 12);
    expect(fit.neededIn).toBeCloseTo(1.692, 12);
  });
  it('two curtains in 6 in: 6 - 2 x 1.25 - 2 x 0.625 = 2.25 in', () => {
    expect(barFit(plain, 6, 0.75, 0.5, limits).clearIn).toBeCloseTo(2.25, 12);
  });
  it('two curtains in 4 in do not fit', () => {
    const fit = barFit(plain, 4, 0.75, 0.5, limits);
    expect(fit.clearIn).toBeLessThan(fit.neededIn);
  });
  it('an end zone too short for its columns has no clear distance', () => {
    const tight = { ...zoned, ends: { bar: findBar('us', 9), count: 12, lengthIn: 10 } };
    expect(barFit(tight, 16, 0.75, 0.5, limits).clearIn).toBeLessThan(0);
  });
});
