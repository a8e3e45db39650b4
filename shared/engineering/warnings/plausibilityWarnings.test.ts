import { describe, expect, it } from 'vitest';

import type { Settings, WallRow } from '../input.ts';
import { analyzed } from '../testing/analyzed.ts';
import { building, force, gravity, level, wall } from '../testing/handBuilding.ts';

import { crackedStateWarnings } from './crackedStateWarnings.ts';
import { plausibilityWarnings } from './plausibilityWarnings.ts';
import { stressWarnings } from './stressWarnings.ts';

const extent = { extent_x: 60, extent_y: 40, x: 30, y: 20 };
const zero = { D: 0, L: 0, Lr: 0, S: 0, W: 0, E: 0, H: 0 };
const combination = (factors: Partial<typeof zero>) => ({
  name: null,
  text: 'hand',
  factors: { ...zero, ...factors },
  standard: false,
});
/** One story of 20 ft, four walls of 20 ft, 10 in thick, f'c 4000; a wind force in y shared by A and B alike. */
function plan(fy: number, more: { walls?: readonly WallRow[]; settings?: Partial<Settings>; dead?: number } = {}) {
  const input = building(
    {
      levels: [level('Roof', 20, extent)],
      walls: more.walls ?? [
        wall('A', [0, 10, 0, 30], 10, ['Roof', 'Roof']),
        wall('B', [60, 10, 60, 30], 10, ['Roof', 'Roof']),
        wall('C', [20, 0, 40, 0], 10, ['Roof', 'Roof']),
        wall('D', [20, 40, 40, 40], 10, ['Roof', 'Roof']),
      ],
      forces: [force('Roof', 'WY', 'wind', 0, fy)],
      gravity: more.dead === undefined ? [] : [gravity('Roof', 'A', more.dead)],
    },
    more.settings ?? {},
  );
  return analyzed(input, [combination({ D: 1, W: 1 })]);
}

describe('crackedStateWarnings', () => {
  const found = (fy: number, flexure: number, dead?: number) => {
    const { analysis, walls } = plan(fy, {
      settings: { stiffness: { flexure, shear: 1, end: 'cantilever', unitWeight: null } },
      ...(dead === undefined ? {} : { dead }),
    });
    return crackedStateWarnings(analysis, walls).map(({ wall: name, message, holds }) => ({ name, message, holds }));
  };
  // t lw^2/6 = 10 x 240^2/6 = 96,000 in3; 7.5 sqrt(4000) = 474.3 psi: cracking moment 45,537 kip-in, shear 189.7 kip at 240 in
  it('names uncracked walls that crack, by hand at 474 psi', () => {
    expect(found(2 * 189, 0.7)).toEqual([]);
    const cracked = found(2 * 191, 0.7);
    expect(cracked.map(({ name }) => name)).toEqual(['A', 'B']);
    expect(cracked[0]?.message).toContain("reaches 478 psi at Roof, above 7.5 sqrt(f'c) = 474 psi");
    expect(cracked[0]?.holds).toEqual({ walls: null, from: 'Roof', to: 'Roof' });
  });

  it('counts the compression: 48 kip on 2,400 in2 are 20 psi', () => {
    expect(found(2 * 191, 0.7, 48).map(({ name }) => name)).toEqual(['B']);
  });

  it('names cracked walls that do not crack', () => {
    expect(found(2 * 100, 0.35).map(({ name }) => name)).toEqual(['A', 'B', 'C', 'D']);
    expect(found(2 * 191, 0.35).map(({ name }) => name)).toEqual(['C', 'D']);
  });

  it('says nothing of 0.5, which is neither', () => {
    expect(found(2 * 191, 0.5)).toEqual([]);
  });
});

describe('plausibilityWarnings', () => {
  const codes = ({ analysis, walls }: ReturnType<typeof plan>) =>
    plausibilityWarnings(analysis, walls).map(({ code, wall: name }) => [code, name]);

  it('names walls above 40 % of a story shear, and not the walls across', () => {
    const share = codes(plan(10)).filter(([code]) => code === 'plausibility-share');
    expect(share).toEqual([
      ['plausibility-share', 'A'],
      ['plausibility-share', 'B'],
    ]);
  });

  it('is content with a third each', () => {
    const three = [0, 30, 60].map((x) => wall(`Y${x}`, [x, 10, x, 30], 10, ['Roof', 'Roof']));
    const across = [0, 40].map((y) => wall(`X${y}`, [20, y, 40, y], 10, ['Roof', 'Roof']));
    const found = codes(plan(10, { walls: [...three, ...across] }));
    expect(found.filter(([code]) => code === 'plausibility-share')).toEqual([]);
  });

  it('names a center of rigidity more than 20 % of the extent off', () => {
    const at = (x: number) => [
      wall('A', [x, 10, x, 30], 10, ['Roof', 'Roof']),
      wall('B', [60, 10, 60, 30], 10, ['Roof', 'Roof']),
      wall('C', [20, 0, 40, 0], 10, ['Roof', 'Roof']),
      wall('D', [20, 40, 40, 40], 10, ['Roof', 'Roof']),
    ];
    // the center stands at (x + 60)/2; 20 % of 60 ft is 12 ft off 30
    const center = (x: number) =>
      codes(plan(10, { walls: at(x) })).filter(([code]) => code === 'plausibility-center').length;
    expect(center(23)).toBe(0);
    expect(center(25)).toBe(1);
  });

  it.each([
    // hw/lw is 240/240 and 240/96
    ['a squat wall by flexure', 20, 0.9, 0.6, 1],
    ['a squat wall by shear', 20, 0.6, 0.9, 0],
    ['a slender wall by shear', 8, 0.6, 0.9, 1],
    ['a slender wall by flexure', 8, 0.9, 0.6, 0],
  ])('judges %s', (_name, lengthFt, flexure, shear, count) => {
    const walls = [0, 60].map((x) => wall(`Y${x}`, [x, 10, x, 10 + lengthFt], 10, ['Roof', 'Roof']));
    const across = [0, 40].map((y) => wall(`X${y}`, [20, y, 40, y], 10, ['Roof', 'Roof']));
    const run = plan(10, { walls: [...walls, ...across] });
    const ratios: Readonly<Record<string, number>> = { flexure, shear };
    const outcomes = run.walls.slice(0, 1).map((outcome) => ({
      ...outcome,
      design: {
        ...outcome.design,
        checks: outcome.design.checks.map((one) => ({ ...one, ratio: ratios[one.check] ?? one.ratio })),
      },
    }));
    const odd = plausibilityWarnings(run.analysis, outcomes).filter(({ code }) => code === 'plausibility-governs');
    expect(odd).toHaveLength(count);
  });
});

describe('stressWarnings', () => {
  const codes = (run: ReturnType<typeof plan>) =>
    stressWarnings(run.analysis, run.walls)
      .filter(({ wall: name }) => name === 'A')
      .map(({ code }) => code);

  it("names Vu above 6 sqrt(f'c) Acv: 379.5 psi x 2,400 in2 = 910.7 kip", () => {
    expect(codes(plan(2 * 909))).not.toContain('plausibility-shear');
    expect(codes(plan(2 * 912))).toContain('plausibility-shear');
  });

  it("names Pu above 0.35 f'c Ag: 1,400 psi x 2,400 in2 = 3,360 kip", () => {
    expect(codes(plan(10, { dead: 3350 }))).not.toContain('plausibility-axial');
    expect(codes(plan(10, { dead: 3370 }))).toContain('plausibility-axial');
  });

  it('names steel above 1 % in the web and above 4 % in end zones, by the bars of the row', () => {
    const { analysis, walls } = plan(10);
    const outcome = walls[0];
    const row = outcome?.design.rows[0];
    if (!outcome || !row) throw new Error('no row');
    const withCells = (spacing: number, length: number) => ({
      ...outcome,
      design: {
        ...outcome.design,
        rows: [
          {
            ...row,
            cells: {
              ...row.cells,
              // two No. 6: 0.88 in2; 1 % of 10 in is 0.1 in2 an inch, at 8.8 in
              vertical: { curtains: 2 as const, bar: 6, spacing },
              horizontal: { ...row.cells.horizontal, curtains: 1 as const, bar: 4, spacing: 12 },
              // eight No. 9: 8.0 in2; 4 % of 10 in wide is 0.4 in2 an inch, at 20 in
              ends: { bar: 9, count: 8, length },
            },
          },
        ],
      },
    });
    const found = (spacing: number, length: number) =>
      stressWarnings(analysis, [withCells(spacing, length)]).map(({ code }) => code);
    expect(found(9, 20.5)).toEqual([]);
    expect(found(8, 20.5)).toEqual(['plausibility-steel']);
    expect(found(9, 19)).toEqual(['plausibility-ends']);
  });
});
