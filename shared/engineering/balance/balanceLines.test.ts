import { expect, test } from 'vitest';

import { lateralActions } from '../distribution/lateralActions.ts';
import { rigidBasis, storyStiffnesses } from '../distribution/rigidBasis.ts';
import { toModel } from '../model/toModel.ts';
import { storyRigidities } from '../rigidity/storyRigidities.ts';
import { lateralMoments } from '../takedown/lateralMoments.ts';
import { transferPoints } from '../takedown/transferred.ts';
import { building, force, level, wall } from '../testing/handBuilding.ts';

import { lateralBalance } from './lateralBalance.ts';

/** Two stories, five walls; C starts above the base, so that its moment has to be carried as transferred. */
const input = building({
  levels: [
    level('Roof', 11, { x: 31, y: 22, extent_x: 60, extent_y: 40 }),
    level('L2', 13, { x: 29, y: 21, extent_x: 60, extent_y: 40 }),
  ],
  walls: [
    wall('A', [0, 5, 0, 30], 12, ['L2', 'Roof']),
    wall('B', [60, 10, 60, 30], 10, ['L2', 'Roof']),
    wall('C', [30, 10, 30, 34], 10, ['Roof', 'Roof']),
    wall('D', [10, 0, 36, 0], 10, ['L2', 'Roof']),
    wall('E', [20, 40, 40, 30], 10, ['L2', 'Roof']),
  ],
  forces: [force('Roof', 'E', 'seismic', 12, 90), force('L2', 'E', 'seismic', 5, 40, { mz: 70 })],
});

function residuals(fault: number) {
  const model = toModel(input);
  const actions = lateralActions(model);
  const rigidities = storyRigidities(model);
  const stories = storyStiffnesses(model, rigidities);
  if ('problems' in stories) throw new Error('refused');
  const shares = rigidBasis(model, rigidities, stories.stiffness, actions);
  const shear = shares.totalKip.slice();
  shear[0] = (shear[0] ?? 0) * (1 + fault);
  const moments = lateralMoments(model, shear, actions.length);
  return actions.flatMap((action, index) =>
    lateralBalance(
      model,
      action,
      index,
      { shearKip: shear, momentKipIn: moments, along: null, openTorqueKipIn: null },
      null,
      transferPoints(model),
    ).flatMap(({ lines }) => lines.map(({ residual }) => residual)),
  );
}

test('every line closes, a transferred wall with it', () => {
  const all = residuals(0);
  expect(all).toHaveLength(3 * 2 * 5);
  expect(Math.max(...all)).toBeLessThan(1e-12);
});

test('one share off by a millionth breaks the balance', () => {
  expect(Math.max(...residuals(1e-6))).toBeGreaterThan(1e-8);
});
