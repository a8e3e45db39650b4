import { describe, expect, it } from 'vitest';

import { settingsDefaults } from '../../../contracts/settingsDefaults.ts';
import type { ForceRow, GravityRow, LevelRow, Settings, Tables, UnitSystem, WallRow } from '../../input.ts';

import { checkTable, checkTables } from './checkTables.ts';

const level = (name: string, more: Partial<LevelRow> = {}): LevelRow => ({
  level: name,
  height: 10,
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
});
const wall = (name: string, from: string, to: string, more: Partial<WallRow> = {}): WallRow => ({
  wall: name,
  x1: 0,
  y1: 0,
  x2: 20,
  y2: 0,
  thickness: 12,
  from_level: from,
  to_level: to,
  fc: null,
  share_x: null,
  share_y: null,
  opening: null,
  flexure_factor: null,
  shear_factor: null,
  ...more,
});
const force = (at: string, name = 'WX', kind: ForceRow['kind'] = 'wind'): ForceRow => ({
  level: at,
  case: name,
  kind,
  fx: 10,
  fy: 0,
  x: null,
  y: null,
  mz: null,
});
const gravity = (at: string, name: string, more: Partial<GravityRow> = {}): GravityRow => ({
  level: at,
  wall: name,
  dead: 5,
  live: null,
  roof_live: null,
  snow: null,
  tributary_area: null,
  eccentricity: null,
  live_class: null,
  ...more,
});

/** Five levels L5 to L1 in rows 1 to 5, top down. */
const five = ['L5', 'L4', 'L3', 'L2', 'L1'].map((name) => level(name));
const empty: Tables = { levels: [], walls: [], forces: [], gravity: [], combinations: [], overrides: [] };
const check = (tables: Partial<Tables>, settings: Partial<Settings> = {}, complete = false) =>
  checkTables(
    { settings: { ...settingsDefaults(settings.units ?? 'us'), ...settings }, tables: { ...empty, ...tables } },
    { complete },
  );
const places = (tables: Partial<Tables>, units: UnitSystem = 'us') =>
  check(tables, { units }).problems.map(({ table, row, column }) => [table, row, column]);

describe('checkTables on levels', () => {
  it('refuses a name twice, at the second row', () => {
    expect(places({ levels: [level('A'), level('B'), level('A'), level('A')] })).toEqual([
      ['levels', 3, 'level'],
      ['levels', 4, 'level'],
    ]);
  });

  it('names are case-sensitive', () => {
    expect(places({ levels: [level('A'), level('a')] })).toEqual([]);
  });

  it('refuses half an extent at the empty cell', () => {
    expect(places({ levels: [level('B', { extent_x: 60 }), level('A', { extent_y: 40 })] })).toEqual([
      ['levels', 1, 'extent_y'],
      ['levels', 2, 'extent_x'],
    ]);
  });

  it('holds elevations to 1/16 in or 1 mm', () => {
    const off = (by: number) => [level('B', { elevation: 20 + by }), level('A', { elevation: 10 })];
    expect(places({ levels: off(1 / 16 / 12) })).toEqual([]);
    expect(places({ levels: off(0.0053) })).toEqual([['levels', 1, 'elevation']]);
    expect(places({ levels: off(0.001) }, 'si')).toEqual([]);
    expect(places({ levels: off(0.002) }, 'si')).toEqual([['levels', 1, 'elevation']]);
  });

  it('says that an edge without an extent is not used', () => {
    expect(check({ levels: [level('A', { edge_x: 3 })] }).notices).toMatchObject([{ code: 'edge-unused', level: 'A' }]);
  });
});

describe('checkTables on walls', () => {
  it('refuses levels that do not exist and the wrong order', () => {
    expect(
      places({ levels: five, walls: [wall('A', 'L0', 'L9'), wall('B', 'L3', 'L2'), wall('C', 'L2', 'L2')] }),
    ).toEqual([
      ['walls', 1, 'from_level'],
      ['walls', 1, 'to_level'],
      ['walls', 2, 'to_level'],
    ]);
  });

  it('follows elevations in what is above and below', () => {
    const levels = [level('L1', { elevation: 10 }), level('L2', { elevation: 20 })];
    expect(places({ levels, walls: [wall('A', 'L1', 'L2')] })).toEqual([]);
    expect(places({ levels, walls: [wall('A', 'L2', 'L1')] })).toEqual([['walls', 1, 'to_level']]);
  });

  it('refuses a wall shorter than the tolerance', () => {
    expect(places({ walls: [wall('A', 'L1', 'L1', { x2: 0.005 })] })).toEqual([['walls', 1, 'x2']]);
    expect(places({ walls: [wall('A', 'L1', 'L1', { x2: 0.006 })] })).toEqual([]);
  });

  it('takes bands one above the other in any order of rows', () => {
    expect(
      places({ levels: five, walls: [wall('A', 'L4', 'L5'), wall('A', 'L1', 'L2'), wall('A', 'L3', 'L3')] }),
    ).toEqual([]);
  });

  it('refuses a gap and an overlap at the upper band', () => {
    expect(places({ levels: five, walls: [wall('A', 'L1', 'L2'), wall('A', 'L4', 'L5')] })).toEqual([
      ['walls', 2, 'from_level'],
    ]);
    expect(places({ levels: five, walls: [wall('A', 'L4', 'L5'), wall('A', 'L1', 'L2')] })).toEqual([
      ['walls', 1, 'from_level'],
    ]);
    expect(places({ levels: five, walls: [wall('A', 'L1', 'L3'), wall('A', 'L3', 'L5')] })).toEqual([
      ['walls', 2, 'from_level'],
    ]);
  });

  it('finds an overlap behind a long band', () => {
    expect(
      places({ levels: five, walls: [wall('A', 'L1', 'L5'), wall('A', 'L2', 'L2'), wall('A', 'L4', 'L4')] }),
    ).toEqual([
      ['walls', 2, 'from_level'],
      ['walls', 3, 'from_level'],
    ]);
  });

  it('wants bands on one line, within 1/16 in, wherever they lie along it', () => {
    const up = (more: Partial<WallRow>) =>
      places({ levels: five, walls: [wall('A', 'L1', 'L2'), wall('A', 'L3', 'L5', more)] });
    expect(up({ x1: 4, x2: 12 })).toEqual([]);
    expect(up({ y1: 0.005, y2: -0.005 })).toEqual([]);
    expect(up({ y1: 0.006 })).toEqual([['walls', 2, 'y1']]);
    expect(up({ y2: 0.5 })).toEqual([['walls', 2, 'y2']]);
    expect(up({ x1: 20, x2: 0 })).toEqual([['walls', 2, 'x1']]);
  });

  it('measures across a line at 60 degrees', () => {
    // direction (1, sqrt 3)/2; a point along it stays on the line, a step of 0.01 ft in x leaves it by 0.00866 ft
    const base = wall('A', 'L1', 'L2', { x1: 0, y1: 0, x2: 10, y2: 10 * Math.sqrt(3) });
    const along = wall('A', 'L3', 'L5', { x1: 2, y1: 2 * Math.sqrt(3), x2: 8, y2: 8 * Math.sqrt(3) });
    expect(places({ levels: five, walls: [base, along] })).toEqual([]);
    expect(places({ levels: five, walls: [base, { ...along, x2: 8.01 }] })).toEqual([['walls', 2, 'x2']]);
  });

  it('adds shares story by story', () => {
    const share = (name: string, from: string, to: string, part: number) => wall(name, from, to, { share_x: part });
    expect(
      places({
        levels: five,
        walls: [share('A', 'L1', 'L3', 0.6), share('B', 'L4', 'L5', 0.6), share('C', 'L1', 'L5', 0.4)],
      }),
    ).toEqual([]);
    expect(places({ levels: five, walls: [share('A', 'L1', 'L3', 0.6), share('B', 'L3', 'L5', 0.6)] })).toEqual([
      ['walls', 2, 'share_x'],
    ]);
    const thirds = ['A', 'B', 'C'].map((name) => share(name, 'L1', 'L5', 1 / 3));
    expect(places({ levels: five, walls: thirds })).toEqual([]);
  });

  it('knows psi from ksi and MPa', () => {
    expect(places({ walls: [wall('A', 'L1', 'L1', { fc: 5 }), wall('B', 'L1', 'L1', { fc: 5000 })] })).toEqual([
      ['walls', 1, 'fc'],
    ]);
    expect(places({ walls: [wall('A', 'L1', 'L1', { fc: 5000 }), wall('B', 'L1', 'L1', { fc: 35 })] }, 'si')).toEqual([
      ['walls', 1, 'fc'],
    ]);
  });
});

describe('checkTables on forces and gravity', () => {
  it('refuses the row whose kind differs from the others of its case', () => {
    expect(
      places({
        forces: [force('L1', 'A', 'seismic'), force('L2', 'A'), force('L3', 'A'), force('L1', 'B', 'seismic')],
      }),
    ).toEqual([['forces', 1, 'kind']]);
    expect(places({ forces: [force('L1', 'A'), force('L2', 'A', 'other')] })).toEqual([['forces', 2, 'kind']]);
  });

  it('adds rows of one level and case with one notice', () => {
    const { problems, notices } = check({ forces: [force('L1'), force('L1'), force('L1'), force('L2')] });
    expect(problems).toEqual([]);
    expect(notices.map(({ code, level: at }) => [code, at])).toEqual([['forces-added', 'L1']]);
  });

  it('refuses gravity where nothing stands, and takes it at the top of the wall’s lowest story', () => {
    const walls = [wall('A', 'L2', 'L3'), wall('A', 'L4', 'L4')];
    const rows = ['L1', 'L2', 'L4', 'L5'].map((name) => gravity(name, 'A'));
    expect(places({ levels: five, walls, gravity: rows })).toEqual([
      ['gravity', 1, 'wall'],
      ['gravity', 4, 'wall'],
    ]);
  });

  it('refuses names that do not exist', () => {
    expect(
      places({
        levels: five,
        walls: [wall('A', 'L1', 'L5')],
        forces: [force('l1')],
        gravity: [gravity('L9', 'A'), gravity('L1', 'a')],
      }),
    ).toEqual([
      ['forces', 1, 'level'],
      ['gravity', 1, 'level'],
      ['gravity', 2, 'wall'],
    ]);
  });

  it('takes several rows and negative loads with a notice', () => {
    const { problems, notices } = check({
      gravity: [gravity('L1', 'A'), gravity('L1', 'A', { snow: -2 }), gravity('L1', 'B')],
    });
    expect(problems).toEqual([]);
    expect(notices.map(({ code, wall: name }) => [code, name])).toEqual([
      ['negative-gravity', 'A'],
      ['gravity-added', 'A'],
    ]);
  });

  it('names no consequences of what is already refused', () => {
    expect(
      places({
        levels: [level('L2'), level('L2'), level('L1')],
        walls: [wall('A', 'L2', 'L1')],
        gravity: [gravity('L2', 'A')],
      }),
    ).toEqual([['levels', 2, 'level']]);
    expect(places({ levels: five, walls: [wall('A', 'L1', 'x')], gravity: [gravity('L5', 'A')] })).toEqual([
      ['walls', 1, 'to_level'],
    ]);
    expect(
      places({ levels: five, walls: [wall('A', 'L1', 'L1'), wall('A', 'L3', 'L5')], gravity: [gravity('L2', 'A')] }),
    ).toEqual([['walls', 2, 'from_level']]);
  });
});

describe('checkTables as a whole', () => {
  it('does not hold empty tables against the others unless all must be there', () => {
    const tables = { walls: [wall('A', 'L1', 'L5')], gravity: [gravity('L9', 'Z')] };
    expect(places({ gravity: tables.gravity })).toEqual([]);
    expect(check({}, {}, true).problems.map(({ table, row }) => [table, row])).toEqual([
      ['levels', null],
      ['walls', null],
      ['forces', null],
    ]);
  });

  it('wants the cases of expectedBaseShear to exist', () => {
    const { problems } = check({ forces: [force('L1')] }, { expectedBaseShear: { WX: 1, EX: 2 } });
    expect(problems).toMatchObject([{ table: 'building', row: null, column: 'expectedBaseShear.EX' }]);
  });

  it('wants the walls of baseSprings to exist', () => {
    const walls = [wall('A', 'L1', 'L5')];
    const { problems } = check({ levels: five, walls }, { baseSprings: { A: 9e5, B: 9e5 } });
    expect(problems).toMatchObject([{ table: 'building', row: null, column: 'baseSprings.B' }]);
  });
});

describe('checkTables on story shears', () => {
  const shears = ['L5', 'L4', 'L2', 'L1'].map((name) => force(name));
  it('names the levels that a case leaves out, at its first row', () => {
    const { problems } = check({ levels: five, forces: shears }, { forcesAre: 'story-shear' });
    expect(problems).toMatchObject([{ table: 'forces', row: 1, column: 'level' }]);
    expect(problems[0]?.message).toContain('no row for L3;');
  });

  it('is content with every level, and with gaps where level forces are meant', () => {
    expect(check({ levels: five, forces: [...shears, force('L3')] }, { forcesAre: 'story-shear' }).problems).toEqual(
      [],
    );
    expect(check({ levels: five, forces: shears }).problems).toEqual([]);
  });
});

describe('checkTable', () => {
  const others = { levels: five, walls: [wall('A', 'L1', 'L5')], gravity: [gravity('L5', 'A')] };

  it('refuses a table’s own faults only', () => {
    expect(checkTable('gravity', [gravity('L6', 'A')], others, 'us').problems).toMatchObject([
      { table: 'gravity', row: 1, column: 'level' },
    ]);
    expect(checkTable('forces', [force('L1')], { ...others, gravity: [gravity('L6', 'A')] }, 'us').problems).toEqual(
      [],
    );
  });

  it('takes a table that orphans rows of others, with a notice of each', () => {
    const { problems, notices } = checkTable('levels', five.slice(1), others, 'us');
    expect(problems).toEqual([]);
    expect(notices.map(({ message }) => message.split(':')[0])).toEqual(['walls, row 1', 'gravity, row 1']);
  });

  it('keeps the list of orphans short', () => {
    const many = Array.from({ length: 30 }, () => gravity('L5', 'A'));
    const { notices } = checkTable('walls', [wall('B', 'L1', 'L5')], { ...others, gravity: many }, 'us');
    expect(notices).toHaveLength(21);
    expect(notices[20]?.message).toContain('and 10 more');
  });

  it('gives notices of the table itself', () => {
    const { notices } = checkTable(
      'forces',
      [force('L1'), force('L1')],
      { ...others, gravity: [gravity('L1', 'A', { dead: -1 })] },
      'us',
    );
    expect(notices.map(({ code }) => code)).toEqual(['forces-added']);
  });
});
