import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { ResultAction } from '../../contracts/result.ts';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { BuildingInput, ForceRow, GravityRow, Settings } from '../input.ts';

import { handPlan } from './handPlan.ts';

/**
 * Expanded combinations of one story by hand: two equal walls each way on a square of 40 ft, 10 ft high, so that each wall of a
 * direction takes half of a force through the middle.
 */
const force = (name: string, kind: ForceRow['kind'], fx: number, fy: number): ForceRow => ({
  level: 'F1',
  case: name,
  kind,
  fx,
  fy,
  x: null,
  y: null,
  mz: null,
});

const gravity: GravityRow = {
  level: 'F1',
  wall: 'X1',
  dead: 100,
  live: 40,
  roof_live: 10,
  snow: 16,
  tributary_area: null,
  eccentricity: 0.5,
  live_class: null,
};

function building(
  forces: readonly ForceRow[],
  settings: Partial<Settings>,
  expressions: readonly string[] = [],
): BuildingInput {
  const plan = handPlan(
    {
      heights: [10],
      extent: [40, 40],
      walls: [
        { wall: 'X1', ends: [10, 0, 30, 0], thickness: 10 },
        { wall: 'X2', ends: [10, 40, 30, 40], thickness: 10 },
        { wall: 'Y1', ends: [0, 10, 0, 30], thickness: 10 },
        { wall: 'Y2', ends: [40, 10, 40, 30], thickness: 10 },
      ],
      forces,
    },
    { ...settingsDefaults('us'), name: 'By hand', selfWeight: false, ...settings },
  );
  const combinations = expressions.map((expression) => ({ name: null, expression }));
  return { ...plan, tables: { ...plan.tables, gravity: [gravity], combinations } };
}

/** Rows of `rigid`; in one story the whole height is the story, so that `compatible` has to give the same rows. */
function actionsOf(input: BuildingInput, wall: string): readonly ResultAction[] {
  const outcome = runBuilding(input, { allActions: true });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  const rowsOf = (basis: string): ResultAction[] =>
    outcome.document.actions.filter((action) => action.wall === wall && action.basis === basis);
  const [rigid, compatible] = [rowsOf('rigid'), rowsOf('compatible')];
  expect(compatible.map(({ combination }) => combination)).toEqual(rigid.map(({ combination }) => combination));
  expectTriples(compatible, triples(rigid));
  return rigid;
}

const triples = (actions: readonly ResultAction[]): number[][] =>
  actions.map(({ axial, moment, shear }) => [axial, moment, shear]).sort((a, b) => (a[2] ?? 0) - (b[2] ?? 0));

function expectTriples(actions: readonly ResultAction[], expected: readonly (readonly number[])[]): void {
  const found = triples(actions);
  expect(found).toHaveLength(expected.length);
  found.forEach((values, i) => {
    values.forEach((value, n) => {
      expect(value).toBeCloseTo(expected[i]?.[n] ?? NaN, 9);
    });
  });
}

describe('typed combinations by hand', () => {
  it('1.2D+1E+2L: axial 1.2 x 100 + 2 x 40 = 200 kip, E both ways, half of 20 kip and 10 kip x 10 ft on P e = 100 kip-ft', () => {
    const input = building([force('EX', 'seismic', 20, 0)], { accidental: 0 }, ['1.2D+1E+2L']);
    expectTriples(actionsOf(input, 'X1'), [
      [200, 100 - 100, -10],
      [200, 100 + 100, 10],
    ]);
    expectTriples(actionsOf(input, 'Y1'), [
      [0, 0, 0],
      [0, 0, 0],
    ]);
  });

  it('the eccentricity of 5 % turns 20 kip by 40 kip-ft: each wall gains or loses 0.5 kip', () => {
    // J = 4 k 20^2 ft2; k r / J = 1 / 80 a kip-ft; + adds 0.05 (0 - 40 x 20) = -40 kip-ft, X1 at y 0 has the arm +20
    const input = building([force('EX', 'seismic', 20, 0)], { accidental: 0.05 }, ['0.9D + E']);
    expect(triples(actionsOf(input, 'X1')).map(([, , shear]) => shear)).toEqual([
      expect.closeTo(-10.5, 9),
      expect.closeTo(-9.5, 9),
      expect.closeTo(9.5, 9),
      expect.closeTo(10.5, 9),
    ]);
    const plus = runBuilding(input);
    if (!plus.ok) throw new Error('refused');
    const share = plus.document.distribution.find((row) => row.wall === 'X1' && row.variant === '+');
    expect(share?.total).toBeCloseTo(9.5, 9);
  });

  it('H keeps its own sign, alternatives of or stand apart, rho and SDS are the building’s', () => {
    const forces = [force('soil', 'other', 6, 0), force('EX', 'seismic', 20, 0)];
    const settings = { accidental: 0, sds: 0.5, rho: 1.3 };
    expectTriples(actionsOf(building(forces, settings, ['D + 1.6H']), 'X1'), [[100, 50 + 48, 4.8]]);
    expectTriples(actionsOf(building(forces, settings, ['(1.2 + 0.2SDS)D + rho E']), 'X1'), [
      [130, 65 - 130, -13],
      [130, 65 + 130, 13],
    ]);
    const live = triples(actionsOf(building(forces, settings, ['D + 0.5(Lr or S)', 'E']), 'X1')).map(
      ([axial]) => axial,
    );
    expect(live.sort((a, b) => (a ?? 0) - (b ?? 0))).toEqual([0, 0, 105, 108]);
  });
});

describe('default combinations', () => {
  it('give 7 without lateral load, 7 for every sign of a wind case, 2 for every sign and side of a seismic case', () => {
    fc.assert(
      fc.property(fc.nat(3), fc.nat(3), (winds, quakes) => {
        const forces = [
          ...Array.from({ length: winds }, (_, i) => force(`W${String(i)}`, 'wind', 5 + i, 2)),
          ...Array.from({ length: quakes }, (_, i) => force(`E${String(i)}`, 'seismic', 9 + i, 1)),
          force('soil', 'other', 1, 1),
        ];
        const count = 7 + 7 * Math.max(1, 2 * winds) + 2 * Math.max(1, 4 * quakes);
        expect(actionsOf(building(forces, {}), 'Y2')).toHaveLength(count);
      }),
      { numRuns: 16 },
    );
  });

  it('without one case every row of the others stays as it was, to the last bit', () => {
    const others = [force('WX', 'wind', 12, 0), force('EY', 'seismic', 0, 18)];
    const all = actionsOf(building([...others, force('EX', 'seismic', 20, 0)], {}), 'X1');
    const fewer = actionsOf(building(others, {}), 'X1');
    expect(all.length - fewer.length).toBe(8);
    const kept = all.filter(({ combination }) => !combination.includes('EX'));
    expect(kept).toEqual(fewer);
  });
});
