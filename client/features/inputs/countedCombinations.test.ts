import { expect, it } from 'vitest';

import { defaultCombinations } from '#shared/combination-text/defaultCombinations';
import { parseCombination } from '#shared/combination-text/parseCombination';
import { expandCombinations } from '#shared/engineering/combinations/expandCombinations';
import type { LateralAction } from '#shared/engineering/distribution/lateralActions';

import { countedCombinations, lateralCases, type LateralCase } from './countedCombinations.ts';

const criteria = { loads: 'asce7-22', liveFactor: 1, sds: 0.5, rho: 1.3, omega0: 2.5, accidental: 0.05 } as const;
const cases: readonly LateralCase[] = [
  { name: 'WX', kind: 'wind' },
  { name: 'WY', kind: 'wind' },
  { name: 'EX', kind: 'seismic' },
  { name: 'EY', kind: 'seismic' },
  { name: 'Soil', kind: 'other' },
];
const none = new Float64Array();

/** What the engine makes of them, through its own expansion. */
function byEngine(accidental: number): number[] {
  const actions = cases.flatMap(({ name, kind }, caseIndex) => {
    const variants = kind === 'seismic' && accidental > 0 ? (['0', '+', '-'] as const) : (['0'] as const);
    return variants.map((variant): LateralAction => {
      const story = { storyFxKip: none, storyFyKip: none, storyTorqueKipIn: none };
      return { caseIndex, case: name, kind: kind as LateralAction['kind'], variant, ...story };
    });
  });
  return defaultCombinations('asce7-22', 1).map(({ name, expression }) => {
    const reading = parseCombination(expression, { SDS: 0.5, rho: 1.3, Omega0: 2.5 });
    const list = reading.ok ? reading.alternatives.map((one) => ({ name, ...one })) : [];
    return expandCombinations(list, actions).expansions.length;
  });
}

it.each([0.05, 0])('counts load states as the engine expands them, accidental %s', (accidental) => {
  const rows = countedCombinations({ ...criteria, accidental }, cases);
  expect(rows.map((row) => row.count)).toEqual(byEngine(accidental));
});

it('counts by hand: 0.9D + 1.0W twice for each of two wind cases; E at +e and -e both ways for each of two', () => {
  const counts = new Map(countedCombinations(criteria, cases).map((row) => [row.name, row.count]));
  expect(counts.get('ASCE 7-22 2.3.1 (1)')).toBe(1);
  expect(counts.get('ASCE 7-22 2.3.1 (5)')).toBe(4);
  expect(counts.get('ASCE 7-22 2.3.6 (7)')).toBe(8);
});

it('takes each case of the forces once', () => {
  const forces = [
    { case: 'EX', kind: 'seismic' },
    { case: 'EX', kind: 'seismic' },
    { case: 'W', kind: 'wind' },
  ];
  expect(lateralCases(forces)).toEqual([
    { name: 'EX', kind: 'seismic' },
    { name: 'W', kind: 'wind' },
  ]);
});
