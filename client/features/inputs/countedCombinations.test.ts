import { expect, it } from 'vitest';

import { countedCombinations, lateralCases, type LateralCase } from './countedCombinations.ts';

const criteria = {
  loads: 'asce7-22',
  liveFactor: 1,
  sds: 0.5,
  rho: 1.3,
  omega0: 2.5,
  accidental: 0.05,
  windCases: false,
  orthogonal: 0,
} as const;
const cases: readonly LateralCase[] = [
  { name: 'WX', kind: 'wind', direction: 'x' },
  { name: 'WY', kind: 'wind', direction: 'y' },
  { name: 'EX', kind: 'seismic', direction: 'x' },
  { name: 'EY', kind: 'seismic', direction: 'y' },
  { name: 'Soil', kind: 'other', direction: 'x' },
];

const counts = (more: Partial<Record<keyof typeof criteria, unknown>> = {}) =>
  new Map(countedCombinations({ ...criteria, ...more } as typeof criteria, cases).map((row) => [row.name, row.count]));

it('counts by hand: 0.9D + 1.0W twice for each of two wind cases; E at +e and -e both ways for each of two', () => {
  expect(counts().get('ASCE 7-22 2.3.1 (1)')).toBe(1);
  expect(counts().get('ASCE 7-22 2.3.1 (5)')).toBe(4);
  expect(counts().get('ASCE 7-22 2.3.6 (7)')).toBe(8);
  expect(counts({ accidental: 0 }).get('ASCE 7-22 2.3.6 (7)')).toBe(4);
});

it('counts wind cases by hand: 4 of Case 1, 8 of Case 2, 4 of Case 3, 16 of Case 4', () => {
  expect(counts({ windCases: true }).get('ASCE 7-22 2.3.1 (5)')).toBe(32);
});

it('counts orthogonal pairs by hand: 2 ways round, 4 signs, 4 places of the eccentricity', () => {
  expect(counts({ orthogonal: 0.3 }).get('ASCE 7-22 2.3.6 (7)')).toBe(32);
});

it('takes each case of the forces once, in the direction of its larger total', () => {
  const forces = [
    { case: 'EX', kind: 'seismic', fx: 10, fy: 1 },
    { case: 'EX', kind: 'seismic', fx: 8, fy: 1 },
    { case: 'W', kind: 'wind', fx: 0, fy: -5 },
  ] as const;
  expect(lateralCases(forces)).toEqual([
    { name: 'EX', kind: 'seismic', direction: 'x' },
    { name: 'W', kind: 'wind', direction: 'y' },
  ]);
});
