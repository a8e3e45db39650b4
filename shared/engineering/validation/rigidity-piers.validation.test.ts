import { describe, expect, it } from 'vitest';

import a01 from '../../../fixtures/published/A01-UFC-H1-19.json';
import a02 from '../../../fixtures/published/A02-Taly-7-2-fixed.json';
import a03 from '../../../fixtures/published/A03-Taly-E7-7.json';
import a04 from '../../../fixtures/published/A04-Taly-7-8-solid-and-piers.json';
import a08 from '../../../fixtures/published/A08-closedform-uniform.json';
import k03 from '../../../fixtures/published/K03-Ec-table.json';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import { handPlan } from '../properties/handPlan.ts';
import { withinTolerance } from '../properties/withinTolerance.ts';

/**
 * Rigidity of one wall, flexure and shear, cantilever and fixed-ended, against printed values. Sources:
 * A01 UFC 3-310-03A / TI 809-04, Seismic Design for Buildings, US Army Corps of Engineers, 2005 reissue, Problem H1, p. H1-19.
 * A02 Taly, Design of Reinforced Masonry Structures, 2nd ed., McGraw-Hill, sec. 7.4.3, p. 7.17.
 * A03 the same, Example 7.7, Table E7.7, p. 7.35. A04 the same, Example 7.8, pp. 7.38 and 7.39.
 * K03 McCormac and Brown, Design of Reinforced Concrete, 9th ed., Wiley, Table A.1 (33 wc^1.5 sqrt(f'c) at 145 pcf).
 * A08 handbook closed form (identity, partly from memory).
 * The sources' walls are masonry or unit walls; rigidity is linear in E t, so the engine's k is scaled by E t alone.
 */
type End = 'cantilever' | 'fixed';

/** k of a solid uncracked wall over E t, where G = 0.4 E and the shear factor is 1.2: a function of h/d and the end alone. */
function rigidityOverEt(height: number, length: number, end: End): number {
  return rigidity(height, length, end, 5000, null) / (((57_000 * Math.sqrt(5000)) / 1000) * 10);
}

/** k of a solid uncracked wall 10 in thick, kip/in. */
function rigidity(height: number, length: number, end: End, fc: number, unitWeight: number | null): number {
  const settings = {
    ...settingsDefaults('us'),
    name: 'Pier',
    fc,
    stiffness: { flexure: 1, shear: 1, end, unitWeight },
  };
  const outcome = runBuilding(
    handPlan(
      {
        heights: [height],
        extent: [60, 60],
        walls: [
          { wall: 'T', ends: [5, 5, 5 + length, 5], thickness: 10 },
          { wall: 'X', ends: [5, 55, 25, 55], thickness: 10 },
          { wall: 'Y', ends: [0, 10, 0, 30], thickness: 10 },
          { wall: 'Z', ends: [60, 10, 60, 30], thickness: 10 },
        ],
        forces: [{ level: 'F1', kind: 'wind', fx: 10, fy: 0 }],
      },
      settings,
    ),
  );
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document.rigidities.find(({ wall }) => wall === 'T')?.k ?? NaN;
}

describe('UFC 3-310-03A, Problem H1, p. H1-19: solid wall less strip plus piers, kip and in', () => {
  const elasticityTimesThickness = 7520;
  const k = (height: number, length: number, end: End): number =>
    rigidityOverEt(height, length, end) * elasticityTimesThickness;
  const { outputs, tolerance, tolerance_overrides: overrides } = a01;

  it('piers B and C, fixed at both ends', () => {
    expect(withinTolerance(k(4, 9.33, 'fixed'), outputs.R_B_kip_in, tolerance)).toBe(true);
    expect(withinTolerance(k(4, 5.17, 'fixed'), outputs.R_C_kip_in, tolerance)).toBe(true);
  });

  it('solid wall as a cantilever and the strip between its openings', () => {
    expect(withinTolerance(1 / k(10, 20.5, 'cantilever'), outputs.delta_ABCD_in, overrides.delta_ABCD_in)).toBe(true);
    expect(withinTolerance(1 / k(4, 20.5, 'fixed'), outputs.delta_strip_BC_in, tolerance)).toBe(true);
  });

  it('the perforated wall put together from them', () => {
    const piers = 1 / (k(4, 9.33, 'fixed') + k(4, 5.17, 'fixed'));
    const wall = 1 / (1 / k(10, 20.5, 'cantilever') - 1 / k(4, 20.5, 'fixed') + piers);
    expect(withinTolerance(wall, outputs.R_wall_kip_in, tolerance)).toBe(true);
  });
});

describe('Taly, 2nd ed.', () => {
  it('sec. 7.4.3, p. 7.17: a fixed-ended pier, h/d 0.4545, kip and in', () => {
    const { inputs, outputs, tolerance } = a02;
    const relative = rigidityOverEt(4.545, 10, 'fixed');
    expect(withinTolerance(relative, outputs.relative_rigidity, tolerance)).toBe(true);
    expect(withinTolerance(relative * inputs.Em_ksi * inputs.t_in, outputs.R_kip_in, tolerance)).toBe(true);
  });

  // with the h/d that the table prints (0.167 for 6 by 36 ft)
  it.each([
    [0, 0.167 * 36, 36, 'cantilever'],
    [1, 10, 8, 'fixed'],
    [2, 0.9 * 6.67, 6.67, 'fixed'],
    [3, 1.125 * 5.333, 5.333, 'fixed'],
    [4, 4, 20, 'fixed'],
  ] as const)('Example 7.7, Table E7.7, p. 7.35: pier %d', (index, height, length, end) => {
    const printed = a03.outputs.R_1_to_5[index] ?? NaN;
    expect(withinTolerance(10 * rigidityOverEt(height, length, end), printed, a03.tolerance)).toBe(true);
  });

  it('Example 7.8, pp. 7.38 and 7.39: solid wall, strip and piers', () => {
    const { outputs, tolerance } = a04;
    expect(withinTolerance(10 * rigidityOverEt(5, 20, 'cantilever'), outputs.R_solid_x10, tolerance)).toBe(true);
    expect(withinTolerance(0.1 / rigidityOverEt(2.5, 20, 'fixed'), outputs.delta_strip, tolerance)).toBe(true);
    expect(withinTolerance(10 * rigidityOverEt(6, 10, 'fixed'), outputs.R_pier_each_x10, tolerance)).toBe(true);
    expect(withinTolerance(10 * rigidityOverEt(2, 20, 'fixed'), outputs.R_6_x10, tolerance)).toBe(true);
  });
});

describe('closed form for a load at the top', () => {
  it('4P/(Et) ((H/L)^3 + 0.75 H/L) as a cantilever, P/(Et) ((H/L)^3 + 3 H/L) with a fixed top, m and kN', () => {
    const { inputs, outputs } = a08;
    const load = inputs.P_kN / (inputs.E_kPa * inputs.t_m);
    // only h/d matters: 30 m by 6 m here as 30 ft by 6 ft
    expect(load / rigidityOverEt(30, 6, 'cantilever')).toBeCloseTo(outputs.delta_point_m, 11);
    expect(load / rigidityOverEt(30, 6, 'fixed')).toBeCloseTo(outputs.delta_fixed_top_m, 11);
  });
});

describe('McCormac and Brown, 9th ed., Table A.1: modulus of concrete of 145 pcf', () => {
  it.each(k03.inputs["f'c_psi"].map((fc, i) => [fc, k03.outputs.Ec_psi[i] ?? NaN] as const))(
    "f'c %d psi: Ec %d psi",
    (fc, printed) => {
      const modulusKsi = rigidity(12, 20, 'cantilever', fc, 145) / (rigidityOverEt(12, 20, 'cantilever') * 10);
      expect(withinTolerance(modulusKsi * 1000, printed, k03.tolerance)).toBe(true);
      // 57,000 sqrt(f'c) lies about 1 % below, as 19.2.2.1 b gives it
      const plainKsi = rigidity(12, 20, 'cantilever', fc, null) / (rigidityOverEt(12, 20, 'cantilever') * 10);
      expect(plainKsi * 1000).toBeCloseTo(57_000 * Math.sqrt(fc), 4);
    },
  );
});
