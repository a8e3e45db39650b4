import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { ResultDocument } from '../../contracts/result.ts';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { BuildingInput, ForceRow, Settings } from '../input.ts';

import { deviation } from './deviation.ts';
import type { Shape } from './shapedBuilding.ts';
import { forceRows, mapPlan, shapedBuilding } from './shapedBuilding.ts';
import { siTwin } from './siTwin.ts';

/** Rules of the whole-height solution and its drifts for every building whose walls stand on the base. */
const numRuns = 60;

const number = (low: number, high: number): fc.Arbitrary<number> =>
  fc.integer({ min: Math.round(low * 1000), max: Math.round(high * 1000) }).map((value) => value / 1000);

const shapes: fc.Arbitrary<Shape> = fc.record({
  heights: fc.array(number(8, 18), { minLength: 1, maxLength: 4 }),
  half: fc.array(number(4, 15), { minLength: 4, maxLength: 4 }),
  thickness: fc.array(fc.constantFrom(8, 10, 12, 16), { minLength: 4, maxLength: 4 }),
  extra: fc.array(
    fc.record({
      dx: number(-1, 1),
      dy: number(0.05, 1),
      x: number(10, 70),
      y: number(10, 50),
      half: number(3, 12),
      from: fc.constant(0),
      to: fc.nat(3),
    }),
    { maxLength: 3 },
  ),
  forces: fc.array(
    fc.record({
      fx: number(-80, 80),
      fy: number(-80, 80),
      mz: number(-500, 500),
      x: number(20, 60),
      y: number(15, 45),
    }),
    { minLength: 8, maxLength: 8 },
  ),
  dead: number(10, 60),
});

const makeBuilding = (shape: Shape, more: Partial<Settings> = {}): BuildingInput =>
  shapedBuilding(shape, { ...settingsDefaults('us'), name: 'Random', basis: ['compatible'], ...more });

function solve(input: BuildingInput): ResultDocument {
  const outcome = runBuilding(input);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

const withForces = (input: BuildingInput, forces: readonly ForceRow[]): BuildingInput => ({
  ...input,
  tables: { ...input.tables, forces },
});

const holds = (rule: (shape: Shape) => void): void => {
  fc.assert(fc.property(shapes, rule), { numRuns });
};

describe('rules of the whole-height solution', () => {
  it('two cases together move and carry the sum of each alone, and three times the force three times as much', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const [first, second] = [forceRows(shape, 'W1', 0, 'wind'), forceRows(shape, 'W1', 4, 'wind')];
      const [a, b] = [solve(withForces(input, first)), solve(withForces(input, second))];
      const both = solve(withForces(input, [...first, ...second]));
      const lateral = a.lateral.map((row, i) => ({ ...row, moment: row.moment + (b.lateral[i]?.moment ?? NaN) }));
      expect(deviation(lateral, both.lateral, 'moment')).toBeLessThan(1e-8);
      const drifts = a.drifts.map((row, i) => ({ ...row, x: (row.x ?? NaN) + (b.drifts[i]?.x ?? NaN) }));
      expect(deviation(drifts, both.drifts, 'x')).toBeLessThan(1e-8);
      const tripled = first.map((row) => ({ ...row, fx: 3 * row.fx, fy: 3 * row.fy, mz: 3 * (row.mz ?? 0) }));
      expect(deviation(solve(withForces(input, tripled)).drifts, a.drifts, 'edge', 3)).toBeLessThan(1e-8);
    });
  });

  it('neither the origin nor, without eccentricity, the direction of the axes matters', () => {
    holds((shape) => {
      const here = solve(makeBuilding(shape, { accidental: 0 }));
      const moved = solve(mapPlan(makeBuilding(shape, { accidental: 0 }), (x, y) => [x + 137.5, y - 88.25]));
      const turn = (x: number, y: number): readonly [number, number] => [0.6 * x - 0.8 * y, 0.8 * x + 0.6 * y];
      const turned = solve(mapPlan(makeBuilding(shape, { accidental: 0 }), turn, turn));
      for (const there of [moved, turned]) {
        expect(deviation(here.lateral, there.lateral, 'shear')).toBeLessThan(1e-8);
        expect(deviation(here.displacements, there.displacements, 'rotation')).toBeLessThan(1e-7);
      }
      expect(deviation(here.drifts, moved.drifts, 'edge')).toBeLessThan(1e-8);
    });
  });

  it('a wall drawn the other way has the opposite sign, and no floor moves otherwise', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const walls = input.tables.walls.map((row) =>
        row.wall === 'X1' ? { ...row, x1: row.x2, y1: row.y2, x2: row.x1, y2: row.y1 } : row,
      );
      const [here, there] = [solve(input), solve({ ...input, tables: { ...input.tables, walls } })];
      const turned = here.lateral.map((row) => (row.wall === 'X1' ? { ...row, moment: -row.moment } : row));
      expect(deviation(turned, there.lateral, 'moment')).toBeLessThan(1e-9);
      expect(deviation(here.drifts, there.drifts, 'x')).toBeLessThan(1e-9);
    });
  });

  it('twice the stiffness of all walls halves the drifts and leaves forces, ratios and Ax', () => {
    holds((shape) => {
      const stiffness = { ...settingsDefaults('us').stiffness, flexure: 1, shear: 2 };
      const [here, there] = [solve(makeBuilding(shape)), solve(makeBuilding(shape, { stiffness }))];
      expect(deviation(here.lateral, there.lateral, 'moment')).toBeLessThan(1e-9);
      expect(deviation(here.drifts, there.drifts, 'edge', 2)).toBeLessThan(1e-9);
      const named = (document: ResultDocument) => document.drifts.filter(({ ax }) => ax !== null);
      expect(deviation(named(here), named(there), 'ax')).toBeLessThan(1e-7);
    });
  });

  it('Ax lies within 1 and 3, is one for both variants, and amplifies the eccentric part only', () => {
    holds((shape) => {
      const [plain, amplified] = [solve(makeBuilding(shape)), solve(makeBuilding(shape, { amplify: true }))];
      const axOf = (document: ResultDocument, variant: string) =>
        document.drifts.filter((row) => row.case === 'E1' && row.variant === variant).map(({ ax }) => ax ?? NaN);
      for (const ax of axOf(plain, '+')) expect(ax).toBeGreaterThanOrEqual(1);
      for (const ax of axOf(plain, '+')) expect(ax).toBeLessThanOrEqual(3);
      expect(axOf(plain, '-')).toEqual(axOf(plain, '+'));
      expect(axOf(amplified, '+')).toEqual(axOf(plain, '+'));
      const middle = (document: ResultDocument) => document.lateral.filter(({ variant }) => variant === '0');
      expect(deviation(middle(plain), middle(amplified), 'moment')).toBeLessThan(1e-12);
    });
  });

  it('the twin in SI agrees within 1e-9 in every column of the chain', () => {
    const kip = 4.4482216152605;
    const more: Partial<Settings> = {
      basis: ['rigid', 'compatible'],
      amplify: true,
      orthogonal: 0.3,
      windCases: true,
      liveReduction: true,
      kll: 3,
      forceLevel: 'service',
      baseSprings: { X1: 4_000_000 },
    };
    holds((shape) => {
      const plain = makeBuilding(shape, more);
      const us: BuildingInput = {
        ...plain,
        tables: {
          ...plain.tables,
          levels: plain.tables.levels.map((row) => ({ ...row, gravity: 900 })),
          gravity: plain.tables.gravity.map((row) => ({ ...row, tributary_area: 350 })),
          overrides: [
            {
              kind: 'share',
              level: 'F1',
              wall: 'X2',
              case: 'E1',
              shear: null,
              axial: null,
              moment: null,
              share: 0.3,
              reason: 'study',
            },
            {
              kind: 'transfer',
              level: 'F1',
              wall: 'Y1',
              case: null,
              shear: 4,
              axial: 9,
              moment: 50,
              share: null,
              reason: 'above',
            },
          ],
        },
      };
      const [here, there] = [solve(us), solve(siTwin(us, settingsDefaults('si')))];
      for (const column of ['x', 'y', 'edge']) expect(deviation(there.drifts, here.drifts, column)).toBeLessThan(1e-9);
      const named = (document: ResultDocument) => document.drifts.filter(({ ax }) => ax !== null);
      for (const column of ['torsionRatio', 'ax', 'theta'])
        expect(deviation(named(there), named(here), column)).toBeLessThan(1e-8);
      expect(deviation(there.displacements, here.displacements, 'x', 25.4)).toBeLessThan(1e-9);
      expect(deviation(there.displacements, here.displacements, 'rotation')).toBeLessThan(1e-9);
      expect(deviation(there.distribution, here.distribution, 'total', kip)).toBeLessThan(1e-9);
      expect(deviation(there.lateral, here.lateral, 'moment', kip * 0.3048)).toBeLessThan(1e-9);
      expect(deviation(there.gravity, here.gravity, 'axial', kip)).toBeLessThan(1e-9);
      const drift = ({ checks }: ResultDocument) => checks.filter(({ check }) => check.startsWith('drift'));
      expect(deviation(drift(there), drift(here), 'demand')).toBeLessThan(1e-9);
    });
  });
});
