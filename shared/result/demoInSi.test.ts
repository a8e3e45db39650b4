import { readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

import type { ResultDocument } from '../contracts/result.ts';
import { readFolder } from '../csv/readFolder.ts';

import { runBuilding } from './runBuilding.ts';

/**
 * The demo building and its twin in SI. The twin's files are made here, cell by cell, with factors written out again
 * (1 ft = 0.3048 m, 1 in = 25.4 mm, 1 lbf = 0.45359237 x 9.80665 N), not with the product's conversion. Steel is not compared:
 * a soft-metric No. 16 is 199 mm2 and not 0.31 in2.
 */
const folder = resolve(import.meta.dirname, '../../fixtures/buildings/demo');
const kip = (0.45359237 * 9.80665 * 1000) / 1000;
const psi = (0.45359237 * 9.80665) / (25.4 * 25.4);
const pcf = (0.45359237 * 9.80665) / 1000 / (0.3048 * 0.3048 * 0.3048);
const factorOf: Readonly<Record<string, number>> = {
  kip,
  ft: 0.3048,
  in: 25.4,
  ft2: 0.3048 * 0.3048,
  psi,
};

function twinTable(text: string): string {
  const [head = '', ...rows] = text.trim().split('\n');
  const columns = head.split(',').map((cell) => /^(\w+)(?: \((\w+)\))?$/.exec(cell) ?? []);
  const factors = columns.map(([, , unit]) => {
    if (unit === undefined) return null;
    const factor = factorOf[unit];
    if (factor === undefined) throw new Error(`unit ${unit}`);
    return factor;
  });
  const cells = rows.map((row) =>
    row
      .split(',')
      .map((cell, i) => {
        const factor = factors[i] ?? null;
        return factor === null || cell.trim() === '' ? cell : String(Number(cell) * factor);
      })
      .join(','),
  );
  return [columns.map(([, name]) => name).join(','), ...cells].join('\n');
}

function solve(files: Map<string, string>): ResultDocument {
  const encoder = new TextEncoder();
  const reading = readFolder(new Map([...files].map(([name, text]) => [name, encoder.encode(text)])));
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  const outcome = runBuilding(reading.input, { allActions: true });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

const tables = ['levels', 'walls', 'forces', 'gravity'];
const textOf = (name: string) => readFileSync(join(folder, name), 'utf8');
const settings: Record<string, unknown> = { ...(JSON.parse(textOf('building.json')) as object) };
const us = solve(
  new Map([
    ['building.json', JSON.stringify(settings)],
    ...tables.map((name): [string, string] => [`${name}.csv`, textOf(`${name}.csv`)]),
  ]),
);
const si = solve(
  new Map([
    [
      'building.json',
      JSON.stringify({
        ...settings,
        units: 'si',
        fc: Number(settings.fc) * psi,
        fy: 60 * 1000 * psi,
        fyt: 60 * 1000 * psi,
        concreteWeight: 150 * pcf,
        expectedBaseShear: {},
      }),
    ],
    ...tables.map((name): [string, string] => [`${name}.csv`, twinTable(textOf(`${name}.csv`))]),
  ]),
);

/** Largest difference of two lists over the largest value of the list, the second one turned back into US units. */
function largest(own: readonly number[], twin: readonly number[], factor: number): number {
  expect(twin).toHaveLength(own.length);
  expect(own.length).toBeGreaterThan(100);
  const size = Math.max(...own.map(Math.abs));
  expect(size).toBeGreaterThan(0);
  return Math.max(...own.map((value, i) => Math.abs(value - (twin[i] ?? NaN) / factor))) / size;
}

describe('the demo building in SI', () => {
  it('has the same rigidities, k in kN/mm', () => {
    const k = (result: ResultDocument) => result.rigidities.map((row) => row.k);
    expect(largest(k(us), k(si), kip / 25.4)).toBeLessThan(1e-9);
  });
  it('has the same shares and wall forces', () => {
    const total = (result: ResultDocument) => result.distribution.map((row) => row.total);
    const torsional = (result: ResultDocument) => result.distribution.flatMap((row) => row.torsional ?? []);
    const moment = (result: ResultDocument) => result.lateral.map((row) => row.moment);
    expect(largest(total(us), total(si), kip)).toBeLessThan(1e-9);
    expect(largest(torsional(us), torsional(si), kip)).toBeLessThan(1e-9);
    expect(largest(moment(us), moment(si), kip * 0.3048)).toBeLessThan(1e-9);
  });
  it('has the same gravity with self-weight', () => {
    const axial = (result: ResultDocument) => result.gravity.map((row) => row.axial);
    expect(largest(axial(us), axial(si), kip)).toBeLessThan(1e-9);
  });
  it('has the same factored actions under the same combinations', () => {
    expect(si.actions.map((row) => row.combination)).toEqual(us.actions.map((row) => row.combination));
    const of = (result: ResultDocument, column: 'axial' | 'moment' | 'shear') =>
      result.actions.map((row) => row[column]);
    expect(largest(of(us, 'axial'), of(si, 'axial'), kip)).toBeLessThan(1e-9);
    expect(largest(of(us, 'moment'), of(si, 'moment'), kip * 0.3048)).toBeLessThan(1e-9);
    expect(largest(of(us, 'shear'), of(si, 'shear'), kip)).toBeLessThan(1e-9);
  });
  it('is designed with soft-metric bars at spacings of the SI list', () => {
    expect(si.schedule.length).toBeGreaterThan(0);
    for (const { vertical, horizontal } of si.schedule) {
      expect([13, 16, 19, 22, 25]).toContain(vertical.bar);
      expect([13, 16, 19]).toContain(horizontal.bar);
      expect([150, 200, 225, 250, 300, 350, 400, 450]).toContain(vertical.spacing);
      expect([150, 200, 225, 250, 300, 350, 400, 450]).toContain(horizontal.spacing);
    }
  });
});
