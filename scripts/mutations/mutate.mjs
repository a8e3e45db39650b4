import { spawn } from 'node:child_process';
import { cp, mkdir, mkdtemp, readFile, readdir, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import process from 'node:process';

import { mutationList } from './mutationList.mjs';

/**
 * Can the tests fail? Applies each change of the list to a copy of the tree in a temporary folder, runs the engine's tests there and
 * prints `killed` with the first test that failed, or `SURVIVED`. Exit 1 where one survived. The tree itself is never touched.
 *   node scripts/mutations/mutate.mjs [--copies 2] [--only TEXT] [--json FILE]
 * Quick test files run first; the whole set runs only where those pass.
 */
const root = resolve(import.meta.dirname, '../..');
const argument = (name) => {
  const at = process.argv.indexOf(name);
  return at < 0 ? null : process.argv[at + 1];
};
const folders = ['shared/engineering', 'shared/combination-text', 'shared/csv/unitConversion', 'shared/result'];
const slow = ['**/properties/**', '**/ownCells.property.test.ts', '**/designWall.test.ts'];

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

/** Runs Vitest in a copy; answers null where all passed, else the first failure. */
function runTests(copy, excluded) {
  const excludes = excluded.flatMap((pattern) => ['--exclude', pattern]);
  const vitest = join(root, 'node_modules/vitest/vitest.mjs');
  const values = ['run', '--project', 'node', '--bail', '1', '--reporter', 'json', ...excludes, ...folders];
  return new Promise((done) => {
    const run = spawn(process.execPath, [vitest, ...values], { cwd: copy });
    let output = '';
    run.stdout.on('data', (chunk) => (output += chunk));
    run.on('close', (status) => {
      if (status === 0) return done(null);
      try {
        const report = JSON.parse(output.slice(output.indexOf('{')));
        const file = report.testResults.find((result) => result.status === 'failed');
        const test = file?.assertionResults.find((result) => result.status === 'failed');
        return done(`${file?.name.slice(file.name.indexOf('shared/'))}: ${test?.fullName ?? 'does not load'}`);
      } catch {
        return done(`the run ended with ${String(status)}`);
      }
    });
  });
}

async function tryMutation(copy, [name, file, from, to]) {
  const path = join(copy, 'shared', file);
  const text = await readFile(path, 'utf8');
  const pieces = text.split(from);
  if (pieces.length !== 2) throw new Error(`${name}: "${from}" stands ${String(pieces.length - 1)} times in ${file}`);
  await writeFile(path, pieces.join(to));
  const killer = (await runTests(copy, slow)) ?? (await runTests(copy, []));
  await writeFile(path, text);
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
const list = mutationList.filter(([name]) => only === null || name.includes(only));
await checkList(list);
const queue = [...list];
const results = [];
const workers = Array.from({ length: Number(argument('--copies') ?? 2) }, async () => {
  const copy = await makeCopy();
  try {
    const before = await runTests(copy, slow);
    if (before !== null) throw new Error(`the tests fail without a change: ${before}`);
    for (let next = queue.shift(); next; next = queue.shift()) {
      const result = await tryMutation(copy, next);
      results.push(result);
      console.log(
        result.killer === null ? `SURVIVED  ${result.name}` : `killed    ${result.name}  <-  ${result.killer}`,
      );
    }
  } finally {
    await rm(copy, { recursive: true });
  }
});
await Promise.all(workers);
const json = argument('--json');
if (json) await writeFile(json, JSON.stringify(results, null, 1));
const survivors = results.filter(({ killer }) => killer === null);
console.log(`${String(results.length)} mutations, ${String(survivors.length)} survived`);
process.exitCode = survivors.length > 0 ? 1 : 0;
