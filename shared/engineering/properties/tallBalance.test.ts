import { describe, expect, it } from 'vitest';

import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { lateralBalance } from '../balance/lateralBalance.ts';
import { distribute } from '../distribution/bases.ts';
import type { BuildingInput, Settings } from '../input.ts';
import { toModel } from '../model/toModel.ts';
import { storyRigidities } from '../rigidity/storyRigidities.ts';
import { lateralMoments } from '../takedown/lateralMoments.ts';
import { transferPoints } from '../takedown/transferred.ts';

import { handPlan } from './handPlan.ts';

/** Sixty stories, walls of very different length, one cut off at half height, forces both ways, an eccentric plan. */
function tower(more: Partial<Settings>): BuildingInput {
  const stories = Array.from({ length: 60 }, (_, i) => `F${String(i + 1)}`);
  const plan = handPlan(
    {
      heights: stories.map((_, i) => (i === 0 ? 18 : 11.5)),
      extent: [120, 90],
      walls: [
        { wall: 'X1', ends: [4, 6, 34, 6], thickness: 24 },
        { wall: 'X2', ends: [50, 80, 58, 80], thickness: 10 },
        { wall: 'X3', ends: [60, 44, 82, 44], thickness: 14 },
        { wall: 'Y1', ends: [2, 20, 2, 60], thickness: 24 },
        { wall: 'Y2', ends: [118, 30, 118, 36], thickness: 8 },
        { wall: 'Y3', ends: [70, 10, 70, 34], thickness: 16 },
      ],
      forces: stories.flatMap((level, i) => [
        { level, case: 'EX', kind: 'seismic' as const, fx: 4 + i, fy: 1.5 },
        { level, case: 'WY', kind: 'wind' as const, fx: 0, fy: 31, mz: -90 },
      ]),
    },
    { ...settingsDefaults('us'), name: 'Tower', basis: ['rigid', 'compatible', 'flexible'], amplify: true, ...more },
  );
  const walls = plan.tables.walls.map((row) => (row.wall === 'X3' ? { ...row, to_level: 'F30' } : row));
  return { ...plan, tables: { ...plan.tables, walls } };
}

/** Largest residual of each basis, with one share of one story off by `fault` where asked. */
function worstResiduals(input: BuildingInput, fault: number): Record<string, number> {
  const model = toModel(input);
  const distribution = distribute(model, storyRigidities(model));
  if ('problems' in distribution) throw new Error(JSON.stringify(distribution.problems));
  const { actions } = distribution;
  return Object.fromEntries(
    distribution.bases.map(({ basis, shares, along, openTorqueKipIn }) => {
      const spoil = (column: Float64Array): Float64Array => {
        const copy = column.slice();
        // X1 in the lowest story of the first action
        copy[0] = (copy[0] ?? 0) * (1 + fault);
        return copy;
      };
      const shearKip = spoil(shares.totalKip);
      const parts = along && { xKip: spoil(along.xKip), yKip: along.yKip };
      const momentKipIn = lateralMoments(model, shearKip, actions.length);
      const residuals = actions.flatMap((action, index) =>
        action.variant === 'torsion' || (along && action.variant !== '0')
          ? []
          : lateralBalance(
              model,
              action,
              index,
              { shearKip, momentKipIn, along: parts, openTorqueKipIn },
              null,
              transferPoints(model),
            ).flatMap(({ lines }) => lines.map(({ residual }) => residual)),
      );
      return [basis, Math.max(...residuals)];
    }),
  );
}

describe('balance of sixty stories', () => {
  it.each<[string, Partial<Settings>]>([
    ['with both variants amplified', {}],
    ['on rotation springs at three bases', { baseSprings: { X1: 9_000_000, Y1: 2_000_000, Y3: 60_000 } }],
    ['with walls cracked unevenly', { stiffness: { flexure: 0.1, shear: 3, end: 'cantilever', unitWeight: null } }],
  ])('closes under 1e-9 in every basis %s', (_, more) => {
    const worst = worstResiduals(tower(more), 0);
    expect(Object.keys(worst)).toEqual(['rigid', 'compatible', 'flexible']);
    for (const residual of Object.values(worst)) expect(residual).toBeLessThan(1e-9);
  });

  it('breaks in every basis where one share is off by a millionth', () => {
    for (const residual of Object.values(worstResiduals(tower({}), 1e-6))) expect(residual).toBeGreaterThan(1e-8);
  });
});
