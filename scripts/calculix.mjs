/**
 * Runs the decks of fixtures/published/calculix again where ccx is installed, and holds floor displacements and turns against the
 * recorded ones: node scripts/calculix.mjs [DECK]. Exit 1 where a deck differs by more than its printed digits.
 */
import { spawnSync } from 'node:child_process';
import { copyFileSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const folder = join(import.meta.dirname, '..', 'fixtures', 'published', 'calculix');
const recorded = JSON.parse(readFileSync(join(folder, 'results.json'), 'utf8')).decks;
// seven digits are recorded, and another build of the program may round the last two differently
const tolerance = 1e-5;
const say = (text) => process.stdout.write(`${text}\n`);

/** Values by step of one printed set: rows of node and components. */
function printedSet(text, name) {
  const steps = [];
  let rows = null;
  for (const line of text.split('\n')) {
    if (/for set /.test(line)) {
      rows = line.includes(`for set ${name} `) ? [] : null;
      if (rows !== null) steps.push(rows);
    } else if (rows !== null && line.trim() !== '') rows.push(line.trim().split(/\s+/).slice(1).map(Number));
  }
  return steps;
}

function compare(name, deck) {
  const work = mkdtempSync(join(tmpdir(), 'calculix-'));
  try {
    copyFileSync(join(folder, deck.deck ?? `${name}.inp`), join(work, `${name}.inp`));
    const run = spawnSync('ccx', [name], { cwd: work, encoding: 'utf8' });
    if (run.status !== 0) throw new Error(`ccx ended with ${String(run.status)}: ${run.stderr.slice(0, 500)}`);
    const text = readFileSync(join(work, `${name}.dat`), 'utf8');
    const [floors, turns] = ['FLOORS', 'SPIN'].map((set) => printedSet(text, set));
    if (floors.length !== deck.steps.length)
      throw new Error(`${String(floors.length)} steps printed, ${String(deck.steps.length)} recorded`);
    let worst = 0;
    let compared = 0;
    deck.steps.forEach((step, n) => {
      const values = Object.values(step.floors);
      const size = Math.max(...values.flatMap(({ ux, uy }) => [Math.abs(ux), Math.abs(uy)]));
      const turn = Math.max(...values.map(({ rotation }) => Math.abs(rotation)));
      values.forEach(({ ux, uy, rotation }, i) => {
        const [x, y] = floors[n][i];
        const differences = [(x - ux) / size, (y - uy) / size, turn === 0 ? 0 : (turns[n][i][0] - rotation) / turn];
        worst = Math.max(worst, ...differences.map(Math.abs));
        compared += 3;
      });
    });
    return { worst, compared };
  } finally {
    rmSync(work, { recursive: true });
  }
}

if (spawnSync('ccx', ['-v']).error) say('calculix: not run (ccx is not installed)');
else {
  for (const [name, deck] of Object.entries(recorded)) {
    if (process.argv[2] !== undefined && process.argv[2] !== name) continue;
    const { worst, compared } = compare(name, deck);
    const ok = worst <= tolerance;
    say(`${name}: ${String(compared)} values, largest deviation ${worst.toExponential(1)}${ok ? '' : ', differs'}`);
    if (!ok) process.exitCode = 1;
  }
}
