import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

import { readFolder } from '#shared/csv/readFolder';
import type { BuildingInput } from '#shared/engineering/input';
import { runBuilding } from '#shared/result/runBuilding';

import { generateBuilding } from './generateBuilding.ts';

/**
 * `npm run bench`: JSON lines {"name","value","unit"}. The first run of a process is cold; then the median of five, each with
 * another thickness, so that no cache can answer.
 */
const print = (name: string, value: number, unit: string) =>
  process.stdout.write(`${JSON.stringify({ name, value: Math.round(value * 1000) / 1000, unit })}\n`);

function readDemo(): BuildingInput {
  const folder = join(import.meta.dirname, '..', '..', 'fixtures', 'buildings', 'demo');
  const files = new Map(readdirSync(folder).map((name) => [name, new Uint8Array(readFileSync(join(folder, name)))]));
  const reading = readFolder(files);
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  return reading.input;
}

/** The same building with every wall thicker by a random fraction of an inch. */
function varied(input: BuildingInput): BuildingInput {
  const more = Math.random();
  const walls = input.tables.walls.map((row) => ({ ...row, thickness: row.thickness + more }));
  return { ...input, tables: { ...input.tables, walls } };
}

let runs = 0;
function measure(input: BuildingInput): { milliseconds: number; chain: number; bytes: number } {
  const start = performance.now();
  const outcome = runBuilding(input, { now: () => performance.now() });
  const milliseconds = performance.now() - start;
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems.slice(0, 3)));
  runs += 1;
  const { timing } = outcome.document;
  return {
    milliseconds,
    chain: (timing.total ?? 0) - (timing.write ?? 0),
    bytes: JSON.stringify(outcome.document).length,
  };
}

const median = (values: number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;

const demo = readDemo();
print('demo chain cold', measure(varied(demo)).milliseconds, 'ms');
const buildings: [string, BuildingInput][] = [
  ['demo', demo],
  ['12x10', generateBuilding(12, 10, 11)],
  ['40x30', generateBuilding(40, 30, 12)],
  ['60x60', generateBuilding(60, 60, 13)],
];
for (const [name, building] of buildings) {
  const results = Array.from({ length: 5 }, () => measure(varied(building)));
  print(`${name} with result rows`, median(results.map((result) => result.milliseconds)), 'ms');
  print(`${name} chain`, median(results.map((result) => result.chain)), 'ms');
  print(`${name} result.json`, (results[0]?.bytes ?? 0) / 1e6, 'MB');
}
print('engine runs', runs, 'count');
print('memory', process.memoryUsage().rss / 1e6, 'MB');
