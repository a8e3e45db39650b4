import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';

import { checkNode, ensureBuild, ensureModules, root, run, timed } from './prepare.mjs';
import { withPostgres } from './postgres.mjs';
import { aptInstall } from './aptInstall.mjs';

/**
 * `npm test`: everything that CI runs, from a fresh clone. Installs what it needs, Chromium too; skips nothing quietly. Ends with
 * the line `N passed, N failed` over all runners.
 */
const results = join(root, 'test-results');
const bin = (name) => join(root, 'node_modules', '.bin', name);
const totals = { passed: 0, failed: 0 };
const notes = [];

function count(name, passed, failed) {
  totals.passed += passed;
  totals.failed += failed;
  console.log(`${name}: ${passed} passed, ${failed} failed`);
}

/** A step that is right or wrong as a whole counts as one test. */
async function step(name, command, args) {
  const { code } = await timed(name, () => run(command, args, { allowFailure: true }));
  count(name, code === 0 ? 1 : 0, code === 0 ? 0 : 1);
}

async function vitest(name, args, env = {}) {
  const file = join(results, `${name}.json`);
  const { code } = await timed(name, () =>
    run(bin('vitest'), ['run', '--reporter=dot', '--reporter=json', `--outputFile.json=${file}`, ...args], {
      env,
      allowFailure: true,
    }),
  );
  const report = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null;
  const passed = report?.numPassedTests ?? 0;
  const failed = report?.numFailedTests ?? 0;
  count(name, passed, code === 0 ? failed : Math.max(1, failed));
  return passed;
}

async function browser(chromium) {
  const file = join(results, 'browser.json');
  const { code } = await timed('browser', () =>
    run(bin('playwright'), ['test', '--config', 'e2e/playwright.config.ts'], {
      env: { CHROMIUM_PATH: chromium, PLAYWRIGHT_JSON_OUTPUT_FILE: file },
      allowFailure: true,
    }),
  );
  const stats = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')).stats : null;
  const failed = (stats?.unexpected ?? 0) + (stats?.flaky ?? 0) + (stats?.skipped ?? 0);
  count('browser', stats?.expected ?? 0, code === 0 ? failed : Math.max(1, failed));
  return stats?.expected ?? 0;
}

/** Chromium from Debian where none is found; without one the run fails. */
async function ensureChromium() {
  const wanted = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium';
  if (existsSync(wanted)) return wanted;
  await timed('install Chromium', () => aptInstall(['chromium']));
  const found = [wanted, '/usr/bin/chromium'].find((path) => existsSync(path));
  if (!found) {
    console.error(
      `No Chromium at ${wanted}, and it could not be installed. Install it (Debian: apt-get install chromium) or set CHROMIUM_PATH.`,
    );
    process.exit(1);
  }
  return found;
}

/** The number of tests of each layer may not fall below what was recorded. */
function checkFloor(counts) {
  const floor = JSON.parse(readFileSync(join(root, 'scripts', 'test-floor.json'), 'utf8'));
  const short = Object.entries(floor).filter(([layer, least]) => counts[layer] !== undefined && counts[layer] < least);
  for (const [layer, least] of short)
    console.error(`${layer}: ${counts[layer]} tests ran, at least ${least} are recorded in scripts/test-floor.json`);
  count('test counts', short.length === 0 ? 1 : 0, short.length === 0 ? 0 : 1);
}

checkNode();
await ensureModules();
rmSync(results, { recursive: true, force: true });
mkdirSync(results, { recursive: true });
const chromium = await ensureChromium();

await step('format', bin('prettier'), ['--check', '--log-level', 'warn', '.']);
await step('lint', bin('eslint'), ['--config', 'scripts/eslint.config.js', '--max-warnings', '0', '.']);
await step('import rules', bin('depcruise'), [
  '--config',
  'scripts/dependency-rules.cjs',
  'shared',
  'server',
  'client',
  'scripts',
  'e2e',
]);
await step('types', bin('tsc'), ['--noEmit']);
await step('documents', bin('tsx'), ['scripts/checkDocs.ts']);

const counts = {};
counts.unit = await vitest('unit', []);
await timed('PostgreSQL', async () => {
  const outcome = await withPostgres(async (url) => {
    counts.postgres = await vitest('postgres', ['--project', 'node', 'server'], { TEST_DATABASE_URL: url });
  });
  if (!outcome.ran) notes.push(`postgres: not run (${outcome.reason})`);
});
await ensureBuild();
counts.browser = await browser(chromium);
checkFloor(counts);

for (const note of notes) console.log(note);
console.log(`${totals.passed} passed, ${totals.failed} failed`);
process.exit(totals.failed === 0 ? 0 : 1);
