import { describe, expect, it } from 'vitest';

import type { OverrideRow, WallRow } from '../input.ts';
import { toModel } from '../model/toModel.ts';
import { transferPoints } from '../takedown/transferred.ts';
import { building, level, wall } from '../testing/handBuilding.ts';

import { wallShapeWarnings } from './wallShapeWarnings.ts';

const levels = [level('Roof', 10), level('L3', 10), level('L2', 14)];
function found(walls: readonly WallRow[], overrides: readonly OverrideRow[] = []) {
  const input = building({ levels, walls });
  const model = toModel({ ...input, tables: { ...input.tables, overrides } });
  return wallShapeWarnings({ model, transfers: transferPoints(model) });
}
const codes = (walls: readonly WallRow[]) => found(walls).map(({ code, level: at, holds }) => [code, at, holds]);

describe('wallShapeWarnings', () => {
  it('is quiet about a plain wall', () => {
    expect(found([wall('A', [0, 0, 20, 0], 12, ['L2', 'Roof'])])).toEqual([]);
  });

  it('names openings with the largest of a run, and keeps the rows of the wall', () => {
    const [warning, ...more] = found([
      wall('A', [0, 0, 20, 0], 12, ['L2', 'L2'], { opening: 0.1 }),
      wall('A', [0, 0, 20, 0], 12, ['L3', 'L3'], { opening: 0.25 }),
      wall('A', [0, 0, 20, 0], 12, ['Roof', 'Roof']),
    ]);
    expect(more).toEqual([]);
    expect(warning).toMatchObject({ code: 'opening-solid', level: 'L2', wall: 'A' });
    expect(warning?.message).toContain('25 % of its face at L2 to L3');
    expect(warning?.holds).toEqual({ walls: ['A'], from: 'L2', to: 'L3' });
  });

  it('takes a pier for lw/t up to 6 and clear height at least 2 lw', () => {
    // slab 8 in: clear 112 in at L3 and Roof, 160 in at L2; lw 56 in: 2.0 and 2.9 times, lw/t 56/10 = 5.6
    expect(codes([wall('A', [0, 0, 56 / 12, 0], 10, ['L2', 'Roof'])])).toEqual([
      ['wall-pier', 'L2', { walls: ['A'], from: 'L2', to: 'Roof' }],
    ]);
    // lw 60 in: 112/60 is below 2, 160/60 above, lw/t 6.0
    expect(codes([wall('A', [0, 0, 5, 0], 10, ['L2', 'Roof'])])).toEqual([
      ['wall-pier', 'L2', { walls: ['A'], from: 'L2', to: 'L2' }],
    ]);
    expect(codes([wall('A', [0, 0, 5, 0], 9.9, ['L2', 'Roof'])])).toEqual([]);
  });

  it('names the level at which the centroid moves, and toward which end', () => {
    const [warning, ...more] = found([
      wall('A', [0, 0, 24, 0], 12, ['L2', 'L2']),
      wall('A', [0, 0, 18, 0], 12, ['L3', 'Roof']),
    ]);
    expect(more).toEqual([]);
    expect(warning).toMatchObject({ code: 'offset', level: 'L2', wall: 'A' });
    expect(warning?.message).toContain('stands 3.0 ft toward its first end');
  });

  it('names a wall that stops below the roof', () => {
    expect(codes([wall('A', [0, 0, 20, 0], 12, ['L2', 'L3'])])).toEqual([['wall-stops-below-roof', 'L3', undefined]]);
  });

  it('keeps every row below a transfer until one is assigned on its level', () => {
    const walls = [wall('A', [0, 0, 20, 0], 12, ['L3', 'Roof']), wall('B', [0, 9, 20, 9], 12, ['L2', 'Roof'])];
    expect(codes(walls)).toEqual([['transfer-not-assigned', 'L2', { walls: null, from: 'L2', to: 'L2' }]]);
    const row = { kind: 'transfer', level: 'L2', wall: 'B', case: null, reason: 'beams on line 9' } as const;
    const assigned = found(walls, [{ ...row, shear: null, axial: 90, moment: null, share: null }]);
    expect(assigned.map(({ code, holds }) => [code, holds])).toEqual([['transfer-assigned', undefined]]);
  });
});
