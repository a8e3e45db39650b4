import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { BarList, Settings, UnitSystem } from '#shared/engineering/input';

import type { WorkbookContent } from './WorkbookContent.ts';

const bars: BarList = { sizes: [5], spacings: [12] };

/** Invented settings for the tests of this folder. */
const settings = (units: UnitSystem): Settings => ({
  name: 'Larkspur Terrace, east block & annex',
  number: 'GW-0417',
  units,
  code: 'aci318-19',
  loads: 'asce7-22',
  wallClass: 'ordinary',
  fc: units === 'us' ? 5000 : 35,
  fy: units === 'us' ? 60 : 420,
  fyt: units === 'us' ? 60 : 420,
  lambda: 1,
  concreteWeight: units === 'us' ? 150 : 24,
  selfWeight: true,
  cover: units === 'us' ? 0.75 : 20,
  edge: units === 'us' ? 3 : 75,
  joint: 'roughened',
  slabThickness: units === 'us' ? 8 : 200,
  stiffness: { flexure: 0.5, shear: 1, end: 'cantilever', unitWeight: null },
  basis: ['rigid'],
  accidental: 0.05,
  amplify: false,
  orthogonal: 0,
  windCases: false,
  liveReduction: false,
  liveFactor: 1,
  kll: 1,
  sds: 0.4,
  rho: 1,
  omega0: 2.5,
  cd: 5,
  ie: 1,
  sdc: 'B',
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
  bars: { web: bars, horizontal: bars, ends: bars, ties: bars },
  given: ['name', 'number', 'units', 'sds', 'sdc'],
});

const levelName = (index: number, count: number): string => (index === count - 1 ? 'Roof' : `L${String(index + 2)}`);

/** One row of an invented schedule; `place` counts bands from the base up. */
function inventedRow(
  wall: string,
  wallIndex: number,
  place: number,
  levels: number,
  units: UnitSystem,
): ScheduleResourceRow {
  const us = units === 'us';
  const from = levelName(place * 2, levels);
  const to = levelName(Math.min(place * 2 + 1, levels - 1), levels);
  const below = place === 0 ? 'base' : `top of ${levelName(place * 2 - 1, levels)}`;
  const ended = place < 2;
  const over = wallIndex === 1 && place === 1;
  const overwritten = wallIndex === 0 && place === 1;
  const vertical = { curtains: 2 as const, bar: us ? 5 : 16, spacing: us ? 12 : 300 };
  const horizontal = { curtains: 2 as const, bar: us ? 5 : 16, spacing: us ? 10 : 250, end: 'hook' as const };
  const ends = ended ? { bar: us ? 9 : 29, count: 8, length: us ? 30.5 : 750 } : null;
  const ties = ended
    ? {
        bar: us ? 3 : 10,
        spacing: us ? 3.5 : 90,
        legsAlong: 2,
        legsAcross: 4,
        fromElevation: place * 21.5,
        toElevation: (place + 1) * 21.5,
        kind: 'compression bars',
      }
    : null;
  const laps = {
    web: us ? 31 : 790,
    ends: ended ? (us ? 79 : 2010) : null,
    horizontal: us ? 27.5 : 700,
    splice: 'lap' as const,
  };
  const notes =
    place === 0 ? ['Horizontals hooked 90 degrees at the ends', `Base of ${wall}: see the footing plan`] : [];
  const ratio = over ? 1.00042 : 0.3 + 0.6180339887 / (place + 1.1 + wallIndex / 7);
  const automatic = { vertical, horizontal, ends, ties, laps, notes };
  return {
    id: `row-${wall}-${String(place)}`,
    version: 1,
    wall,
    from,
    to,
    levels: `${below} to ${to}`,
    thickness: us ? 12 + 2 * (place === 0 ? 1 : 0) : 300,
    fc: us ? 5000 : 35,
    vertical,
    horizontal: overwritten ? { ...horizontal, spacing: us ? 8 : 200 } : horizontal,
    ends,
    ties,
    laps,
    extendAbove: us ? 43.25 : 1100,
    dowels: place === 0 ? { bar: us ? 9 : 29, count: 8, spacing: null, embedment: us ? 28 : 700 } : null,
    joint: 'roughened',
    trim: wallIndex === 2 ? '(2)#5 at openings' : null,
    notes,
    notDesigned: wallIndex === 3 ? ['out-of-plane bending'] : [],
    ratio: wallIndex === 3 && place === 0 ? null : ratio,
    governs: {
      check: place > 1 ? 'vertical-steel' : 'shear',
      clause: '11.5.4.3',
      combination: '1.28D + 1.0E + 1.0L + 0.15S: EX plus, negative',
      level: to,
      basis: 'rigid',
    },
    ok: !over,
    state: over ? 'over' : wallIndex === 3 ? 'not settled' : 'ok',
    overwritten: overwritten ? ['horizontal'] : [],
    automatic,
    reason: overwritten ? 'One spacing for both faces of the stair' : null,
  };
}

/** An invented building for tests of the workbook; every number differs from its neighbors. */
export function inventedContent(units: UnitSystem, walls = 5, levels = 8): WorkbookContent {
  const names = Array.from({ length: levels }, (_, index) => levelName(index, levels));
  const marks = Array.from({ length: walls }, (_, index) => `W${String(index + 1)}`);
  const rows = marks.flatMap((wall, wallIndex) =>
    Array.from({ length: Math.ceil(levels / 2) }, (_, place) =>
      inventedRow(wall, wallIndex, place, levels, units),
    ).reverse(),
  );
  const places = names.flatMap((level, story) => marks.map((wall, index) => ({ level, wall, story, index })));
  const cases = [
    { case: 'WX', variant: '0' as const },
    { case: 'EX', variant: '+' as const },
  ];
  const number = (story: number, index: number): number => 1000 / (story + 1.37) - 61.803 * index;
  const document: ResultDocument = {
    units,
    code: 'aci318-19',
    loads: 'asce7-22',
    basis: ['rigid'],
    engine: '0.1.0',
    warnings: [
      { code: 'plan-size-assumed', level: 'L2', message: 'Extent not given, taken from the wall ends.' },
      { code: 'drift-not-available', message: 'Drift comes from the whole-height solution only.' },
    ],
    timing: { total: 12 },
    levels: names.map((level, story) => ({
      level,
      elevation: 10.75 * (story + 1),
      height: 10.75,
      rigidity: { x: 41.2, y: 27.9 },
      force: { WX: { fx: 12.5 + story, fy: 0, mz: 3.25 }, EX: { fx: 20.125 * (story + 1), fy: 0, mz: 0 } },
      shear: { WX: { vx: 100 - story, vy: 0, mz: 55 }, EX: { vx: 300 - story, vy: 0, mz: 77 } },
      point: { x: 40.5, y: 30.25 },
      extent: { x: 81, y: 60.5, edgeX: 0, edgeY: 0 },
    })),
    rigidities: places.map(({ level, wall, story, index }) => ({ level, wall, k: 811.7 + 3.3 * story + index / 3 })),
    distribution: cases.flatMap((load) =>
      places.map(({ level, wall, story, index }) => ({
        basis: 'rigid' as const,
        ...load,
        level,
        wall,
        direct: number(story, index),
        torsional: number(index, story) / 9,
        total: number(story, index) + number(index, story) / 9,
      })),
    ),
    drifts: [],
    displacements: [],
    lateral: cases.flatMap((load) =>
      places.map(({ level, wall, story, index }) => ({
        basis: 'rigid' as const,
        ...load,
        level,
        wall,
        shear: number(story, index) / 3,
        moment: number(index, story) * 17,
      })),
    ),
    gravity: places.flatMap(({ level, wall, story, index }) =>
      ['D', 'L', 'Lr', 'S'].map((name, order) => ({
        level,
        wall,
        case: name,
        axial: number(story, index) + order,
        moment: order / 7,
      })),
    ),
    transferred: [
      { basis: 'rigid', case: 'WX', variant: '0', level: 'L3', wall: 'W2', axial: 0, shear: 17.31, moment: 181.7 },
    ],
    actions: [],
    checks: places.map(({ level, wall, story, index }) => ({
      basis: 'rigid' as const,
      level,
      wall,
      check: 'shear',
      demand: 100 / (story + 1.9),
      capacity: story === 2 && index === 1 ? null : 211.3 + index,
      unit: units === 'us' ? 'kip' : 'kN',
      ratio: story === 2 && index === 1 ? null : 100 / (story + 1.9) / (211.3 + index),
      clause: '11.5.4.3',
      combination: '1.28D + 1.0E + 1.0L + 0.15S: EX plus, negative',
      ok: !(story === 2 && index === 1),
    })),
    schedule: rows,
    quantities: {
      concrete: 411.25,
      steel: 61234.5,
      rate: 148.9,
      walls: marks.map((wall, index) => ({
        wall,
        concrete: 81.5 + index,
        steel: 12000.25 + index,
        rate: 147.2,
        bands: [{ from: 'L2', to: 'L3', concrete: 20.75, steel: 3100.125 + index, rate: 149.4 }],
      })),
    },
    balance: cases.flatMap((load) =>
      names.map((level, story) => ({
        basis: 'rigid' as const,
        ...load,
        level,
        residual: 1.5e-15 * (story + 1),
        lines: (['force x', 'force y', 'torque', 'overturning x', 'overturning y', 'vertical'] as const).map(
          (line, order) => ({ line, applied: 100.5 * (story + order), resisted: 100.5 * (story + order) }),
        ),
      })),
    ),
  };
  return { document, settings: settings(units), rows, printedAt: '2026-03-04T15:20:07.123Z' };
}
