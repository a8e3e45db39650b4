import { spawnSync } from 'node:child_process';
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

import { readFolder } from '#shared/csv/readFolder';
import type { BuildingInput } from '#shared/engineering/input';
import { checkTables } from '#shared/engineering/model/check-tables/checkTables';
import { chain } from '#shared/engineering/stages';
import type { WallOutcome } from '#shared/engineering/stages';
import { readCombinations } from '#shared/result/readCombinations';
import { resultChunks } from '#shared/result/resultChunks';
import { runBuilding } from '#shared/result/runBuilding';

import { generateBuilding } from './generateBuilding.ts';

/**
 * `npm run bench [NAME]`: JSON lines {"name","value","unit"}. Every building runs in a process of its own, so that memory is its own: first
 * cold, then the median of five, each with another thickness, so that no cache can answer. The chain is measured until its columns stand,
 * writing (result rows and their JSON, piece by piece) beside it; CPU time of all threads stands beside the clock's.
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

const buildings: Readonly<Record<string, () => BuildingInput>> = {
  demo: readDemo,
  '12x10 plain': () => generateBuilding(12, 10, 11, true),
  '12x10': () => generateBuilding(12, 10, 11),
  '40x15': () => generateBuilding(40, 15, 12),
  '40x30': () => generateBuilding(40, 30, 12),
  '60x60': () => generateBuilding(60, 60, 13),
};

/** The same building with every wall thicker by a random fraction of an inch. */
function varied(input: BuildingInput): BuildingInput {
  const more = Math.random();
  const walls = input.tables.walls.map((row) => ({ ...row, thickness: row.thickness + more }));
  return { ...input, tables: { ...input.tables, walls } };
}

/** Checks and the chain, until all columns stand; times of the stages go into `stages`. */
function runChain(input: BuildingInput, stages: Map<string, number>): readonly WallOutcome[] {
  const checked = checkTables(input, { complete: true });
  const set = readCombinations(input);
  if (checked.problems.length > 0 || 'problems' in set) throw new Error('the bench building was refused');
  const steps = chain({ building: input, combinations: set.combinations, pinned: [] });
  let since = performance.now();
  let step = steps.next();
  while (step.done !== true) {
    stages.set(step.value, (stages.get(step.value) ?? 0) + performance.now() - since);
    since = performance.now();
    step = steps.next();
  }
  if (!step.value.ok) throw new Error(JSON.stringify(step.value.problems));
  return step.value.walls;
}

const median = (values: readonly number[]) =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
const peakMegabytes = () => process.resourceUsage().maxRSS / 1024;

function measure(run: () => void): { readonly milliseconds: number; readonly cpu: number } {
  const cpu = process.cpuUsage();
  const start = performance.now();
  run();
  const milliseconds = performance.now() - start;
  const { user, system } = process.cpuUsage(cpu);
  return { milliseconds, cpu: (user + system) / 1000 };
}

function bench(name: string, building: BuildingInput): void {
  const cold = measure(() => runChain(varied(building), new Map()));
  print(`${name} chain cold`, cold.milliseconds, 'ms');
  const stages = new Map<string, number>();
  let expansions = 0;
  const runs = Array.from({ length: 5 }, () =>
    measure(() => {
      const walls = runChain(varied(building), stages);
      expansions = walls[0]?.demand.forces[0]?.expansions.length ?? 0;
    }),
  );
  print(`${name} chain`, median(runs.map(({ milliseconds }) => milliseconds)), 'ms');
  print(`${name} chain CPU`, median(runs.map(({ cpu }) => cpu)), 'ms');
  for (const [stage, milliseconds] of stages) print(`${name} ${stage}`, milliseconds / runs.length, 'ms');
  print(`${name} expansions a wall and story`, expansions, 'count');
  print(`${name} chain peak memory`, peakMegabytes(), 'MB');

  let bytes = 0;
  const whole = Array.from({ length: 3 }, () => {
    bytes = 0;
    let writing = 0;
    const run = measure(() => {
      const outcome = runBuilding(varied(building), { now: () => performance.now() });
      if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems.slice(0, 3)));
      const start = performance.now();
      for (const piece of resultChunks(outcome.document)) bytes += piece.length;
      writing = performance.now() - start + (outcome.document.timing.write ?? 0);
    });
    return { ...run, writing };
  });
  print(`${name} writing`, median(whole.map(({ writing }) => writing)), 'ms');
  print(`${name} with writing`, median(whole.map(({ milliseconds }) => milliseconds)), 'ms');
  print(`${name} result.json`, bytes / 1e6, 'MB');
  print(`${name} peak memory with writing`, peakMegabytes(), 'MB');
}

const asked = process.argv[2];
if (asked === undefined) {
  for (const name of Object.keys(buildings)) {
    const child = spawnSync(process.execPath, [...process.execArgv, import.meta.filename, name], { stdio: 'inherit' });
    if (child.status !== 0) process.exitCode = 1;
  }
} else {
  const make = buildings[asked];
  if (!make) throw new Error(`no bench building ${asked}; one of ${Object.keys(buildings).join(', ')}`);
  bench(asked, make());
}
