import { describe, expect, it } from 'vitest';

import { settingsDefaults } from '../../../contracts/settingsDefaults.ts';
import type { ForceRow, LevelRow, OverrideRow, Tables, WallRow } from '../../input.ts';

import { checkTable, checkTables } from './checkTables.ts';

const level = (name: string): LevelRow => ({
  level: name,
  height: 12,
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
});
const wall = (name: string, from: string, to: string): WallRow => ({
  wall: name,
  x1: 0,
  y1: 0,
  x2: 20,
  y2: 0,
  thickness: 10,
  from_level: from,
  to_level: to,
  fc: null,
  share_x: null,
  share_y: null,
  opening: null,
  flexure_factor: null,
  shear_factor: null,
});
const force: ForceRow = { level: 'L2', case: 'WX', kind: 'wind', fx: 9, fy: 0, x: null, y: null, mz: null };
const row = (more: Partial<OverrideRow>): OverrideRow => ({
  kind: 'transfer',
  level: 'L1',
  wall: 'A',
  case: null,
  shear: null,
  axial: 14,
  moment: null,
  share: null,
  reason: 'ring beam',
  ...more,
});
const share = (more: Partial<OverrideRow>): OverrideRow => row({ kind: 'share', axial: null, share: 0.4, ...more });
const tables: Tables = {
  levels: [level('L2'), level('L1')],
  walls: [wall('A', 'L1', 'L2'), wall('B', 'L1', 'L1')],
  forces: [force],
  gravity: [],
  combinations: [],
  overrides: [],
};
const places = (overrides: readonly OverrideRow[], more: Partial<Tables> = {}) =>
  checkTables({ settings: settingsDefaults('us'), tables: { ...tables, ...more, overrides } }).problems.map(
    (problem) => [problem.table, problem.row, problem.column],
  );

describe('checkTables on overrides', () => {
  it('takes transfers and shares that name what is there, and transfers that add up', () => {
    expect(
      places([row({}), row({}), row({ case: 'WX', shear: 0 }), share({ case: 'WX' }), share({ wall: 'B' })]),
    ).toEqual([]);
  });

  it('refuses levels, walls and cases that are not there', () => {
    expect(places([row({ level: 'L9' }), row({ wall: 'Z' }), row({ case: 'EX' })])).toEqual([
      ['overrides', 1, 'level'],
      ['overrides', 2, 'wall'],
      ['overrides', 3, 'case'],
    ]);
  });

  it('refuses a wall that does not stand in the story', () => {
    expect(places([row({ wall: 'B', level: 'L2' })])).toEqual([['overrides', 1, 'wall']]);
  });

  it('refuses a share without its part, and with forces beside it', () => {
    expect(places([share({ share: null, shear: 3 })])).toEqual([
      ['overrides', 1, 'share'],
      ['overrides', 1, 'shear'],
    ]);
  });

  it('refuses a transfer of nothing, and one with a share', () => {
    expect(places([row({ axial: null, share: 0.2 })])).toEqual([
      ['overrides', 1, 'shear'],
      ['overrides', 1, 'share'],
    ]);
  });

  it('refuses a second share of a wall in a story and case; a blank case is every case', () => {
    expect(places([share({ case: 'WX' }), share({ case: 'WX' })])).toEqual([['overrides', 2, 'wall']]);
    expect(places([share({}), share({ case: 'WX' })])).toEqual([['overrides', 2, 'wall']]);
    expect(places([share({}), share({ level: 'L2' })])).toEqual([]);
  });

  it('holds nothing against tables that are still empty, and tells the walls table of orphans', () => {
    expect(places([row({ wall: 'Z', level: 'L9', case: 'EX' })], { levels: [], walls: [], forces: [] })).toEqual([]);
    const { problems, notices } = checkTable(
      'walls',
      [wall('B', 'L1', 'L1')],
      { ...tables, overrides: [row({})] },
      'us',
    );
    expect(problems).toEqual([]);
    expect(notices.map(({ message }) => message.split(':')[0])).toEqual(['overrides, row 1']);
  });
});
