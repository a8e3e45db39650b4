import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ResultDocument } from '#shared/contracts/result';
import { readFolder } from '#shared/csv/readFolder';
import { runBuilding } from '#shared/result/runBuilding';

/** The engine as a black box against code that shares nothing with it: checkResult.mjs runs as a program of its own. */
const scripts = import.meta.dirname;
const fixtures = resolve(scripts, '../../fixtures/buildings');
let workFolder = '';

beforeAll(() => {
  workFolder = mkdtempSync(join(tmpdir(), 'independent-'));
});
afterAll(() => {
  rmSync(workFolder, { recursive: true });
});

function solve(folder: string): ResultDocument {
  const files = new Map(readdirSync(folder).map((name) => [name, new Uint8Array(readFileSync(join(folder, name)))]));
  const reading = readFolder(files);
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  const outcome = runBuilding(reading.input, { allActions: true });
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.document;
}

function check(folder: string, document: ResultDocument): { status: number | null; output: string } {
  const file = join(workFolder, 'result.json');
  writeFileSync(file, JSON.stringify(document));
  const program = spawnSync(process.execPath, [join(scripts, 'checkResult.mjs'), folder, file, '--all-actions'], {
    encoding: 'utf8',
  });
  return { status: program.status, output: program.stdout + program.stderr };
}

function generate(seed: number, generator = 'generateBuilding'): string {
  const folder = join(workFolder, `${generator}${String(seed)}`);
  spawnSync(process.execPath, [join(scripts, `${generator}.mjs`), String(seed), folder]);
  return folder;
}

describe('the engine agrees with the independent solver', () => {
  it.each(readdirSync(fixtures))('on the building %s', (name) => {
    const folder = join(fixtures, name);
    const { status, output } = check(folder, solve(folder));
    expect(output).toContain('no difference');
    expect(status).toBe(0);
  });

  it.each(Array.from({ length: 21 }, (_, index) => index + 1))('on generated building %d', (seed) => {
    const folder = generate(seed);
    const { status, output } = check(folder, solve(folder));
    expect(output).toContain('no difference');
    expect(status).toBe(0);
  });
});

describe('the engine agrees with the independent solver in every basis and option', () => {
  it.each(Array.from({ length: 60 }, (_, index) => index + 1))('on generated building %d', (seed) => {
    const folder = generate(seed, 'generateChain');
    const { status, output } = check(folder, solve(folder));
    expect(output).toContain('no difference');
    expect(status).toBe(0);
  });
});

describe('the independent check sees a fault', () => {
  const faults: [string, (document: ResultDocument) => ResultDocument, string][] = [
    [
      'a share that was dropped',
      (document) => ({ ...document, distribution: document.distribution.slice(1) }),
      'residual of',
    ],
    [
      'a share that is half a percent off',
      (document) => ({
        ...document,
        distribution: document.distribution.map((row, i) => (i === 0 ? { ...row, total: row.total * 1.005 } : row)),
      }),
      'distribution',
    ],
    [
      'a moment with the wrong sign',
      (document) => ({
        ...document,
        lateral: document.lateral.map((row, i) => (i === 0 ? { ...row, moment: -row.moment } : row)),
      }),
      'residual of overturning',
    ],
    [
      'gravity that went missing',
      (document) => ({ ...document, gravity: document.gravity.slice(1) }),
      'residual of vertical',
    ],
    [
      'an action that no combination gives',
      (document) => ({
        ...document,
        actions: document.actions.map((row, i) => (i === 0 ? { ...row, axial: row.axial + 1 } : row)),
      }),
      'is not in the own expansion',
    ],
    [
      'a row with thinner bars than its verdict',
      (document) => ({
        ...document,
        schedule: document.schedule.map((row) => ({ ...row, vertical: { ...row.vertical, spacing: 70 } })),
      }),
      'vertical spacing',
    ],
  ];

  it.each<[string, (document: ResultDocument) => ResultDocument, string]>([
    [
      'a drift that is a percent off',
      (document) => ({
        ...document,
        drifts: document.drifts.map((row) => ({ ...row, x: row.x === null ? null : row.x * 1.01 })),
      }),
      'drifts',
    ],
    [
      'a compatible share that is a millionth off',
      (document) => ({
        ...document,
        distribution: document.distribution.map((row) =>
          row.basis === 'compatible' ? { ...row, total: row.total * (row.wall === 'W0' ? 1 + 1e-6 : 1) } : row,
        ),
      }),
      'residual of force x, compatible',
    ],
    [
      'a drift check on a level that is not there',
      (document) => ({
        ...document,
        checks: document.checks.map((row) =>
          row.check.startsWith('drift') ? { ...row, level: 'nowhere', ok: false } : row,
        ),
      }),
      'nowhere demand',
    ],
    [
      'an envelope that is not the worst',
      (document) => ({
        ...document,
        checks: document.checks.map((row) => (row.basis === 'envelope' ? { ...row, ratio: 0 } : row)),
      }),
      'not the worst of its bases',
    ],
  ])('%s', (_, spoil, sign) => {
    const folder = generate(6, 'generateChain');
    const { status, output } = check(folder, spoil(solve(folder)));
    expect(output).toContain(sign);
    expect(status).toBe(1);
  });

  it.each(faults)('%s', (_, spoil, sign) => {
    const folder = generate(2);
    const { status, output } = check(folder, spoil(solve(folder)));
    expect(output).toContain(sign);
    expect(status).toBe(1);
  });
});
