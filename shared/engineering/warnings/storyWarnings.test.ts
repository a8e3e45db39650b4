import { describe, expect, it } from 'vitest';

import type { LevelRow, Settings, WallRow } from '../input.ts';
import { analyzed } from '../testing/analyzed.ts';
import { building, force, level, wall } from '../testing/handBuilding.ts';

import { planWarnings } from './planWarnings.ts';
import { storyWarnings } from './storyWarnings.ts';

const extent = { extent_x: 60, extent_y: 40, x: 30, y: 20 };
const levels = [level('Roof', 10, extent), level('L3', 10, extent), level('L2', 10, extent)];
const four = (thickness: number, stories: readonly [string, string]): WallRow[] => [
  wall('A', [0, 10, 0, 30], thickness, stories),
  wall('B', [60, 10, 60, 30], thickness, stories),
  wall('C', [20, 0, 40, 0], thickness, stories),
  wall('D', [20, 40, 40, 40], thickness, stories),
];
const input = (rows: readonly LevelRow[], walls: readonly WallRow[], settings: Partial<Settings> = {}) =>
  building({ levels: rows, walls, forces: [force('Roof', 'WX', 'wind', 9, 0)] }, settings);
const found = (...given: Parameters<typeof input>) =>
  storyWarnings(analyzed(input(...given)).analysis).map(({ code, level: at, message, holds }) => ({
    code,
    at,
    message,
    holds,
  }));

describe('soft stories and podiums', () => {
  it('says nothing of equal stories', () => {
    expect(found(levels, four(12, ['L2', 'Roof']))).toEqual([]);
  });

  it('compares with the story above, both directions in one line', () => {
    // k goes with t: 8 in under 12 in is 67 %
    const soft = found(levels, [...four(8, ['L2', 'L2']), ...four(12, ['L3', 'Roof'])]);
    expect(soft).toHaveLength(1);
    expect(soft[0]).toMatchObject({ code: 'soft-story', at: 'L2' });
    expect(soft[0]?.message).toContain('67 % in x and 67 % in y');
    expect(found(levels, [...four(9, ['L2', 'L2']), ...four(12, ['L3', 'Roof'])])).toEqual([]);
  });

  it('takes a story three times as stiff for a podium', () => {
    expect(found(levels, [...four(24, ['L2', 'L2']), ...four(8, ['L3', 'Roof'])])).toMatchObject([
      { code: 'podium', at: 'L2' },
    ]);
  });
});

describe('diaphragm spans', () => {
  const long = { extent_x: 124, extent_y: 40, x: 62, y: 20 };
  const rows = [level('Roof', 10, long), level('L3', 10, long), level('L2', 10, extent)];
  const walls = four(12, ['L2', 'Roof']).map((row) => (row.wall === 'B' ? { ...row, x1: 124, x2: 124 } : row));
  it('are long beyond 3 times the depth, with rows that wait while no flexible basis is asked for', () => {
    expect(found(rows, walls)).toMatchObject([
      { code: 'diaphragm-span', at: 'L2', holds: { walls: null, from: 'L2', to: 'Roof' } },
    ]);
    expect(found(rows, walls)[0]?.message).toContain('124.0 ft between walls with a depth of 40.0 ft, 3.1 to 1');
    expect(found(rows, walls, { basis: ['rigid', 'flexible'] })[0]?.holds).toBeUndefined();
    expect(found(rows, walls, { basis: ['flexible'] })).toEqual([]);
  });

  it('are broken by a line of walls between', () => {
    expect(found(rows, [...walls, wall('E', [60, 10, 60, 30], 12, ['L2', 'Roof'])])).toEqual([]);
  });
});

describe('planWarnings', () => {
  const codes = (rows: readonly LevelRow[], settings: Partial<Settings> = {}) => {
    const given = input(rows, four(12, ['L2', 'Roof']), settings);
    return planWarnings(given, analyzed(given).analysis).map(({ code, level: at, message }) => [
      code,
      at,
      message.split(' ').slice(0, 5).join(' '),
    ]);
  };
  it('merges stories whose extent is assumed, and breaks at one that is given', () => {
    expect(codes([level('Roof', 10), level('L4', 10), level('L3', 10, extent), level('L2', 10)])).toHaveLength(2);
    expect(codes([level('Roof', 10), level('L3', 10), level('L2', 10)])).toEqual([
      ['plan-size-assumed', 'L2', 'The extent of L2 to'],
    ]);
  });

  it('names diaphragms that contradict the bases', () => {
    const flexible = levels.map((row) => ({ ...row, diaphragm: row.level === 'L2' ? null : ('flexible' as const) }));
    expect(codes(flexible)).toEqual([['diaphragm-contradicts', 'L3', 'L3 to Roof are entered']]);
    expect(codes(flexible, { basis: ['rigid', 'flexible'] })).toEqual([]);
  });
});
