import { expect, test } from 'vitest';

import { toModel } from '../model/toModel.ts';
import { storyRigidities } from '../rigidity/storyRigidities.ts';
import { building, force, level, wall } from '../testing/handBuilding.ts';

import { lateralActions } from './lateralActions.ts';
import { rigidBasis, storyStiffnesses } from './rigidBasis.ts';

/** One story of 10 ft: two equal walls in y at x = 0 and 60, two equal walls in x at y = 0 and 40; all of one rigidity. */
const square = building(
  {
    levels: [level('Roof', 10, { x: 36, y: 20, extent_x: 60, extent_y: 40, edge_x: 0, edge_y: 0 })],
    walls: [
      wall('Y1', [0, 10, 0, 30], 10, ['Roof', 'Roof']),
      wall('Y2', [60, 10, 60, 30], 10, ['Roof', 'Roof']),
      wall('X1', [20, 0, 40, 0], 10, ['Roof', 'Roof']),
      wall('X2', [20, 40, 40, 40], 10, ['Roof', 'Roof']),
    ],
    forces: [force('Roof', 'E', 'seismic', 0, 100)],
  },
  { accidental: 0.05 },
);

function solve(input: typeof square) {
  const model = toModel(input);
  const rigidities = storyRigidities(model);
  const stories = storyStiffnesses(model, rigidities);
  if ('problems' in stories) throw new Error(stories.problems.map(({ message }) => message).join());
  const { directKip, torsionalKip } = rigidBasis(model, rigidities, stories.stiffness, lateralActions(model));
  if (!directKip || !torsionalKip) throw new Error('no parts');
  return { shares: { directKip, torsionalKip }, stiffness: stories.stiffness };
}

test('direct and torsional shares by hand', () => {
  // e = 36 - 30 = 6 ft, T = 600 kip-ft; sum k r^2 = 2 k 30^2 + 2 k 20^2 = 2,600 k; walls in y: 600 x 30/2,600 = 6.923 kip
  const { shares, stiffness } = solve(square);
  const variant0 = { direct: shares.directKip.slice(0, 4), torsional: shares.torsionalKip.slice(0, 4) };
  expect([...variant0.direct].map((value) => Math.round(value * 1000) / 1000)).toEqual([50, 50, 0, 0]);
  const y = (600 * 30) / 2600;
  const x = (600 * 20) / 2600;
  const torsional = [...variant0.torsional];
  expect(torsional[0]).toBeCloseTo(-y, 10);
  expect(torsional[1]).toBeCloseTo(y, 10);
  expect(torsional[2]).toBeCloseTo(x, 10);
  expect(torsional[3]).toBeCloseTo(-x, 10);
  expect((stiffness[0]?.centerXIn ?? 0) / 12).toBeCloseTo(30, 10);
  expect((stiffness[0]?.centerYIn ?? 0) / 12).toBeCloseTo(20, 10);
});

test('accidental eccentricity adds 5 % of the extent across the force', () => {
  // + adds 0.05 x 60 x 100 = 300 kip-ft: T = 900; - leaves 300
  const { shares } = solve(square);
  expect(shares.torsionalKip[4 + 1]).toBeCloseTo((900 * 30) / 2600, 10);
  expect(shares.torsionalKip[8 + 1]).toBeCloseTo((300 * 30) / 2600, 10);
});

test('a force in x takes its accidental torque with the other sign', () => {
  const input = { ...square, tables: { ...square.tables, forces: [force('Roof', 'E', 'seismic', 100, 0)] } };
  // no eccentricity of its own; + adds 0.05 x (60 x 0 - 40 x 100) = -200 kip-ft
  const { shares } = solve(input);
  expect(shares.torsionalKip[4 + 2]).toBeCloseTo((-200 * 20) / 2600, 10);
});

test('a story without walls in x is refused by name', () => {
  const input = { ...square, tables: { ...square.tables, walls: square.tables.walls.slice(0, 2) } };
  const model = toModel(input);
  const outcome = storyStiffnesses(model, storyRigidities(model));
  expect('problems' in outcome && outcome.problems[0]?.message).toContain('Story Roof');
  expect('problems' in outcome && outcome.problems[0]?.message).toContain('no wall in x');
});

test('walls through one point are refused', () => {
  const walls = [wall('A', [0, -10, 0, 10], 10, ['Roof', 'Roof']), wall('B', [-10, 0, 10, 0], 10, ['Roof', 'Roof'])];
  const model = toModel({ ...square, tables: { ...square.tables, walls } });
  const outcome = storyStiffnesses(model, storyRigidities(model));
  expect('problems' in outcome && outcome.problems[0]?.message).toContain('one point');
});
