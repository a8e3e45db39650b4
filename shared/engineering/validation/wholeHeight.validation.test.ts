import { describe, expect, it } from 'vitest';

import c01 from '../../../fixtures/published/C01-uniform-cantilever-5-floors.json';
import c02 from '../../../fixtures/published/C02-wall-cutoff.json';
import c04 from '../../../fixtures/published/C04-proportionate-walls.json';
import type { ResultDocument } from '../../contracts/result.ts';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { Settings } from '../input.ts';
import type { HandPlan } from '../properties/handPlan.ts';
import { handPlan } from '../properties/handPlan.ts';

/**
 * Whole-height solution against derived benchmarks (no publication): C01 superposed point-load formula of a Timoshenko cantilever,
 * C02 flexibility method by hand (one redundant), C04 walls of constant stiffness ratio (principle from memory).
 */
const settings: Settings = { ...settingsDefaults('si'), name: 'Benchmark', accidental: 0, selfWeight: false };

function solve(
  plan: HandPlan,
  more: Partial<Settings> = {},
  lastStory: Readonly<Record<string, string>> = {},
): ResultDocument {
  const input = handPlan(plan, { ...settings, ...more });
  const walls = input.tables.walls.map((row) => ({ ...row, to_level: lastStory[row.wall] ?? row.to_level }));
  const outcome = runBuilding({ ...input, tables: { ...input.tables, walls } });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

/** Two walls each way on a square, the pair along x alike in every respect but length. */
const square = (first: number, second: number, thicknessMm: number): HandPlan['walls'] => [
  { wall: 'X1', ends: [0, 5, first, 5], thickness: thicknessMm },
  { wall: 'X2', ends: [0, 15, second, 15], thickness: thicknessMm },
  { wall: 'Y1', ends: [0, 0, 0, 6], thickness: thicknessMm },
  { wall: 'Y2', ends: [20, 0, 20, 6], thickness: thicknessMm },
];

const shearOf = (document: ResultDocument, basis: string, wall: string, level: string): number =>
  document.lateral.find((row) => row.basis === basis && row.wall === wall && row.level === level)?.shear ?? NaN;

describe('C01: uniform cantilever of five floors, m, kN and mm', () => {
  const { L_m, t_m, E_kPa, floors_m, P_each_kN } = c01.inputs;
  // two such walls carry twice the load; Ec of the settings differs from E of the benchmark, and both give u in proportion to 1/E,
  // for G = 0.4 E in both
  const document = solve(
    {
      heights: floors_m.map((top, i) => top - (floors_m[i - 1] ?? 0)),
      extent: [20, 20],
      walls: square(L_m, L_m, t_m * 1000),
      forces: floors_m.map((_, i) => ({ level: `F${String(i + 1)}`, kind: 'wind', fx: 2 * P_each_kN, fy: 0 })),
    },
    { stiffness: { flexure: 1, shear: 1, end: 'cantilever', unitWeight: null } },
  );
  const psiOfMPa = 1000 / 6.894757293168361;
  const modulusKPa = (57_000 * Math.sqrt(settings.fc * psiOfMPa) * 1000) / psiOfMPa;

  it.each(
    c01.outputs.u_mm_closed_form.map((u, i) => [`F${String(i + 1)}`, u, c01.outputs.drift_mm[i] ?? NaN] as const),
  )('floor %s moves %d mm, %d mm against the floor below', (level, u, drift) => {
    const displacement = document.displacements.find((row) => row.level === level);
    expect((displacement?.x ?? NaN) * (modulusKPa / E_kPa)).toBeCloseTo(u, 4);
    const row = document.drifts.find((item) => item.level === level);
    expect((row?.x ?? NaN) * 3500 * (modulusKPa / E_kPa)).toBeCloseTo(drift, 4);
  });
});

describe('C02: two equal walls, one stopped at the first of two stories, load at the roof', () => {
  it('on one line: 5/4 of the load into the stopped wall, -1/4 left in the full one', () => {
    const line = solve(
      {
        heights: [4, 4],
        extent: [20, 20],
        walls: [
          { wall: 'X1', ends: [0, 10, 6, 10], thickness: 250 },
          { wall: 'X2', ends: [8, 10, 14, 10], thickness: 250 },
          { wall: 'Y1', ends: [0, 0, 0, 6], thickness: 250 },
          { wall: 'Y2', ends: [20, 0, 20, 6], thickness: 250 },
        ],
        forces: [{ level: 'F2', kind: 'wind', fx: 100, fy: 0 }],
      },
      { stiffness: { flexure: 0.5, shear: 1e9, end: 'cantilever', unitWeight: null } },
      { X2: 'F1' },
    );
    const { outputs } = c02;
    expect(shearOf(line, 'compatible', 'X2', 'F1') / 100).toBeCloseTo(outputs['force taken by B at level 1 / P'], 7);
    expect(shearOf(line, 'compatible', 'X1', 'F1') / 100).toBeCloseTo(outputs['storey-1 shear in A / P'], 7);
    expect(shearOf(line, 'compatible', 'X1', 'F2') / 100).toBeCloseTo(outputs['storey-2 shear in A / P'], 7);
    // relative rigidity alone halves the story shear: wrong at a cut-off, and said
    expect(shearOf(line, 'rigid', 'X2', 'F1') / 100).toBeCloseTo(0.5, 7);
  });
});

describe('C04: walls of 6 and 3 m in flexure only', () => {
  const plan: HandPlan = {
    heights: [3.5, 3.5, 3.5],
    extent: [20, 20],
    walls: [
      { wall: 'X1', ends: [0, 10, 6, 10], thickness: 250 },
      { wall: 'X2', ends: [8, 10, 11, 10], thickness: 250 },
      { wall: 'Y1', ends: [0, 0, 0, 6], thickness: 250 },
      { wall: 'Y2', ends: [20, 0, 20, 6], thickness: 250 },
    ],
    forces: [100, 200, 300].map((fx, i) => ({ level: `F${String(i + 1)}`, kind: 'wind', fx, fy: 0 })),
  };
  const shears = [600, 500, 300];
  const shareOf = (document: ResultDocument, i: number): number =>
    shearOf(document, 'compatible', 'X1', `F${String(i + 1)}`) / (shears[i] ?? NaN);

  it('share every story in proportion to I, 8/9 to the longer', () => {
    const document = solve(plan, { stiffness: { flexure: 0.5, shear: 1e9, end: 'cantilever', unitWeight: null } });
    c04.outputs.share_A_each_level.forEach((share, i) => {
      expect(shareOf(document, i)).toBeCloseTo(share, 6);
    });
  });

  it('do so no longer with shear deformation: the fixture’s own recomputed shares, gross sections', () => {
    const document = solve(plan, { stiffness: { flexure: 1, shear: 1, end: 'cantilever', unitWeight: null } });
    c04.recomputed['storey-shear share of A with shear deformation (levels 1-3, mine)'].forEach((share, i) => {
      expect(shareOf(document, i)).toBeCloseTo(share, 4);
    });
  });
});
