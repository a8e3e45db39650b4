import { cp, mkdir, mkdtemp, readFile, readdir, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import process from 'node:process';
import { createVitest } from 'vitest/node';

import { mutationList } from './mutationList.mjs';

/**
 * Can the tests fail? Applies each change of the list to a copy of the tree in a temporary folder, runs the engine's tests there and
 * prints `killed` with the first test that failed, or `SURVIVED`. Exit 1 where one survived. The tree itself is never touched.
 *   node scripts/mutations/mutate.mjs [--copies 2] [--only TEXT|TEXT] [--from N] [--json FILE]
 * Quick test files run first; the whole set runs only where those pass.
 */
const root = resolve(import.meta.dirname, '../..');
const argument = (name) => {
  const at = process.argv.indexOf(name);
  return at < 0 ? null : process.argv[at + 1];
};
const folders = ['shared/engineering', 'shared/combination-text', 'shared/csv/unitConversion', 'shared/result'];
const slow = ['/properties/', 'ownCells.property.test', 'designWall.test'];

async function makeCopy() {
  const copy = await mkdtemp(join(tmpdir(), 'groundward-mutation-'));
  for (const name of ['shared', 'fixtures', 'scripts', 'package.json', 'tsconfig.json', 'vite.config.ts']) {
    await cp(join(root, name), join(copy, name), { recursive: true });
  }
  await mkdir(join(copy, 'node_modules'));
  for (const name of await readdir(join(root, 'node_modules'))) {
    if (name.startsWith('.vite')) continue;
    await symlink(join(root, 'node_modules', name), join(copy, 'node_modules', name));
  }
  return copy;
}

/** A Vitest of a copy that stays up between changes; `run` answers null where all passed, else the first failure. */
async function startTests(copy) {
  const vitest = await createVitest('test', {
    root: copy,
    config: join(copy, 'vite.config.ts'),
    project: ['node'],
    watch: false,
    pool: 'threads',
    isolate: false,
    maxWorkers: 1,
    bail: 1,
    reporters: [{}],
  });
  const all = await vitest.globTestSpecifications(folders);
  const isSlow = ({ moduleId }) => slow.some((part) => moduleId.includes(part));
  const quick = all.filter((specification) => !isSlow(specification));
  const failureOf = async (specifications) => {
    const { testModules } = await vitest.runTestSpecifications(specifications);
    if (testModules.length === 0) return 'no test ran';
    // the report holds every module ever run: only those of this run speak
    const asked = new Set(specifications.map(({ moduleId }) => moduleId));
    for (const module of testModules.filter(({ moduleId }) => asked.has(moduleId))) {
      const place = module.moduleId.slice(copy.length + 1);
      if (module.errors().length > 0) return `${place}: ${module.errors()[0].message}`;
      for (const test of module.children.allTests('failed')) return `${place}: ${test.fullName}`;
    }
    return null;
  };
  return {
    forget: (path) => vitest.invalidateFile(path),
    run: async () => (await failureOf(quick)) ?? (await failureOf(all.filter(isSlow))),
    end: () => vitest.close(),
  };
}

async function tryMutation(copy, tests, [name, file, from, to]) {
  const path = join(copy, 'shared', file);
  const text = await readFile(path, 'utf8');
  const pieces = text.split(from);
  if (pieces.length !== 2) throw new Error(`${name}: "${from}" stands ${String(pieces.length - 1)} times in ${file}`);
  await writeFile(path, pieces.join(to));
  tests.forget(path);
  const killer = await tests.run();
  await writeFile(path, text);
  tests.forget(path);
  return { name, file, from, to, killer };
}

/** Every text of the list must stand once before anything runs. */
async function checkList(list) {
  const faults = [];
  for (const [name, file, from] of list) {
    const count = (await readFile(join(root, 'shared', file), 'utf8')).split(from).length - 1;
    if (count !== 1) faults.push(`${name}: "${from}" stands ${String(count)} times in ${file}`);
  }
  if (faults.length > 0) throw new Error(faults.join('\n'));
}

const only = argument('--only');
const list = mutationList.filter(
  ([name], n) =>
    (only === null || only.split('|').some((part) => name.includes(part))) && n >= Number(argument('--from') ?? 0),
);
await checkList(list);
const queue = [...list];
const results = [];
const workers = Array.from({ length: Number(argument('--copies') ?? 2) }, async () => {
  const copy = await makeCopy();
  const tests = await startTests(copy);
  try {
    const before = await tests.run();
    if (before !== null) throw new Error(`the tests fail without a change: ${before}`);
    for (let next = queue.shift(); next; next = queue.shift()) {
      const result = await tryMutation(copy, tests, next);
      results.push(result);
      console.log(
        result.killer === null ? `SURVIVED  ${result.name}` : `killed    ${result.name}  <-  ${result.killer}`,
      );
    }
  } finally {
    await tests.end();
    await rm(copy, { recursive: true });
  }
});
await Promise.all(workers);
const json = argument('--json');
if (json) await writeFile(json, JSON.stringify(results, null, 1));
const survivors = results.filter(({ killer }) => killer === null);
console.log(`${String(results.length)} mutations, ${String(survivors.length)} survived`);
process.exitCode = survivors.length > 0 ? 1 : 0;
