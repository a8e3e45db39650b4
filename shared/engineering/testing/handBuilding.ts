import type { BuildingInput, ForceRow, GravityRow, LevelRow, Settings, WallRow } from '../input.ts';

/** Plain settings for tests, US units; the product's own defaults live in contracts/settings.ts. */
export const plainSettings: Settings = {
  name: 'Hand building',
  number: '',
  units: 'us',
  code: 'aci318-19',
  loads: 'asce7-22',
  wallClass: 'ordinary',
  fc: 4000,
  fy: 60,
  fyt: 60,
  lambda: 1,
  concreteWeight: 150,
  selfWeight: false,
  cover: 0.75,
  edge: 3,
  joint: 'roughened',
  slabThickness: 8,
  stiffness: { flexure: 0.5, shear: 1, end: 'cantilever', unitWeight: null },
  basis: ['rigid'],
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
  bars: {
    web: { sizes: [4, 5, 6, 7, 8], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    horizontal: { sizes: [4, 5, 6], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    ends: { sizes: [5, 6, 7, 8, 9, 10, 11], spacings: [] },
    ties: { sizes: [3, 4, 5], spacings: [3, 3.5, 4, 4.5, 5, 6, 8] },
  },
  given: [],
};

export function level(name: string, height: number, more: Partial<LevelRow> = {}): LevelRow {
  return {
    level: name,
    height,
    elevation: null,
    x: null,
    y: null,
    extent_x: null,
    extent_y: null,
    edge_x: null,
    edge_y: null,
    diaphragm: null,
    weight: null,
    gravity: null,
    ...more,
  };
}

export function wall(
  name: string,
  ends: readonly [number, number, number, number],
  thickness: number,
  stories: readonly [string, string],
  more: Partial<WallRow> = {},
): WallRow {
  const [x1, y1, x2, y2] = ends;
  return {
    wall: name,
    x1,
    y1,
    x2,
    y2,
    thickness,
    from_level: stories[0],
    to_level: stories[1],
    fc: null,
    share_x: null,
    share_y: null,
    opening: null,
    flexure_factor: null,
    shear_factor: null,
    ...more,
  };
}

export function force(
  levelName: string,
  name: string,
  kind: ForceRow['kind'],
  fx: number,
  fy: number,
  more: Partial<ForceRow> = {},
): ForceRow {
  return { level: levelName, case: name, kind, fx, fy, x: null, y: null, mz: null, ...more };
}

export function gravity(levelName: string, wallName: string, dead: number, more: Partial<GravityRow> = {}): GravityRow {
  return {
    level: levelName,
    wall: wallName,
    dead,
    live: null,
    roof_live: null,
    snow: null,
    tributary_area: null,
    eccentricity: null,
    live_class: null,
    ...more,
  };
}

export function building(
  tables: {
    levels: readonly LevelRow[];
    walls: readonly WallRow[];
    forces?: readonly ForceRow[];
    gravity?: readonly GravityRow[];
  },
  settings: Partial<Settings> = {},
): BuildingInput {
  return {
    settings: { ...plainSettings, ...settings },
    tables: { forces: [], gravity: [], combinations: [], overrides: [], ...tables },
  };
}
