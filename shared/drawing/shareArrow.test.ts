import { expect, it } from 'vitest';

import { arrowParts, largestShare } from './shareArrow.ts';

// 84 px for the largest force of 100: 0.84 px a unit of force
it('adds torsion in the same sense after the direct part', () => {
  expect(arrowParts(50, 25, 75, 100)).toEqual({ sense: 1, solid: 42, hatched: 21, hollow: 0 });
});

it('shows what torsion relieves beyond the head', () => {
  expect(arrowParts(50, -25, 25, 100)).toEqual({ sense: 1, solid: 21, hatched: 0, hollow: 21 });
});

it('turns with the sign of the force', () => {
  expect(arrowParts(-50, -25, -75, 100)).toEqual({ sense: -1, solid: 42, hatched: 21, hollow: 0 });
});

it('is hatched alone where torsion turns the force round or acts by itself', () => {
  expect(arrowParts(20, -70, -50, 100)).toEqual({ sense: -1, solid: 0, hatched: 42, hollow: 0 });
  expect(arrowParts(0, 50, 50, 100)).toEqual({ sense: 1, solid: 0, hatched: 42, hollow: 0 });
});

it('draws nothing under 1.5 px', () => {
  expect(arrowParts(1, 0.5, 1.5, 100)).toBeNull();
  expect(arrowParts(0, 0, 0, 0)).toBeNull();
});

it('gives the longest arrow to the largest direct or total force', () => {
  expect(
    largestShare([
      { direct: 90, total: 40 },
      { direct: -10, total: -60 },
    ]),
  ).toBe(90);
});
