import { expect, it } from 'vitest';

import type { BuildingInput, OverrideRow } from '#shared/engineering/input';
import { runBuilding } from '#shared/result/runBuilding';

import { sampleInput } from '../engine/testing/sampleBuilding.ts';
import { shareSums } from './shareSums.ts';

const override = (part: Partial<OverrideRow>): OverrideRow => ({
  kind: 'transfer',
  level: 'L3',
  wall: 'P1',
  case: 'EY',
  shear: null,
  axial: null,
  moment: null,
  share: null,
  reason: 'held by hand',
  ...part,
});

/** The sample with Q2 askew, a transfer onto P1 and an assigned share of P2, under every basis. */
const hard: BuildingInput = {
  settings: { ...sampleInput.settings, basis: ['rigid', 'flexible', 'compatible'] },
  tables: {
    ...sampleInput.tables,
    walls: sampleInput.tables.walls.map((wall) =>
      wall.wall === 'Q2' ? { ...wall, y1: 30, share_x: 0.4, share_y: 0.1 } : wall,
    ),
    overrides: [override({ shear: 12, moment: 90 }), override({ kind: 'share', level: 'L2', wall: 'P2', share: 0.4 })],
  },
};

it.each(['EX', 'EY'])('meet the balance of %s with skew walls, transfers and assigned shares', (name) => {
  const outcome = runBuilding(hard);
  if (!outcome.ok) throw new Error(outcome.problems.map((problem) => problem.message).join('; '));
  const sums = shareSums(outcome.document, hard.tables.walls, name);
  const bases = new Set(sums.map((one) => one.basis));
  expect(bases).toEqual(new Set(['rigid', 'flexible', 'compatible']));
  for (const one of sums)
    expect([one.basis, one.level, one.direction, one.residual < 1e-9]).toEqual([
      one.basis,
      one.level,
      one.direction,
      true,
    ]);
});

it('is silent where a wall of the result stands in no row', () => {
  const outcome = runBuilding(sampleInput);
  if (!outcome.ok) throw new Error('the sample does not compute');
  const fewer = sampleInput.tables.walls.filter((wall) => wall.wall !== 'Q2');
  expect(shareSums(outcome.document, fewer, 'EY')).toEqual([]);
});
