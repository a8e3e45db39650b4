import { readFileSync, readdirSync } from 'node:fs';
import { join, resolve } from 'node:path';

import { describe, expect, it } from 'vitest';

import recorded from '../../../fixtures/published/calculix/results.json';
import type { ResultDocument } from '../../contracts/result.ts';
import { readFolder } from '../../csv/readFolder.ts';
import { runBuilding } from '../../result/runBuilding.ts';

/**
 * The whole-height solution against a general finite-element program: computed with CalculiX 2.20 from decks c3_cut_off_beam and
 * c4_five_walls_beam (fixtures/published/calculix; scripts/calculix.mjs runs them again). Tolerance 1e-4 of the largest value of
 * its kind and story: the decks' mesh of 128 elements a story lies within 0.01 % of the exact Timoshenko solution (its README).
 */
const tolerance = 1e-4;
const folder = resolve(import.meta.dirname, '../../../fixtures/published/calculix');

function solve(name: string): ResultDocument {
  const files = readdirSync(join(folder, name)).map(
    (file) => [file, new Uint8Array(readFileSync(join(folder, name, file)))] as const,
  );
  const reading = readFolder(new Map(files));
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  const outcome = runBuilding(reading.input);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

type ByWall = Readonly<Record<string, Readonly<Record<string, number>>>>;

function largestDeviation(pairs: readonly (readonly [number, number])[]): number {
  const size = Math.max(...pairs.map(([, printed]) => Math.abs(printed)));
  return Math.max(...pairs.map(([value, printed]) => Math.abs(value - printed) / size));
}

describe.each(Object.values(recorded.decks))('$deck', (deck) => {
  const document = solve(deck.case);
  const steps = deck.steps.map((step) => [`${step.case} ${step.variant}`, step] as const);

  it.each(steps)('%s: displacements and turn of every floor', (_, step) => {
    const rows = document.displacements.filter((row) => row.case === step.case && row.variant === step.variant);
    const floors = Object.entries(step.floors);
    expect(rows).toHaveLength(floors.length);
    for (const [level, printed] of floors) {
      const row = rows.find((item) => item.level === level);
      const movement = [
        [row?.x ?? NaN, printed.ux],
        [row?.y ?? NaN, printed.uy],
      ] as const;
      expect(largestDeviation(movement)).toBeLessThan(tolerance);
      if (printed.rotation !== 0)
        expect(Math.abs((row?.rotation ?? NaN) / printed.rotation - 1)).toBeLessThan(tolerance);
    }
  });

  it.each(steps)('%s: shear and moment of every wall and story', (_, step) => {
    const rows = document.lateral.filter(
      (row) => row.basis === 'compatible' && row.case === step.case && row.variant === step.variant,
    );
    for (const column of ['shear', 'moment'] as const) {
      const byWall: ByWall = step[column];
      for (const level of Object.keys(step.floors)) {
        const pairs = Object.entries(byWall).flatMap(([wall, values]) => {
          const printed = values[level];
          const row = rows.find((item) => item.wall === wall && item.level === level);
          return printed === undefined ? [] : [[row?.[column] ?? NaN, printed] as const];
        });
        expect(pairs).toHaveLength(rows.filter((row) => row.level === level).length);
        expect(largestDeviation(pairs)).toBeLessThan(tolerance);
      }
    }
  });
});
