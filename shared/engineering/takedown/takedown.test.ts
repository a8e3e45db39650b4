import { expect, test } from 'vitest';

import { toModel } from '../model/toModel.ts';
import { building, gravity, level, wall } from '../testing/handBuilding.ts';

import { gravityTakedown } from './gravityTakedown.ts';
import { lateralMoments } from './lateralMoments.ts';

/** Three stories of 10, 12 and 14 ft from the top; one wall, 20 ft long below L3 and 16 ft above, both starting at x = 0. */
const stepped = building(
  {
    levels: [level('Roof', 10), level('L3', 12), level('L2', 14)],
    walls: [
      wall('A', [0, 0, 16, 0], 10, ['Roof', 'Roof']),
      wall('A', [0, 0, 20, 0], 12, ['L2', 'L3'], { opening: 0.25 }),
    ],
    gravity: [gravity('Roof', 'A', 40, { live: 10, eccentricity: 1.5 }), gravity('L3', 'A', 60, { live: 30, snow: 5 })],
  },
  { selfWeight: true },
);

test('axial with self-weight, by hand', () => {
  const { axialKip, selfWeightKip } = gravityTakedown(toModel(stepped));
  // self-weight: Roof 16 x 10/12 x 10 x 0.15 = 20.0; L3 20 x 1 x 12 x 0.15 x 0.75 = 27.0; L2 20 x 1 x 14 x 0.15 x 0.75 = 31.5
  expect([...selfWeightKip].map((kip) => Math.round(kip * 1e6) / 1e6)).toEqual([31.5, 27, 20]);
  expect(axialKip.D[2]).toBeCloseTo(60, 9);
  expect(axialKip.D[1]).toBeCloseTo(147, 9);
  expect(axialKip.D[0]).toBeCloseTo(178.5, 9);
  expect(axialKip.L[0]).toBeCloseTo(40, 9);
  expect(axialKip.S[0]).toBeCloseTo(5, 9);
});

test('moments from eccentricity and from the centroid that moves', () => {
  const { momentKipIn } = gravityTakedown(toModel(stepped));
  // Roof: 40 x 1.5 = 60 kip-ft. L3: the upper centroid stands 8 - 10 = -2 ft along the wall: 60 + 60 x (-2) = -60 kip-ft
  expect((momentKipIn.D[2] ?? 0) / 12).toBeCloseTo(60, 9);
  expect((momentKipIn.D[1] ?? 0) / 12).toBeCloseTo(-60, 9);
  expect((momentKipIn.D[0] ?? 0) / 12).toBeCloseTo(-60, 9);
});

test('lateral moments are sums of shear times height', () => {
  const model = toModel(stepped);
  const moments = lateralMoments(model, Float64Array.of(30, 20, 10), 1);
  // Roof 10 x 10 = 100; L3 + 20 x 12 = 340; L2 + 30 x 14 = 760 kip-ft
  expect([...moments].map((value) => value / 12)).toEqual([760, 340, 100]);
});
