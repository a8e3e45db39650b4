import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

import { describe, expect, it } from 'vitest';

import { readFolder } from './readFolder.ts';
import { readTable } from './readTable.ts';

import type { TableName, UnitSystem } from '../engineering/input.ts';

interface BrokenCase {
  readonly folder: string;
  readonly base: UnitSystem;
  readonly table: TableName | 'building';
  readonly file: string;
  /** a second file of the folder that the fault needs */
  readonly beside?: string;
  readonly expected: readonly { readonly row: number | null; readonly column: string | null }[];
  readonly about: string;
}

const root = join(import.meta.dirname, '../../fixtures/csv');
const cases = JSON.parse(readFileSync(join(root, 'broken/manifest.json'), 'utf8')) as BrokenCase[];

/** The valid folder of the units with the broken file in place of the good one. */
function filesOf({ base, folder, file, beside }: BrokenCase): Map<string, Uint8Array> {
  const valid = join(root, 'valid', base);
  const files = new Map<string, Uint8Array>(readdirSync(valid).map((name) => [name, readFileSync(join(valid, name))]));
  if (beside !== undefined) files.set(beside, readFileSync(join(root, 'broken', folder, beside)));
  return files.set(file, readFileSync(join(root, 'broken', folder, file)));
}

describe('broken files', () => {
  it('has at least 45 cases and a folder for each', () => {
    expect(cases.length).toBeGreaterThanOrEqual(45);
    const folders = readdirSync(join(root, 'broken'), { withFileTypes: true }).filter((entry) => entry.isDirectory());
    expect(folders.map((entry) => entry.name).sort()).toEqual(cases.map((entry) => entry.folder).sort());
  });

  it.each(cases)('$folder: $about', (broken) => {
    const reading = readFolder(filesOf(broken));
    if (reading.ok) throw new Error('the folder was taken');
    expect(reading.problems.map(({ file, row, column }) => ({ file, row, column }))).toEqual(
      broken.expected.map((place) => ({ file: broken.file, ...place })),
    );
    for (const problem of reading.problems) {
      expect(problem.message).not.toMatch(/undefined|NaN(?!")|please|!|\[object/);
      expect(problem.message.length).toBeGreaterThan(20);
    }
  });

  it('gives the problems of one file alone the same place as in its folder', () => {
    const alone = cases.filter((entry) => entry.table !== 'building');
    let compared = 0;
    for (const broken of alone) {
      const bytes = filesOf(broken).get(broken.file) ?? new Uint8Array();
      const reading = readTable(broken.table as TableName, bytes, broken.file, broken.base);
      for (const { row, column } of reading.problems) expect(broken.expected).toContainEqual({ row, column });
      compared += reading.problems.length;
    }
    expect(compared).toBeGreaterThan(40);
  });
});

describe('valid folders', () => {
  it.each(['us', 'si'])('takes the small building in %s units', (units) => {
    const folder = join(root, 'valid', units);
    const reading = readFolder(new Map(readdirSync(folder).map((name) => [name, readFileSync(join(folder, name))])));
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
    expect(reading.notices).toEqual([]);
    expect(reading.input.settings.units).toBe(units);
    expect(reading.input.tables.levels).toHaveLength(3);
    expect(reading.lines.walls).toEqual([2, 3, 4, 5, 6]);
  });
});
