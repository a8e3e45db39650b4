import { expect, test } from 'vitest';

import { toModel } from '../model/toModel.ts';
import { building, level, wall } from '../testing/handBuilding.ts';

import { compareRigidityModels } from './compareModels.ts';

/** Walls of 10 and 20 ft in x, one thickness, stories of 10 ft. */
const model = toModel(
  building({
    levels: [level('Roof', 10), level('L2', 10)],
    walls: [
      wall('short', [0, 0, 10, 0], 10, ['L2', 'Roof']),
      wall('long', [0, 30, 20, 30], 10, ['L2', 'Roof']),
      wall('across', [0, 0, 0, 15], 10, ['L2', 'Roof']),
    ],
  }),
);

test('shares of the short wall by hand', () => {
  const short = compareRigidityModels(model, 0).find((one) => one.wall === 'short');
  // by inertia 1 : 8, by area 1 : 2
  expect(short?.share['flexure only']).toBeCloseTo(1 / 9, 9);
  expect(short?.share['shear only']).toBeCloseTo(1 / 3, 9);
  // one factor on flexure and shear: k ~ 1/(4 r^3/f + 3 r), r = 1 and 0.5, f = 0.35: 1/(4/0.35 + 3) against 1/(0.5/0.35 + 1.5)
  const k = (r: number, f: number) => 1 / ((4 * r * r * r) / f + 3 * r);
  expect(short?.share['cracked 0.35']).toBeCloseTo(k(1, 0.35) / (k(1, 0.35) + k(0.5, 0.35)), 9);
  expect(short?.share['as set']).toBeCloseTo(k(1, 0.5) / (k(1, 0.5) + k(0.5, 0.5)), 9);
});

test('height to the base makes the share that of bending in a high wall', () => {
  const at = (story: number) => compareRigidityModels(model, story).find((one) => one.wall === 'short');
  expect(at(0)?.share['height to the base']).toBeCloseTo(at(0)?.share['as set'] ?? 0, 12);
  expect(at(1)?.share['height to the base']).toBeLessThan(at(1)?.share['as set'] ?? 0);
});

test('a wall across stands alone', () => {
  expect(compareRigidityModels(model, 0).find((one) => one.wall === 'across')?.share['as set']).toBe(1);
});
