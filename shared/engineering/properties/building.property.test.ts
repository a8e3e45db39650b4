import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { ResultDocument } from '../../contracts/result.ts';
import { settingsDefaults } from '../../contracts/settingsDefaults.ts';
import { runBuilding } from '../../result/runBuilding.ts';
import type { BuildingInput, ForceRow } from '../input.ts';

import { deviation } from './deviation.ts';
import type { Shape } from './shapedBuilding.ts';
import { forceRows, levelName, mapPlan, shapedBuilding } from './shapedBuilding.ts';
import { siTwin } from './siTwin.ts';

/**
 * Rules that hold for every building, tried on random ones through the one entry: what goes in at the tables must come out
 * at the walls, whatever the plan, the axes, the units or the order of runs.
 */
const numRuns = 100;

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
      from: fc.nat(3),
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

const makeBuilding = (shape: Shape): BuildingInput =>
  shapedBuilding(shape, { ...settingsDefaults('us'), name: 'Random', basis: ['rigid'] });

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

describe('rules of every building', () => {
  it('force and torque of the walls equal those of the tables, story by story', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const { distribution, levels } = solve(input);
      const top = shape.heights.length - 1;
      const directionOf = (name: string): { c: number; s: number; arm: number } => {
        const row = input.tables.walls.find(({ wall }) => wall === name);
        if (row === undefined) throw new Error(name);
        const length = Math.hypot(row.x2 - row.x1, row.y2 - row.y1);
        const [c, s] = [(row.x2 - row.x1) / length, (row.y2 - row.y1) / length];
        return { c, s, arm: row.x1 * s - row.y1 * c };
      };
      expect(levels).toHaveLength(shape.heights.length);
      for (const [name, offset, signs] of [
        ['E1', 0, { 0: 0, '+': 1, '-': -1 }],
        ['W1', 4, { 0: 0 }],
      ] as const) {
        for (const [variant, sign] of Object.entries(signs)) {
          for (let i = 0; i <= top; i += 1) {
            const above = shape.forces.slice(offset + i, offset + top + 1);
            const sum = (pick: (force: Shape['forces'][number]) => number): number =>
              above.reduce((total, force) => total + pick(force), 0);
            const rows = distribution.filter(
              (row) => row.case === name && row.variant === variant && row.level === levelName(i),
            );
            const wallSum = (pick: (wall: ReturnType<typeof directionOf>) => number): number =>
              rows.reduce((total, row) => total + row.total * pick(directionOf(row.wall)), 0);
            const size = rows.reduce((total, row) => total + Math.abs(row.total), 1);
            const torque = sum(({ fx, fy, mz, x, y }) => mz + x * fy - y * fx + sign * 0.05 * (80 * fy - 60 * fx));
            expect(Math.abs(wallSum(({ c }) => c) - sum(({ fx }) => fx)) / size).toBeLessThan(1e-9);
            expect(Math.abs(wallSum(({ s }) => s) - sum(({ fy }) => fy)) / size).toBeLessThan(1e-9);
            expect(Math.abs(wallSum(({ arm }) => arm) - torque) / (80 * size)).toBeLessThan(1e-9);
          }
        }
      }
    });
  });

  it('moment at a story bottom is the sum of shear times height above it', () => {
    holds((shape) => {
      const { lateral } = solve(makeBuilding(shape));
      for (const row of lateral) {
        const above = lateral.filter(
          (other) =>
            other.wall === row.wall &&
            other.case === row.case &&
            other.variant === row.variant &&
            Number(other.level.slice(1)) >= Number(row.level.slice(1)),
        );
        const terms = above.map(({ level, shear }) => shear * (shape.heights[Number(level.slice(1)) - 1] ?? NaN));
        const size = terms.reduce((total, term) => total + Math.abs(term), 1);
        expect(Math.abs(row.moment - terms.reduce((total, term) => total + term, 0)) / size).toBeLessThan(1e-12);
      }
    });
  });

  it('two cases together carry the sum of each alone', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const [first, second] = [forceRows(shape, 'W1', 0, 'wind'), forceRows(shape, 'W1', 4, 'wind')];
      const a = solve(withForces(input, first)).distribution;
      const b = solve(withForces(input, second)).distribution;
      const both = solve(withForces(input, [...first, ...second])).distribution;
      const added = a.map((row, i) => ({ ...row, total: row.total + (b[i]?.total ?? NaN) }));
      expect(deviation(added, both, 'total')).toBeLessThan(1e-9);
      const tripled = first.map((row) => ({ ...row, fx: 3 * row.fx, fy: 3 * row.fy, mz: 3 * (row.mz ?? 0) }));
      const c = solve(withForces(input, tripled)).lateral;
      const once = solve(withForces(input, first)).lateral;
      expect(deviation(c, once, 'moment', 3)).toBeLessThan(1e-9);
    });
  });

  it('the origin of the plan does not matter', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const here = solve(input);
      const there = solve(mapPlan(input, (x, y) => [x + 137.5, y - 88.25]));
      for (const column of ['direct', 'torsional', 'total']) {
        expect(deviation(here.distribution, there.distribution, column)).toBeLessThan(1e-9);
      }
      here.levels.forEach((level, i) => {
        expect(there.levels[i]?.rigidity?.x).toBeCloseTo((level.rigidity?.x ?? NaN) + 137.5, 7);
        expect(there.levels[i]?.rigidity?.y).toBeCloseTo((level.rigidity?.y ?? NaN) - 88.25, 7);
      });
    });
  });

  it('the direction of the axes does not matter', () => {
    holds((shape) => {
      const still = makeBuilding(shape);
      const input = { ...still, settings: { ...still.settings, accidental: 0 } };
      const turn = (x: number, y: number): readonly [number, number] => [0.6 * x - 0.8 * y, 0.8 * x + 0.6 * y];
      const here = solve(input);
      const there = solve(mapPlan(input, turn, turn));
      for (const column of ['direct', 'torsional', 'total']) {
        expect(deviation(here.distribution, there.distribution, column)).toBeLessThan(1e-9);
      }
      expect(deviation(here.lateral, there.lateral, 'moment')).toBeLessThan(1e-9);
    });
  });

  it('a wall drawn the other way has the opposite sign and the same size', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const walls = input.tables.walls.map((row) =>
        row.wall === 'X1' ? { ...row, x1: row.x2, y1: row.y2, x2: row.x1, y2: row.y1 } : row,
      );
      const here = solve(input).distribution;
      const there = solve({ ...input, tables: { ...input.tables, walls } }).distribution;
      const turned = here.map((row) => (row.wall === 'X1' ? { ...row, total: -row.total } : row));
      expect(deviation(turned, there, 'total')).toBeLessThan(1e-12);
    });
  });

  it('stiffness factors of all walls alike change rigidities and no share', () => {
    holds((shape) => {
      const input = makeBuilding(shape);
      const stiffness = { ...input.settings.stiffness, flexure: 1, shear: 2 };
      const here = solve(input);
      const there = solve({ ...input, settings: { ...input.settings, stiffness } });
      expect(deviation(there.rigidities, here.rigidities, 'k', 2)).toBeLessThan(1e-12);
      expect(deviation(here.distribution, there.distribution, 'total')).toBeLessThan(1e-9);
    });
  });

  it('the twin in SI agrees within 1e-9', () => {
    const [foot, inch, kip] = [0.3048, 25.4, 4.4482216152605];
    holds((shape) => {
      const us = makeBuilding(shape);
      const si = siTwin(us, settingsDefaults('si'));
      const here = solve(us);
      const there = solve(si);
      expect(deviation(there.rigidities, here.rigidities, 'k', kip / inch)).toBeLessThan(1e-9);
      for (const column of ['direct', 'torsional', 'total']) {
        expect(deviation(there.distribution, here.distribution, column, kip)).toBeLessThan(1e-9);
      }
      expect(deviation(there.lateral, here.lateral, 'moment', kip * foot)).toBeLessThan(1e-9);
      expect(deviation(there.gravity, here.gravity, 'axial', kip)).toBeLessThan(1e-9);
      expect(deviation(there.gravity, here.gravity, 'moment', kip * foot)).toBeLessThan(1e-9);
    });
  });

  it('an edited building computes as one made from scratch, to the last bit', () => {
    holds((shape) => {
      const before = makeBuilding(shape);
      const edited = {
        ...before,
        tables: {
          ...before.tables,
          walls: before.tables.walls.map((row) => (row.wall === 'Y1' ? { ...row, thickness: row.thickness + 2 } : row)),
        },
      };
      const plain = (document: ResultDocument): string => JSON.stringify({ ...document, timing: null });
      const first = plain(solve(before));
      const changed = plain(solve(edited));
      expect(plain(solve(structuredClone(edited)))).toBe(changed);
      expect(plain(solve(structuredClone(before)))).toBe(first);
      expect(changed).not.toBe(first);
    });
  });
});
