import { describe, expect, it } from 'vitest';

import d04 from '../../../fixtures/published/D04-PE-overturning.json';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import { handPlan } from '../properties/handPlan.ts';

/**
 * Story shears and overturning moments down the height against printed values, ft and kip. Source: D04 Structural Wiki, open
 * PE seismic practice question of 4 Apr 2021, solution sheet. The printed frame is one line; here two equal walls carry it.
 */
describe('PE practice question of 4 Apr 2021', () => {
  const names = ['F4', 'F3', 'F2', 'F1'];
  const outcome = runBuilding(
    handPlan(
      {
        heights: [20, 20, 20, 20],
        extent: [40, 40],
        walls: [
          { wall: 'X1', ends: [10, 5, 30, 5], thickness: 10 },
          { wall: 'X2', ends: [10, 35, 30, 35], thickness: 10 },
          { wall: 'Y1', ends: [0, 10, 0, 30], thickness: 10 },
          { wall: 'Y2', ends: [40, 10, 40, 30], thickness: 10 },
        ],
        forces: names.map((level, i) => ({
          level,
          kind: 'seismic' as const,
          fx: d04.inputs['F_kip top-down'][i] ?? NaN,
          fy: 0,
        })),
      },
      { ...settingsDefaults('us'), name: 'Example', accidental: 0 },
    ),
  );

  const stories = (['rigid', 'compatible'] as const).flatMap((basis) =>
    names.map((level, i) => [basis, level, d04.outputs.V_kip[i] ?? NaN, d04.outputs.M_kipft[i] ?? NaN] as const),
  );
  it.each(stories)('%s, story of %s: %d kip, %d kip-ft at its bottom', (basis, level, shear, moment) => {
    if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
    const walls = outcome.document.lateral.filter(
      (row) => row.basis === basis && row.level === level && row.wall.startsWith('X'),
    );
    expect(walls).toHaveLength(2);
    expect(walls.reduce((sum, row) => sum + row.shear, 0)).toBeCloseTo(shear, 9);
    expect(walls.reduce((sum, row) => sum + row.moment, 0)).toBeCloseTo(moment, 9);
    const story = outcome.document.levels.find((row) => row.level === level);
    expect(story?.shear.P?.vx).toBeCloseTo(shear, 9);
  });
});
