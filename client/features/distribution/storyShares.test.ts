import { expect, it } from 'vitest';

import { bandAt } from '../../app/bandAt.ts';
import { sample, sampleTables } from '../../engine/testing/sampleBuilding.ts';
import { sayCenters } from './sayCenters.ts';
import { storyShares } from './storyShares.ts';

const choice = { basis: 'rigid', case: 'EY', variant: '0', level: 'L2' } as const;

it('shares the story shear between two equal walls by halves', () => {
  // 60 + 45 + 30 kip at and above L2; P1 and P2 are alike and stand 40 ft each side of the force
  const shares = storyShares(sample.document, sampleTables.walls, choice);
  expect(shares.size).toBeCloseTo(135, 9);
  expect(shares.sum).toBeCloseTo(135, 9);
  const p1 = shares.walls.find((one) => one.wall === 'P1');
  expect(p1?.total).toBeCloseTo(67.5, 9);
  expect(p1?.share).toBeCloseTo(0.5, 9);
});

it('gives rigidities as part of the story', () => {
  const { walls } = storyShares(sample.document, sampleTables.walls, choice);
  expect(walls.reduce((sum, one) => sum + one.rigidityShare, 0)).toBeCloseTo(1, 12);
});

it('has no share where the story has no shear', () => {
  const levels = sample.document.levels.map((level) => ({ ...level, shear: {} }));
  const { walls, size } = storyShares({ ...sample.document, levels }, sampleTables.walls, choice);
  expect(size).toBe(0);
  expect(walls.every((one) => one.share === null)).toBe(true);
});

it('finds the band of a wall that stands in a story', () => {
  const rows = sampleTables.walls.map((row) => (row.wall === 'P1' ? { ...row, to_level: 'L3' } : row));
  expect(bandAt(sample.document.levels, rows, 'P1', 'L3')?.wall).toBe('P1');
  expect(bandAt(sample.document.levels, rows, 'P1', 'Roof')).toBeUndefined();
});

it('says the distance between the centers with its direction', () => {
  const level = sample.document.levels.find((one) => one.level === 'L2');
  if (!level) throw new Error('no L2');
  const moved = { ...level, rigidity: { x: level.point.x - 8, y: level.point.y + 2.5 } };
  // 8 of 80 ft and 2.5 of 50 ft
  expect(sayCenters(moved, 'center of mass', 'us')).toBe(
    'Story of L2: center of rigidity 8.0 ft toward −x and 2.5 ft toward +y of the center of mass, 10.0 % and 5.0 % of the extent.',
  );
});
