/**
 * Stands alone: reads the tables of a building and its result.json with own code and judges the result.
 * node scripts/independent/checkResult.mjs DIR result.json [--all-actions]. Exit 1 on any difference.
 */
import { readFileSync } from 'node:fs';

import { compareActions } from './compareActions.mjs';
import { compareResult } from './compareResult.mjs';
import { judgeEnvelope } from './judgeEnvelope.mjs';
import { residuals } from './equilibrium.mjs';
import { judgeSchedule } from './judgeSchedule.mjs';
import { judgeRows } from './judgeRows.mjs';
import { readBuilding } from './readBuilding.mjs';
import { ownUnits } from './siUnits.mjs';
import { solveBuilding } from './solveBuilding.mjs';

const residualLimit = 1e-9;
const shown = 40;
const [folder, file, option] = process.argv.slice(2);
if (folder === undefined || file === undefined) {
  process.stderr.write('usage: checkResult.mjs DIR result.json [--all-actions]\n');
  process.exit(2);
}

const result = JSON.parse(readFileSync(file, 'utf8'));
const building = readBuilding(folder);
const solution = solveBuilding(building);
const lines = [];
const say = (text) => process.stdout.write(`${text}\n`);

const balance = residuals(building, result, ownUnits[building.system], solution);
for (const line of ['force x', 'force y', 'torque', 'overturning x', 'overturning y', 'vertical']) {
  const rows = balance.filter((row) => row.line === line);
  const worst = rows.reduce((largest, row) => (row.value > largest.value ? row : largest), {
    value: 0,
    case: '',
    level: '',
  });
  say(`residual ${line.padEnd(14)} ${worst.value.toExponential(2)} over ${String(rows.length)} stories and cases`);
  for (const row of rows) {
    if (!(row.value < residualLimit))
      lines.push(
        `residual of ${line}, ${row.basis ?? ''} ${row.case} ${row.variant} ${row.level}: ${String(row.value)}`,
      );
  }
}
for (const row of result.balance) {
  if (!(row.residual < residualLimit))
    lines.push(`balance ${row.basis} ${row.case} ${row.variant} ${row.level}: states ${String(row.residual)}`);
}

const arrays = compareResult(building, result, solution);
say(`compared ${String(arrays.compared)} numbers, largest deviation ${arrays.largest.toExponential(2)}`);
lines.push(...arrays.lines);

const { comparison, counts } = compareActions(building, result, solution);
for (const [basis, { own, listed }] of counts) {
  say(`actions: ${String(own)} expansions a wall and story here in ${basis}`);
  if (option === '--all-actions' && own !== listed)
    lines.push(`actions ${basis}: ${String(listed)} a wall and story in the result, ${String(own)} here`);
}
say(`actions: ${String(comparison.compared)} numbers compared`);
lines.push(...comparison.lines);

const judged = judgeSchedule(building, result, solution);
say(
  `sections judged again: ${String(judged.sections)}, flexure within ${judged.worstFlexure.toExponential(2)}, shear within ${judged.worstShear.toExponential(2)}`,
);
lines.push(...judged.lines, ...judgeRows(building, result), ...judgeEnvelope(building, result, solution));

for (const line of lines.slice(0, shown)) say(`differs: ${line}`);
if (lines.length > shown) say(`and ${String(lines.length - shown)} more`);
say(lines.length === 0 ? 'no difference' : `${String(lines.length)} differences`);
process.exitCode = lines.length === 0 ? 0 : 1;
