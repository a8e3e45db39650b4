import { expect, it } from 'vitest';

import { sampleInput } from '../../engine/testing/sampleBuilding.ts';
import { farthestModel, rigidityComparison, sayComparison } from './rigidityComparison.ts';

const walls = rigidityComparison(sampleInput, 'L2') ?? [];

it('shares two walls of 24 and 20 ft by length in shear and by its cube in flexure', () => {
  const q1 = walls.find((one) => one.wall === 'Q1');
  expect(q1?.share['shear only']).toBeCloseTo(24 / 44, 6);
  expect(q1?.share['flexure only']).toBeCloseTo(13824 / (13824 + 8000), 6);
  // equal walls have halves whatever the model
  expect(walls.find((one) => one.wall === 'P1')?.share['fixed ends']).toBeCloseTo(0.5, 9);
});

it('names the wall and model that lie farthest apart', () => {
  const p1 = walls.find((one) => one.wall === 'P1');
  expect(p1 && farthestModel(p1)).toBeNull();
  // as set 0.595: 0.050 above shear only, 0.038 below flexure only
  const q1 = walls.find((one) => one.wall === 'Q1');
  expect(q1 && farthestModel(q1)?.model).toBe('shear only');
  expect(sayComparison(walls)).toMatch(/^Q[12] moves most: .* as set, .* with shear only\./);
  expect(sayComparison(walls.filter((one) => one.wall.startsWith('P')))).toMatch(/^No model moves a share/);
});

it('has nothing to compare where the tables do not fit together', () => {
  const tables = { ...sampleInput.tables, walls: sampleInput.tables.walls.map((row) => ({ ...row, to_level: 'L9' })) };
  expect(rigidityComparison({ ...sampleInput, tables }, 'L2')).toBeNull();
  expect(rigidityComparison(sampleInput, 'L9')).toBeNull();
});
