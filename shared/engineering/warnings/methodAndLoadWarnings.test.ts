import { describe, expect, it } from 'vitest';

import type { ForceRow, GravityRow, Settings } from '../input.ts';
import { analyzed } from '../testing/analyzed.ts';
import { building, force, gravity, level, wall } from '../testing/handBuilding.ts';

import { assumptionWarnings } from './assumptionWarnings.ts';
import { driftWarnings } from './driftWarnings.ts';
import { flexibleWarnings } from './flexibleWarnings.ts';
import { criteriaWarnings, storyShearWarnings } from './inputWarnings.ts';
import { liveWarnings } from './liveWarnings.ts';

const extent = { extent_x: 60, extent_y: 40, x: 30, y: 20 };
const stories = ['L2', 'Roof'] as const;
const walls = [
  wall('A', [0, 10, 0, 30], 12, stories),
  wall('B', [60, 10, 60, 30], 12, stories),
  wall('C', [20, 0, 40, 0], 12, stories),
  wall('D', [20, 40, 40, 40], 12, stories),
];
const input = (
  forces: readonly ForceRow[],
  settings: Partial<Settings> = {},
  loads: readonly GravityRow[] = [],
  floorGravity: number | null = null,
) =>
  building(
    {
      levels: ['Roof', 'L3', 'L2'].map((name) => level(name, 12, { ...extent, gravity: floorGravity })),
      walls,
      forces,
      gravity: loads,
    },
    settings,
  );

describe('flexibleWarnings', () => {
  const found = (forces: readonly ForceRow[], basis: Settings['basis']) =>
    flexibleWarnings(analyzed(input(forces, { basis })).analysis);
  const middle = ['Roof', 'L3', 'L2'].map((name) => force(name, 'WY', 'wind', 0, 30));

  it('takes forces within 1 % of the extent for the middle', () => {
    expect(found(middle, ['flexible'])).toEqual([]);
    // 1 % of 60 ft is 0.6 ft
    expect(found([force('Roof', 'WY', 'wind', 0, 30, { x: 30.59 })], ['flexible'])).toEqual([]);
  });

  it('names case, levels and distance where they act farther off', () => {
    const off = ['Roof', 'L3'].map((name) => force(name, 'WY', 'wind', 0, 30, { x: 33 }));
    const [warning, ...more] = found([...off, force('L2', 'WY', 'wind', 0, 30)], ['flexible']);
    expect(more).toEqual([]);
    expect(warning).toMatchObject({ code: 'flexible-off-middle', level: 'L3' });
    expect(warning?.message).toContain('at L3 to Roof act up to 3.0 ft, 5 % of the extent, off its middle');
    expect(warning?.holds).toEqual({ walls: null, from: 'L2', to: 'Roof' });
    expect(found(off, ['rigid', 'flexible'])[0]?.holds).toBeUndefined();
    expect(found(off, ['rigid'])).toEqual([]);
  });

  it('names torques that are left out', () => {
    expect(found([force('L3', 'WY', 'wind', 0, 30, { mz: 4 })], ['flexible'])[0]?.message).toContain(
      'at L3 carry a torque mz;',
    );
  });
});

describe('liveWarnings', () => {
  const found = (rows: readonly GravityRow[]) => {
    const given = input([], {}, rows);
    return liveWarnings(given, analyzed(given).analysis);
  };
  it('names live load above 100.5 psf that is not classed as heavy, with a range', () => {
    // 12.6 kip over 120 ft2 = 105 psf; 12 over 120 = 100 psf
    const rows = ['L2', 'L3'].map((name, place) =>
      gravity(name, 'A', 20, { live: 12.6 + 1.2 * place, tributary_area: 120 }),
    );
    const [warning, ...more] = found([...rows, gravity('Roof', 'A', 20, { live: 12, tributary_area: 120 })]);
    expect(more).toEqual([]);
    expect(warning).toMatchObject({ code: 'live-heavy', level: 'L2', wall: 'A' });
    expect(warning?.message).toContain('at L2 to L3 is 115 psf');
  });

  it('is quiet about what is classed, and about loads without area', () => {
    expect(
      found([
        gravity('L2', 'A', 20, { live: 40, tributary_area: 120, live_class: 'storage' }),
        gravity('L3', 'A', 20, { live: 40 }),
      ]),
    ).toEqual([]);
  });
});

describe('driftWarnings', () => {
  const quake = (kip: number) => ['Roof', 'L3', 'L2'].map((name) => force(name, 'EY', 'seismic', 0, kip));
  const found = (forces: readonly ForceRow[], floorGravity: number | null) =>
    driftWarnings(analyzed(input(forces, { basis: ['rigid', 'compatible'] }, [], floorGravity)).analysis);

  it('says where stability was not checked, once, and only for seismic cases', () => {
    expect(found(quake(40), null).map(({ code }) => code)).toEqual(['p-delta-not-checked']);
    expect(found([force('Roof', 'WY', 'wind', 0, 9)], null)).toEqual([]);
  });

  it('is one line a run for stability above 0.10, and keeps every row of it', () => {
    const [warning, ...more] = found(quake(40), 4e6);
    expect(more).toEqual([]);
    expect(warning).toMatchObject({ code: 'p-delta', level: 'L2', holds: { walls: null, from: 'L2', to: 'Roof' } });
    expect(found(quake(40), 100)).toEqual([]);
  });

  it('is one line a run for a twisted plan', () => {
    const given = input(quake(40));
    const lopsided = walls.map((row) => (row.wall === 'B' ? { ...row, thickness: 6, y1: 16, y2: 24 } : row));
    const { analysis } = analyzed({ ...given, tables: { ...given.tables, walls: lopsided } });
    const twisted = driftWarnings(analysis).filter(({ code }) => code === 'torsional-irregularity');
    const ratios = analysis.drifts.map(({ torsionRatio }) => torsionRatio ?? 0);
    expect(Math.min(...ratios.filter((ratio) => ratio > 0))).toBeGreaterThan(1.4);
    expect(twisted).toHaveLength(1);
    expect(twisted[0]?.message).toContain('at L2 to Roof, above 1.2, and above 1.4: rho 1.3 unless shown');
    expect(driftWarnings(analysis, 'asce7-16')[0]?.message).toContain('above 1.4: extreme, type 1b (ASCE/SEI 7-16');
  });
});

describe('criteria and assumptions', () => {
  it('wants sds, sdc and rho typed with a seismic case', () => {
    const codes = (forces: readonly ForceRow[], settings: Partial<Settings>) => {
      const given = input(forces, settings);
      return criteriaWarnings(given, analyzed(given).analysis).map(({ code, message }) => [code, message.slice(0, 46)]);
    };
    const quake = [force('Roof', 'EX', 'seismic', 9, 0)];
    expect(codes(quake, { given: ['sds'] })).toEqual([
      ['criteria-missing', 'A seismic case is given, but not sdc, rho: the'],
    ]);
    expect(codes(quake, { given: ['sds', 'sdc', 'rho'], sdc: 'C' })).toEqual([]);
    expect(codes(quake, { given: ['sds', 'sdc', 'rho'], sdc: 'D' })[0]?.[0]).toBe('ordinary-class');
    expect(codes([force('Roof', 'WX', 'wind', 9, 0)], {})).toEqual([]);
  });

  it('says that points of story shears are not used', () => {
    const codes = (forcesAre: Settings['forcesAre'], x: number | null) => {
      const rows = ['Roof', 'L3', 'L2'].map((name) => force(name, 'WX', 'wind', 9, 0, { x }));
      return storyShearWarnings(input(rows, { forcesAre })).map(({ code }) => code);
    };
    expect(codes('story-shear', 25)).toEqual(['points-not-used']);
    expect(codes('story-shear', null)).toEqual([]);
    expect(codes('level-force', 25)).toEqual([]);
  });

  it('prints what is assumed, walls on springs by name', () => {
    const given = input([force('Roof', 'WX', 'wind', 9, 0)], { baseSprings: { B: 4e6 } });
    const found = assumptionWarnings(analyzed(given).analysis);
    expect(found.map(({ code }) => code)).toEqual(['base-fixed', 'out-of-plane', 'collectors']);
    expect(found[0]?.message).toContain('fixed at its base, B on rotation springs');
  });
});
