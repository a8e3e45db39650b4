import { describe, expect, it } from 'vitest';

import type { ResultDocument } from '../../contracts/result.ts';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { Basis, OverrideRow } from '../input.ts';
import { handPlan } from '../properties/handPlan.ts';

/**
 * By hand: equal walls on a square of 40 ft, two along each side, 30 kip along x through the middle. Own shares leave the rest to the other
 * walls along x by rigidity, walls across get nothing, the floor does not turn.
 */
function solve(basis: Basis, shares: readonly (readonly [string, number])[]): ResultDocument {
  const ends: [string, [number, number, number, number]][] = [
    ['X1', [10, 0, 30, 0]],
    ['X2', [10, 40, 30, 40]],
    ['X3', [10, 20, 30, 20]],
    ['Y1', [0, 10, 0, 30]],
    ['Y2', [40, 10, 40, 30]],
  ];
  const plan = handPlan(
    {
      heights: [10],
      extent: [40, 40],
      walls: ends.map(([wall, at]) => ({ wall, ends: at, thickness: 10 })),
      forces: [{ level: 'F1', kind: 'wind', fx: 30, fy: 0 }],
    },
    { ...settingsDefaults('us'), name: 'By hand', basis: [basis] },
  );
  const overrides = shares.map(([wall, share]): OverrideRow => ({
    ...{ kind: 'share', level: 'F1', wall, case: null, shear: null, axial: null, moment: null },
    ...{ share, reason: 'own study' },
  }));
  const outcome = runBuilding({ ...plan, tables: { ...plan.tables, overrides } });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

const totals = (document: ResultDocument): number[] =>
  ['X1', 'X2', 'X3', 'Y1', 'Y2'].map((wall) => document.distribution.find((row) => row.wall === wall)?.total ?? NaN);

describe('shares that an engineer sets', () => {
  it.each<Basis>(['rigid', 'compatible'])('%s: 0.5 of 30 kip in X1, 7.5 kip in each other wall along x', (basis) => {
    const document = solve(basis, [['X1', 0.5]]);
    [15, 7.5, 7.5, 0, 0].forEach((shear, i) => {
      expect(totals(document)[i]).toBeCloseTo(shear, 9);
    });
    // X1 at y 0 gains 5 kip, X2 at 40 and X3 at 20 lose 2.5 each: -y dV = 2.5 x 40 + 2.5 x 20 = 150 kip-ft stay open
    const [entry] = document.balance.filter((row) => row.case === 'P');
    expect(entry?.lines.find(({ line }) => line === 'torque left open')?.applied).toBeCloseTo(150, 9);
    expect(entry?.residual).toBeLessThan(1e-9);
  });

  it('two shares in one story both stand, and the third wall takes what is left', () => {
    const document = solve('rigid', [
      ['X1', 0.5],
      ['X2', 0.1],
    ]);
    [15, 3, 12, 0, 0].forEach((shear, i) => {
      expect(totals(document)[i]).toBeCloseTo(shear, 9);
    });
  });

  it('flexible: widths give 7.5, 7.5 and 15; a share in X3 leaves 24 kip, 12 to each edge', () => {
    [7.5, 7.5, 15].forEach((shear, i) => {
      expect(totals(solve('flexible', []))[i]).toBeCloseTo(shear, 9);
    });
    const document = solve('flexible', [['X3', 0.2]]);
    [12, 12, 6, 0, 0].forEach((shear, i) => {
      expect(totals(document)[i]).toBeCloseTo(shear, 9);
    });
    for (const { residual } of document.balance) expect(residual).toBeLessThan(1e-9);
  });

  it('shares that nobody is left to complete break the balance', () => {
    const document = solve('rigid', [
      ['X1', 0.2],
      ['X2', 0.2],
      ['X3', 0.2],
    ]);
    expect(Math.max(...document.balance.map(({ residual }) => residual))).toBeGreaterThan(0.1);
  });
});
