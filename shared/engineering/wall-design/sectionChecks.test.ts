import { describe, expect, it } from 'vitest';

import type { DesignContext } from './designContext.ts';
import { designContext } from './designContext.ts';
import type { ScheduleCells } from './designTypes.ts';
import type { PlainCheck } from './plainCheck.ts';
import { compressionZones, readReinforcement, sectionOf, strengthOf } from './reinforcement.ts';
import { sectionChecks } from './sectionChecks.ts';
import type { LoadGroup } from './storyLoads.ts';
import { addAction } from './storyLoads.ts';
import type { SectionInPlace } from './strengthChecks.ts';
import { usSettings } from './testing/inventedWall.ts';

const context = designContext(usSettings);

const wall: SectionInPlace = {
  lengthIn: 200,
  thicknessIn: 12,
  fcPsi: 4900,
  storyHeightIn: 120,
  wallHeightIn: 600,
  joint: { fcPsi: 4900, deadKip: 300 },
};

const cells: ScheduleCells = {
  vertical: { curtains: 2, bar: 5, spacing: 12 },
  horizontal: { curtains: 2, bar: 5, spacing: 12, end: 'hook' },
  ends: null,
  ties: null,
  laps: { web: 18, ends: null, horizontal: 26, splice: 'lap' },
  notes: [],
};

type Action = readonly [axialKip: number, momentKipIn: number, shearKip: number, seismic?: boolean];

function run(
  actions: readonly Action[],
  changes: Partial<ScheduleCells> = {},
  place: Partial<SectionInPlace> = {},
  other: Partial<DesignContext> = {},
): Map<string, PlainCheck> {
  const here = { ...context, ...other };
  const section = { ...wall, ...place };
  const groups: LoadGroup[] = [];
  actions.forEach(([axialKip, moment, shear, seismic = false], index) => {
    addAction(groups, axialKip, moment, shear, seismic, index);
  });
  const steel = readReinforcement({ ...cells, ...changes }, here);
  const strengthWith = (tied: boolean) =>
    strengthOf(sectionOf(steel.bars, section, compressionZones(steel.bars, tied), here), here);
  const layers = sectionOf(steel.bars, section, { web: true, ends: true }, here).layers;
  const steelIn2 = layers.reduce((sum, layer) => sum + layer.areaIn2, 0);
  const checks = sectionChecks(
    section,
    groups,
    steel,
    strengthWith(steel.ties !== null),
    strengthWith(false),
    steelIn2,
    here,
  );
  return new Map(checks.map((check) => [check.check, check]));
}

const of = (checks: Map<string, PlainCheck>, name: string): PlainCheck => {
  const check = checks.get(name);
  if (!check) throw new Error(`${name} was not run`);
  return check;
};

describe('shear, Acv 2,400 in2, sqrt(f`c) 70 psi, rho_t 0.62/144', () => {
  // by hand: Vc = 2 x 70 x 2.4 = 336 kip, Vs = 0.62/144 x 60 x 2400 = 620 kip, limit 8 x 70 x 2.4 = 1344 kip
  it('phi Vn = 0.75 x 956 = 717 kip; passes at 717 and fails beyond', () => {
    expect(of(run([[500, 0, 717]]), 'shear').capacity).toBeCloseTo(717, 9);
    expect(of(run([[500, 0, -717]]), 'shear').ok).toBe(true);
    expect(of(run([[500, 0, 718]]), 'shear').ok).toBe(false);
  });
  it('net tension of 600 kip halves Vc: phi Vn = 0.75 x (168 + 620)', () => {
    expect(of(run([[-600, 0, 100]]), 'shear').capacity).toBeCloseTo(0.75 * 788, 9);
  });
  it('a squat wall has alpha_c 3', () => {
    expect(of(run([[500, 0, 1]], {}, { wallHeightIn: 250 }), 'shear').capacity).toBeCloseTo(0.75 * (504 + 620), 9);
  });
  it('shear-limit: 0.75 x 1344 = 1008 kip', () => {
    const heavy = { horizontal: { curtains: 2, bar: 6, spacing: 6, end: 'hook' } as const };
    expect(of(run([[500, 0, 1008]], heavy), 'shear-limit').ok).toBe(true);
    expect(of(run([[500, 0, 1009]], heavy), 'shear-limit').ok).toBe(false);
    expect(of(run([[500, 0, 1009]], heavy), 'shear').capacity).toBeCloseTo(1008, 9);
  });
  it('sqrt(f`c) stops at 100 psi and fyt at 60 ksi', () => {
    const strong = run([[500, 0, 1]], {}, { fcPsi: 14400 }, { fytKsi: 80 });
    expect(of(strong, 'shear').capacity).toBeCloseTo(0.75 * (480 + 620), 9);
    expect(of(strong, 'shear-limit').capacity).toBeCloseTo(0.75 * 1920, 9);
  });
  it('the pair with the worse ratio decides, not the larger shear', () => {
    const check = of(
      run([
        [500, 0, 400],
        [-1200, 0, 380],
      ]),
      'shear',
    );
    expect(check.expansion).toBe(1);
    expect(check.capacity).toBeCloseTo(0.75 * 620, 9);
  });
});

describe('distributed steel', () => {
  // low shear up to 0.5 x 0.75 x 336 = 126 kip
  it('low shear with No. 5 bars: 0.0012 and 0.0020', () => {
    const checks = run([[500, 0, 126]]);
    expect(of(checks, 'vertical-steel').demand).toBe(0.0012);
    expect(of(checks, 'horizontal-steel').demand).toBe(0.002);
    expect(of(checks, 'vertical-steel').capacity).toBeCloseTo(0.62 / 144, 15);
    expect(of(checks, 'vertical-steel').clause).toBe('11.6.1');
  });
  it('low shear with No. 6 bars: 0.0015 and 0.0025, each by its own bar', () => {
    const checks = run([[500, 0, 100]], { vertical: { curtains: 2, bar: 6, spacing: 12 } });
    expect(of(checks, 'vertical-steel').demand).toBe(0.0015);
    expect(of(checks, 'horizontal-steel').demand).toBe(0.002);
    const other = run([[500, 0, 100]], { horizontal: { curtains: 2, bar: 6, spacing: 12, end: 'hook' } });
    expect(of(other, 'horizontal-steel').demand).toBe(0.0025);
  });
  it('beyond: 0.0025 both, hw/lw 3; by the bracket in a squat wall', () => {
    const checks = run([[500, 0, 130]]);
    expect(of(checks, 'vertical-steel').demand).toBe(0.0025);
    expect(of(checks, 'vertical-steel').clause).toBe('11.6.2');
    expect(of(checks, 'vertical-steel').expansion).toBe(0);
    // hw/lw 1, alpha_c 3: needed for strength (900/0.75 - 504)/(60 x 2400) = 0.0048333; bracket 0.0025 + 0.75 x (0.0043056 - 0.0025)
    const squat = run([[500, 0, 900]], {}, { wallHeightIn: 200 });
    expect(of(squat, 'vertical-steel').demand).toBeCloseTo(0.0025 + 0.75 * (0.62 / 144 - 0.0025), 12);
    const lighter = run([[500, 0, 700]], {}, { wallHeightIn: 200 });
    expect(of(lighter, 'vertical-steel').demand).toBeCloseTo((700 / 0.75 - 504) / 144000, 12);
  });
  it('fails where the bars are too far apart', () => {
    const thin = run([[500, 0, 130]], { vertical: { curtains: 1, bar: 4, spacing: 18 } });
    expect(of(thin, 'vertical-steel').ok).toBe(false);
  });
});

describe('arrangement', () => {
  it('spacing to 18 in; lw/5 beyond low shear', () => {
    const wide = { horizontal: { curtains: 2, bar: 5, spacing: 18, end: 'hook' } as const };
    expect(of(run([[500, 0, 100]], wide), 'spacing').ok).toBe(true);
    const short = of(run([[500, 0, 100]], wide, { lengthIn: 60 }), 'spacing');
    expect(short).toMatchObject({ demand: 18, capacity: 12, ok: false, clause: '11.7.3.1' });
  });
  it('spacing to 3 t', () => {
    const cell = { vertical: { curtains: 1, bar: 4, spacing: 16 } as const };
    expect(of(run([[10, 0, 1]], cell, { thicknessIn: 5 }), 'spacing')).toMatchObject({ capacity: 15, ok: false });
  });
  it('two curtains above 10 in', () => {
    const single = { vertical: { curtains: 1, bar: 5, spacing: 12 } as const };
    expect(of(run([[10, 0, 1]], single), 'curtains')).toMatchObject({ demand: 2, capacity: 1, ok: false });
    expect(of(run([[10, 0, 1]], single, { thicknessIn: 10 }), 'curtains').ok).toBe(true);
  });
  it('thickness fails below 4 in', () => {
    expect(of(run([[10, 0, 1]], {}, { thicknessIn: 3.9 }), 'thickness').ok).toBe(false);
    expect(of(run([[10, 0, 1]], {}, { thicknessIn: 4 }), 'thickness').ok).toBe(true);
  });
});

describe('axial', () => {
  // pu/t = 720/200/12 + 6 x 48,000/40,000/12 = 0.3 + 0.6 ksi; 0.65 x 0.55 x 4900 x (1 - (120/384)^2) = 1580.7 psi
  it('stress at the more compressed end', () => {
    const check = of(run([[720, -48000, 1]]), 'axial');
    expect(check.demand).toBeCloseTo(900, 9);
    expect(check.capacity).toBeCloseTo(0.3575 * 4900 * (1 - 0.09765625), 9);
    expect(check.ok).toBe(true);
  });
  it('fails above, and has no capacity for an eccentricity above t/6', () => {
    expect(of(run([[2400, 96000, 1]]), 'axial').ok).toBe(false);
    expect(of(run([[720, 0, 1]], {}, {}, { oopEccentricityIn: 2.1 }), 'axial')).toMatchObject({
      capacity: null,
      ok: false,
    });
  });
});

describe('joint', () => {
  // web bars: 194 in run in 17 spaces, 18 places x 0.62 = 11.16 in2; N = min(0.9 x 300, Pu)
  const avf = 18 * 0.62;
  it('phi mu (Avf fy + N)', () => {
    expect(of(run([[500, 0, 1]]), 'joint').capacity).toBeCloseTo(0.75 * (avf * 60 + 270), 9);
    expect(of(run([[100, 0, 1]]), 'joint').capacity).toBeCloseTo(0.75 * (avf * 60 + 100), 9);
    expect(of(run([[500, 0, 1, true]], {}, {}, { sds: 0.5 }), 'joint').capacity).toBeCloseTo(
      0.75 * (avf * 60 + 240),
      9,
    );
    expect(of(run([[500, 0, 1]], {}, {}, { joint: 'plain' }), 'joint').capacity).toBeCloseTo(
      0.45 * (avf * 60 + 270),
      9,
    );
  });
  it('tension takes its steel first: 108 kip takes 2 in2', () => {
    expect(of(run([[-108, 0, 1]]), 'joint').capacity).toBeCloseTo(0.75 * 60 * (avf - 2), 9);
  });
  it('stops at 0.2 f`c Ac and at 800 psi on a plain joint', () => {
    const heavy = { vertical: { curtains: 2, bar: 8, spacing: 6 } as const };
    const dead = { joint: { fcPsi: 4900, deadKip: 5000 } };
    expect(of(run([[4000, 0, 1]], heavy, dead), 'joint').capacity).toBeCloseTo(0.75 * 0.872 * 2400, 9);
    expect(of(run([[4000, 0, 1]], heavy, dead, { joint: 'plain' }), 'joint').capacity).toBeCloseTo(
      0.75 * 0.8 * 2400,
      9,
    );
  });
  it('fails beyond, and is not run where no joint is known', () => {
    expect(of(run([[0, 0, 503]]), 'joint').ok).toBe(false);
    expect(of(run([[0, 0, 502]]), 'joint').ok).toBe(true);
    expect(run([[0, 0, 1]], {}, { joint: null }).has('joint')).toBe(false);
  });
});

describe('ties of 11.7.4.1', () => {
  const ends = {
    ends: { bar: 9, count: 8, length: 24 },
    laps: { web: 18, ends: 80, horizontal: 26, splice: 'lap' } as const,
  };
  const tie = { bar: 3, legsAlong: 2, legsAcross: 3, fromElevation: 0, toElevation: 10, kind: 'hoop' };
  it('no zone above 0.01: the ratio stands', () => {
    expect(of(run([[500, 10000, 1]]), 'ties')).toMatchObject({ capacity: 0.01, ok: true, quantity: 'steelRatio' });
  });
  it('an untied end zone of 0.0278 counts zero in compression', () => {
    const moment = of(run([[500, 1, 1]], { ...ends, ties: { ...tie, spacing: 8 } }), 'flexure').capacity ?? 0;
    const bare = of(run([[500, 1, 1]], ends), 'flexure').capacity ?? 0;
    expect(bare).toBeLessThan(moment);
    expect(of(run([[500, moment, 1]], ends), 'ties')).toMatchObject({ capacity: bare, ok: false });
    expect(of(run([[500, bare, 1]], ends), 'ties').ok).toBe(true);
  });
  it('scheduled ties: 12 in limit here (t), 16 x 1.128 and 48 x 0.375 above it', () => {
    expect(of(run([[500, 1, 1]], { ...ends, ties: { ...tie, spacing: 12 } }), 'ties')).toMatchObject({
      capacity: 12,
      ok: true,
    });
    expect(of(run([[500, 1, 1]], { ...ends, ties: { ...tie, spacing: 14 } }), 'ties').ok).toBe(false);
  });
});

describe('splice', () => {
  // No. 5 at 12, cover 0.75 + 0.625 + 0.3125: cb/db 2.5 at most; ld = 0.075 x 60000/70/2.5 x 0.8 x 0.625 = 12.857 in, lap 16.714 in
  it('class B of the vertical bars; horizontal with psi_t 1.3', () => {
    const cb = (0.75 + 0.3125) / 0.625;
    const horizontal = 1.3 * ((0.075 * 60000 * 1.3 * 0.8) / 70 / cb) * 0.625;
    const check = of(run([[0, 0, 1]]), 'splice');
    expect(check.demand).toBeCloseTo(1.3 * ((0.075 * 60000 * 1.3 * 0.8) / 70 / cb) * 0.625, 9);
    expect(check.ok).toBe(horizontal <= 26);
    const short = run([[0, 0, 1]], { laps: { web: 16, ends: null, horizontal: 80, splice: 'lap' } });
    expect(of(short, 'splice')).toMatchObject({ capacity: 16, ok: false });
    expect(of(short, 'splice').demand).toBeCloseTo((1.3 * (0.075 * 60000 * 0.8 * 0.625)) / 70 / 2.5, 9);
  });
  it('a missing lap fails unless the row has couplers', () => {
    const none = { web: null, ends: null, horizontal: 80 };
    expect(of(run([[0, 0, 1]], { laps: { ...none, splice: 'lap' } }), 'splice').ok).toBe(false);
    expect(of(run([[0, 0, 1]], { laps: { ...none, splice: 'coupler' } }), 'splice').ok).toBe(true);
  });
});

describe('flexure', () => {
  it('fails outside the axial limits with no capacity', () => {
    expect(of(run([[7000, 1, 1]]), 'flexure')).toMatchObject({ capacity: null, ratio: null, ok: false });
  });
  it('at equal ratios names the first expansion', () => {
    expect(
      of(
        run([
          [500, 4000, 1],
          [500, 5000, 1],
          [500, -5000, 1],
        ]),
        'flexure',
      ).expansion,
    ).toBe(1);
  });
});
