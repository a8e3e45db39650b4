import { expect, test } from 'vitest';

import { wallRigidityKipPerIn } from './wallRigidity.ts';

const wall = {
  heightIn: 120,
  lengthIn: 240,
  thicknessIn: 10,
  fcPsi: 4000,
  flexureFactor: 0.5,
  shearFactor: 1,
  endFactor: 3,
  unitWeightPcf: null,
} as const;

test('a cantilever of 10 ft by 20 ft, 10 in thick, by hand', () => {
  // Ec = 57,000 x 63.2456 = 3,605.0 ksi; Ie = 0.5 x 10 x 240^3/12 = 5,760,000 in4;
  // flexure 120^3/(3 x 3,605.0 x 5,760,000) = 2.77394e-5; shear 1.2 x 120/(0.4 x 3,605.0 x 2,400) = 4.16092e-5 in/kip
  expect(wallRigidityKipPerIn(wall)).toBeCloseTo(1 / (2.77394e-5 + 4.16092e-5), 0);
});

test('both ends fixed bend a quarter as much', () => {
  const flexible = 1 / wallRigidityKipPerIn(wall);
  const fixed = 1 / wallRigidityKipPerIn({ ...wall, endFactor: 12 });
  expect(flexible - fixed).toBeCloseTo(0.75 * 2.77394e-5, 9);
});

test('a given unit weight of 145 pcf: Ec = 33 x 145^1.5 x 63.2456 = 3,644.1 ksi against 3,605.0', () => {
  const ratio = wallRigidityKipPerIn({ ...wall, unitWeightPcf: 145 }) / wallRigidityKipPerIn(wall);
  expect(ratio).toBeCloseTo(3644.15 / 3604.997, 4);
});
