import { describe, expect, it } from 'vitest';

import b07 from '../../../fixtures/published/B07-PE-flexible.json';
import e04 from '../../../fixtures/published/E04-LLR-Hibbeler.json';
import e06 from '../../../fixtures/published/E06-LLR-trap.json';
import type { ResultDocument } from '../../contracts/result.ts';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { BuildingInput, GravityRow } from '../input.ts';
import { handPlan } from '../properties/handPlan.ts';
import { gravity } from '../testing/handBuilding.ts';

/**
 * Flexible floors by tributary width: B07 Structural Wiki, open PE seismic practice question of 31 Mar 2021, plan and solution sheet.
 * Live load reduction: E04 Hibbeler, Structural Analysis, office column (from memory); E06 a public calculator page that applies
 * the formula below 400 ft2, where ASCE 7 4.7.2 leaves the load whole: a slip of the source, held the right way here.
 */
function solve(input: BuildingInput): ResultDocument {
  const outcome = runBuilding(input);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

describe('B07: five lines of walls under one flexible roof, ft and kip', () => {
  const lines = b07.inputs['wall lines at ft'];
  const document = solve(
    handPlan(
      {
        heights: [12],
        extent: [180, 60],
        walls: [
          ...lines.map((x, i) => ({
            wall: `Y${String(i)}`,
            ends: [x, 10, x, 30] as [number, number, number, number],
            thickness: 8,
          })),
          { wall: 'XA', ends: [20, 0, 60, 0], thickness: 8 },
          { wall: 'XB', ends: [20, 60, 60, 60], thickness: 8 },
        ],
        forces: [{ level: 'F1', kind: 'wind', fx: 0, fy: b07.inputs.F_R_kip }],
      },
      { ...settingsDefaults('us'), name: 'Example', basis: ['flexible'] },
    ),
  );

  it('the line at 40 ft takes 45 of 180 ft, 2.5 kip', () => {
    const total = document.distribution.find((row) => row.wall === 'Y1')?.total ?? NaN;
    expect(total).toBeCloseTo(b07.outputs.V_wall1_kip, 9);
    expect((total / b07.inputs.F_R_kip) * 180).toBeCloseTo(b07.outputs.tributary_ft, 9);
  });

  it('all five lines as recomputed from the same widths', () => {
    b07.recomputed['all lines (mine)'].forEach((shear, i) => {
      const row = document.distribution.find((item) => item.wall === `Y${String(i)}`);
      expect(row?.total).toBeCloseTo(shear, 5);
    });
  });
});

function liveOf(kll: number, rows: readonly GravityRow[]): readonly number[] {
  const plan = handPlan(
    {
      heights: [12, 12],
      extent: [40, 40],
      walls: [
        { wall: 'X1', ends: [10, 0, 30, 0], thickness: 10 },
        { wall: 'X2', ends: [10, 40, 30, 40], thickness: 10 },
        { wall: 'Y1', ends: [0, 10, 0, 30], thickness: 10 },
      ],
      forces: [{ level: 'F2', kind: 'wind', fx: 1, fy: 1 }],
    },
    { ...settingsDefaults('us'), name: 'Example', liveReduction: true, kll, selfWeight: false },
  );
  const document = solve({ ...plan, tables: { ...plan.tables, gravity: rows } });
  return ['F2', 'F1'].map(
    (level) =>
      document.gravity.find((row) => row.wall === 'X1' && row.level === level && row.case === 'L')?.axial ?? NaN,
  );
}

describe('live load reduction on 484 ft2, K_LL 4', () => {
  const { L0_psf, K_LL } = e04.inputs;
  const floor = (level: string) => gravity(level, 'X1', 0, { live: (L0_psf * 484) / 1000, tributary_area: 484 });

  it('E04: 29.5 psf and 14.3 kip for the one floor', () => {
    const [, axial] = liveOf(K_LL, [floor('F1')]);
    expect(((axial ?? NaN) / 484) * 1000).toBeCloseTo(e04.recomputed.L_psf, 3);
    expect(Math.abs((axial ?? NaN) / e04.outputs.F_floor_kip - 1)).toBeLessThan(0.006);
  });

  it('two floors reduce by the area of both: 0.25 + 15/sqrt(4 x 968) = 0.491 in the lower story', () => {
    const [upper, lower] = liveOf(K_LL, [floor('F1'), floor('F2')]);
    expect(upper).toBeCloseTo(24.2 * (0.25 + 15 / 44), 9);
    expect(lower).toBeCloseTo(48.4 * (0.25 + 15 / Math.sqrt(3872)), 9);
  });

  it('not below 0.5 of one floor and 0.4 of two', () => {
    const wide = (level: string) => gravity(level, 'X1', 0, { live: 100, tributary_area: 40_000 });
    expect(liveOf(K_LL, [wide('F1')])[1]).toBeCloseTo(50, 9);
    expect(liveOf(K_LL, [wide('F1'), wide('F2')])).toEqual([expect.closeTo(50, 9), expect.closeTo(80, 9)]);
  });

  it('garages, heavy and untold areas stay out, and so does more than 100 psf', () => {
    const rows = [
      gravity('F1', 'X1', 0, { live: 20, tributary_area: 600, live_class: 'garage' }),
      gravity('F1', 'X1', 0, { live: 7 }),
      gravity('F1', 'X1', 0, { live: 72, tributary_area: 600 }),
    ];
    expect(liveOf(K_LL, rows)[1]).toBeCloseTo(99, 9);
  });
});

describe('E06: K_LL 1.5 on 200 ft2, 300 ft2 together', () => {
  it('stays at 100 psf, where the page raised it to 112', () => {
    const { Lo_psf, KLL, AT_ft2 } = e06.inputs;
    const [, axial] = liveOf(KLL, [gravity('F1', 'X1', 0, { live: (Lo_psf * AT_ft2) / 1000, tributary_area: AT_ft2 })]);
    expect(((axial ?? NaN) / AT_ft2) * 1000).toBeCloseTo(e06.recomputed['valid reduced L_psf'], 9);
  });
});
