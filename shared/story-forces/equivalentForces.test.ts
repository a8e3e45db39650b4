import { readFileSync } from 'node:fs';
import { join } from 'node:path';

import { describe, expect, it } from 'vitest';

import { equivalentForces, heightExponent, sumsFromTop } from './equivalentForces.ts';

const published = (name: string): unknown =>
  JSON.parse(readFileSync(join(import.meta.dirname, `../../fixtures/published/${name}.json`), 'utf8'));

interface D01 {
  readonly outputs: Readonly<Record<string, number>>;
  readonly recomputed: Readonly<Record<string, readonly number[]>>;
}
interface D04 {
  readonly inputs: { readonly 'F_kip top-down': readonly number[] };
  readonly outputs: { readonly V_kip: readonly number[]; readonly M_kipft: readonly number[] };
}

/** Rel 0.004 is the tolerance of the case: the page rounds k and wh^k. */
const within = (value: number | undefined, expected: number | undefined): void => {
  expect(Math.abs((value ?? NaN) / (expected ?? NaN) - 1)).toBeLessThan(0.004);
};

describe('exponent k', () => {
  it.each([
    [0.2, 1],
    [0.5, 1],
    [0.6, 1.05],
    [1.5, 1.5],
    [2.5, 2],
    [4, 2],
  ])('at %d s is %d', (period, k) => {
    expect(heightExponent(period)).toBeCloseTo(k, 12);
  });
});

describe('D01: McCormac and Brown, 9th ed., Example D.1 (printed text read)', () => {
  const { outputs, recomputed } = published('D01-McCormac-D.1') as D01;
  // roof 200 kip and five floors of 450 kip, stories of 12 ft, T 0.6 s
  const levels = [6, 5, 4, 3, 2, 1].map((floor) => ({
    level: floor === 6 ? 'roof' : `level ${floor + 1}`,
    weight: floor === 6 ? 200 : 450,
    height: 12 * floor,
  }));
  const forces = equivalentForces(levels, outputs.V_kip ?? NaN, 0.6) ?? [];

  it('gives the printed forces of roof and uppermost floor', () => {
    within(forces[0]?.force, outputs.F_roof_kip);
    within(forces[1]?.force, outputs.F_60ft_kip);
  });

  it('gives the recomputed forces of every floor, and the base shear as their sum', () => {
    const bottomUp = recomputed['all Fx kip bottom-up (mine)'] ?? [];
    expect(bottomUp).toHaveLength(6);
    [...forces].reverse().forEach(({ force }, index) => within(force, bottomUp[index]));
    expect(forces[5]?.shear).toBeCloseTo(598, 9);
  });
});

describe('D04: story shears and overturning of given forces (printed text read)', () => {
  const { inputs, outputs } = published('D04-PE-overturning') as D04;
  it('sums forces from the top to the printed shears, and shears over 20 ft to the printed moments', () => {
    const shears = sumsFromTop(inputs['F_kip top-down']);
    expect(shears).toEqual(outputs.V_kip);
    expect(sumsFromTop(shears.map((shear) => shear * 20))).toEqual(outputs.M_kipft);
  });
});

describe('equivalentForces', () => {
  it('does not depend on the units of weight and height', () => {
    const levels = [
      { level: 'Roof', weight: 310, height: 36 },
      { level: 'L2', weight: 420, height: 14 },
    ];
    const metric = levels.map(({ level, weight, height }) => ({
      level,
      weight: weight * 4.448,
      height: height * 0.3048,
    }));
    const [one, other] = [equivalentForces(levels, 90, 1.1), equivalentForces(metric, 90, 1.1)];
    expect(other?.[0]?.force).toBeCloseTo(one?.[0]?.force ?? NaN, 9);
  });

  it('has no answer without weight', () => {
    expect(equivalentForces([{ level: 'Roof', weight: 0, height: 10 }], 90, 1)).toBeNull();
    expect(equivalentForces([], 90, 1)).toBeNull();
  });
});
