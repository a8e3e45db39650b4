import { describe, expect, it } from 'vitest';

import type { SectionOutput } from '../contracts/section.ts';

import { checkSection } from './checkSection.ts';

const file = {
  units: 'us',
  fc: 4900,
  length: 20,
  height: 12,
  totalHeight: 90,
  thickness: 12,
  vertical: { curtains: 2, bar: 5, spacing: 12 },
  horizontal: { curtains: 2, bar: 5, spacing: 12 },
  ends: { bar: 8, count: 8, length: 24 },
  actions: [
    { axial: 600, moment: 6000, shear: 200 },
    { axial: -300, moment: -1000, shear: -100 },
  ],
};
const outputOf = (json: unknown): SectionOutput => {
  const outcome = checkSection(json);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.output;
};
const problemsOf = (json: unknown): { column: string | null; message: string; code?: string }[] => {
  const outcome = checkSection(json);
  return outcome.ok ? [] : [...outcome.problems];
};

describe('checkSection', () => {
  it('shear by hand: 2 x 70 x 2,880 lb, 0.62/144 x 60 x 2,880 kip, limit 8 x 70 x 2,880 lb', () => {
    const [first, second] = outputOf(file).shear;
    expect(first?.vc).toBeCloseTo(403.2, 9);
    expect(first?.vs).toBeCloseTo(744, 9);
    expect(first?.vn).toBeCloseTo(1147.2, 9);
    expect(first?.phiVn).toBeCloseTo(860.4, 9);
    expect(first?.limit).toBeCloseTo(1612.8, 9);
    // Nu -300 kip: 1 - 300,000/(500 x 2,880) = 0.791667
    expect(second?.vc).toBeCloseTo(403.2 * (1 - 300 / 1440), 9);
  });

  it('gives one flexural state an action, and its check the worse ratio', () => {
    const { flexure, checks } = outputOf(file);
    expect(flexure.map(({ axial }) => axial)).toEqual([600, -300]);
    const [first, second] = flexure;
    expect((first?.phi ?? 0) * (first?.mn ?? 0)).toBeCloseTo(first?.phiMn ?? -1, 6);
    expect(first?.mpr ?? 0).toBeGreaterThan(first?.mnNominal ?? Infinity);
    const check = checks.find((entry) => entry.check === 'flexure');
    const ratios = [6000 / (first?.phiMn ?? 1), 1000 / (second?.phiMn ?? 1)];
    expect(check?.ratio).toBeCloseTo(Math.max(...ratios), 12);
    expect(check?.unit).toBe('kip-ft');
    expect(check?.combination).toBe('action 1');
  });

  it('agrees with the same bars as layers', () => {
    const { vertical, ends, ...rest } = file;
    expect([vertical.spacing, ends.count]).toEqual([12, 8]);
    // end columns at 3, 9, 15, 21 in; 198 in run in 17 spaces
    const columns = [3, 9, 15, 21].map((position) => ({ position, area: 2 * 0.79 }));
    const far = columns.map(({ position, area }) => ({ position: 240 - position, area }));
    const web = Array.from({ length: 16 }, (_, index) => ({ position: 21 + ((index + 1) * 198) / 17, area: 0.62 }));
    const layered = outputOf({ ...rest, layers: [...columns, ...web, ...far] });
    const celled = outputOf(file);
    layered.flexure.forEach((state, index) => {
      expect(state.phiMn).toBeCloseTo(celled.flexure[index]?.phiMn ?? 0, 6);
    });
    expect(layered.checks.map(({ check }) => check)).toEqual([
      'flexure',
      'shear',
      'shear-limit',
      'horizontal-steel',
      'spacing',
      'thickness',
      'axial',
    ]);
  });

  it('runs no joint without dead load and no splice', () => {
    const names = (json: unknown): string[] => outputOf(json).checks.map(({ check }) => check);
    expect(names(file)).not.toContain('joint');
    expect(names(file)).not.toContain('splice');
    expect(names({ ...file, dead: 200 })).toContain('joint');
  });

  it('is null outside the axial limits, and the check fails', () => {
    const { flexure, checks } = outputOf({ ...file, actions: [{ axial: 12000, moment: 1, shear: 0 }] });
    expect(flexure[0]).toMatchObject({ phi: null, c: null, phiMn: null, mn: null });
    expect(checks[0]).toMatchObject({ check: 'flexure', capacity: null, ratio: null, ok: false });
  });

  it('the SI twin of a layered section agrees within 1e-9', () => {
    const layers = [3, 40, 80, 120, 160, 200, 237].map((position) => ({ position, area: 1.58 }));
    const { units, fc, length, height, totalHeight, thickness } = file;
    expect(units).toBe('us');
    const actions = [-300, 0, 600, 2500].map((axial) => ({ axial, moment: 500, shear: 80 }));
    const us = outputOf({ units, fc, fy: 60, fyt: 60, length, height, totalHeight, thickness, layers, actions });
    const lbf = 4.4482216152605;
    const mpa = lbf / 645.16;
    const moment = lbf * 0.3048;
    const si = outputOf({
      units: 'si',
      fc: fc * mpa,
      fy: 60000 * mpa,
      fyt: 60000 * mpa,
      length: length * 0.3048,
      height: height * 0.3048,
      totalHeight: totalHeight * 0.3048,
      thickness: thickness * 25.4,
      layers: layers.map(({ position, area }) => ({ position: position * 25.4, area: area * 645.16 })),
      actions: actions.map((action) => ({
        axial: action.axial * lbf,
        moment: action.moment * moment,
        shear: action.shear * lbf,
      })),
    });
    const near = (a: number | null | undefined, b: number | null | undefined): void => {
      expect(Math.abs((a ?? NaN) - (b ?? NaN))).toBeLessThanOrEqual(1e-9 * Math.abs(b ?? NaN));
    };
    us.flexure.forEach((state, index) => {
      const twin = si.flexure[index];
      near(twin?.phiMn, (state.phiMn ?? 0) * moment);
      near(twin?.c, (state.c ?? 0) * 25.4);
      near(twin?.mnNominal, (state.mnNominal ?? 0) * moment);
      near(twin?.mpr, (state.mpr ?? 0) * moment);
      near(twin?.phi, state.phi);
      near(si.shear[index]?.phiVn, (us.shear[index]?.phiVn ?? 0) * lbf);
    });
    for (const name of ['flexure', 'shear', 'axial']) {
      const of = (output: SectionOutput) => output.checks.find(({ check }) => check === name);
      near(of(si)?.ratio, of(us)?.ratio);
    }
  });

  it('tells all problems with place, reading and remedy', () => {
    expect(problemsOf({ ...file, code: 'aci318-14', wallClass: 'special', shearMethod: 'detailed' })).toMatchObject([
      { column: 'code', code: 'not-designed-yet' },
      { column: 'wallClass', code: 'not-designed-yet' },
      { column: 'shearMethod', code: 'not-designed-yet' },
    ]);
    expect(problemsOf({ ...file, units: 'si', thickness: 300 }).map(({ column }) => column)).toEqual([
      'vertical.bar',
      'horizontal.bar',
      'ends.bar',
    ]);
    expect(problemsOf({ ...file, layers: [{ position: 3, area: 1 }] })[0]?.column).toBe('layers');
    expect(problemsOf({ ...file, thickness: 'twelve', actions: [] }).map(({ column }) => column)).toEqual([
      'thickness',
      'actions',
    ]);
    expect(problemsOf([])[0]?.message).toBeTruthy();
  });

  it('names keys that say nothing', () => {
    expect(outputOf({ ...file, tickness: 3 }).ignored).toEqual(['tickness']);
  });
});
