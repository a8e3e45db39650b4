import type { BarLists, CodeEdition, Settings, UnitSystem } from '../engineering/input.ts';

/** Bar numbers of ASTM A615 in inch-pound units and, in the same order, as soft metric. */
export const barSizes: Readonly<Record<UnitSystem, readonly number[]>> = {
  us: [3, 4, 5, 6, 7, 8, 9, 10, 11, 14, 18],
  si: [10, 13, 16, 19, 22, 25, 29, 32, 36, 43, 57],
};

/** Spacings that bars can be placed at, in in or mm; outside of them a length was meant, or another unit. */
export const spacingLimits: Readonly<Record<UnitSystem, readonly [least: number, most: number, unit: string]>> = {
  us: [1, 120, 'in'],
  si: [25, 3000, 'mm'],
};

const barLists: Readonly<Record<UnitSystem, BarLists>> = {
  us: {
    web: { sizes: [4, 5, 6, 7, 8], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    horizontal: { sizes: [4, 5, 6], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    ends: { sizes: [5, 6, 7, 8, 9, 10, 11], spacings: [] },
    ties: { sizes: [3, 4, 5], spacings: [3, 3.5, 4, 4.5, 5, 6, 8] },
  },
  si: {
    web: { sizes: [13, 16, 19, 22, 25], spacings: [150, 200, 225, 250, 300, 350, 400, 450] },
    horizontal: { sizes: [13, 16, 19], spacings: [150, 200, 225, 250, 300, 350, 400, 450] },
    ends: { sizes: [16, 19, 22, 25, 29, 32, 36], spacings: [] },
    ties: { sizes: [10, 13, 16], spacings: [75, 90, 100, 115, 125, 150, 200] },
  },
};

/**
 * building.json with nothing but name and units: the defaults of the contract and the bar lists of engineering.md section 7.
 */
export function settingsDefaults(units: UnitSystem, code: CodeEdition = 'aci318-19'): Settings {
  const us = units === 'us';
  return {
    name: '',
    number: '',
    units,
    code,
    loads: code === 'aci318-14' ? 'asce7-16' : 'asce7-22',
    wallClass: 'ordinary',
    fc: us ? 5000 : 35,
    fy: us ? 60 : 420,
    fyt: us ? 60 : 420,
    lambda: 1,
    concreteWeight: us ? 150 : 24,
    selfWeight: true,
    cover: us ? 0.75 : 20,
    edge: us ? 3 : 75,
    joint: 'roughened',
    slabThickness: us ? 8 : 200,
    stiffness: { flexure: 0.5, shear: 1, end: 'cantilever', unitWeight: null },
    basis: ['rigid', 'compatible'],
    accidental: 0.05,
    amplify: false,
    orthogonal: 0,
    windCases: false,
    liveReduction: false,
    liveFactor: 1,
    kll: 1,
    sds: 0,
    rho: 1,
    omega0: 2.5,
    cd: 5,
    ie: 1,
    sdc: null,
    riskCategory: 'II',
    driftLimit: null,
    windDriftFactor: 0.6,
    shearMethod: 'simplified',
    forcesAre: 'level-force',
    forceLevel: 'strength',
    expectedBaseShear: {},
    criticalLevel: {},
    baseSprings: {},
    oopEccentricity: 0,
    bandStories: 3,
    mergeShare: 0,
    bars: barLists[units],
    given: [],
  };
}
