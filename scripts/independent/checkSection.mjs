/**
 * Stands alone: judges what `takedown --section` printed for one section file (ordinary wall, 318-19) with own strain
 * compatibility and shear. node scripts/independent/checkSection.mjs FILE.json OUTPUT.json. Exit 1 on any difference.
 */
import { readFileSync } from 'node:fs';

import { alphaC, atDepth, barArea, layBars, makeDepths, makeFlexurePoint, shearStrength } from './sectionStrength.mjs';
import { inch, ownUnits, psi } from './siUnits.mjs';

const [file, outputFile] = process.argv.slice(2);
if (file === undefined || outputFile === undefined) {
  process.stderr.write('usage: checkSection.mjs FILE.json OUTPUT.json\n');
  process.exit(2);
}
const given = JSON.parse(readFileSync(file, 'utf8'));
const output = JSON.parse(readFileSync(outputFile, 'utf8'));
const system = given.units;
const us = system === 'us';
const unit = ownUnits[system];
const small = us ? inch : 1e-3;
const tolerance = 0.001;
const lines = [];
let compared = 0;

const segment = {
  length: given.length * unit.length,
  thickness: given.thickness * small,
  fc: (given.fc ?? (us ? 5000 : 35)) * unit.strength,
};
const settings = {
  fy: (given.fy ?? (us ? 60 : 420)) * unit.steel,
  fyt: (given.fyt ?? (us ? 60 : 420)) * unit.steel,
  lambda: given.lambda ?? 1,
  edge: (given.edge ?? (us ? 3 : 75)) * small,
};
const wallHeight = (given.totalHeight ?? given.height) * unit.length;
const bars = given.layers
  ? given.layers.map(({ position, area }) => ({ at: position * small, area: area * small ** 2, end: false }))
  : layBars({ ends: given.ends ?? null, vertical: given.vertical }, segment, system, settings.edge).bars;
const section = { segment, bars, fy: settings.fy, compressed: { end: true, web: true } };
const pointOf = makeFlexurePoint(section);
const nominalOf = makeDepths(section, false);
const probable = { ...section, fy: 1.25 * settings.fy, gradeFy: settings.fy };
const probableOf = makeDepths(probable, false);

function compare(where, theirs, own) {
  compared += 1;
  if (own === null || theirs === null) {
    if (own !== theirs) lines.push(`${where}: ${String(theirs)} in the output, ${String(own)} here`);
    return;
  }
  if (!(Math.abs(theirs - own) <= tolerance * Math.max(Math.abs(theirs), Math.abs(own)))) {
    lines.push(`${where}: ${String(theirs)} in the output, ${String(own)} here`);
  }
}

const smallest = (points) => points.sort((a, b) => a.moment - b.moment)[0] ?? null;
given.actions.forEach((action, i) => {
  const axial = action.axial * unit.force;
  const theirs = output.flexure[i];
  const point = pointOf(axial);
  const where = `action ${String(i + 1)}`;
  compare(`${where} phiMn`, theirs.phiMn, point === null ? null : (point.phi * point.moment) / unit.moment);
  if (point !== null) {
    compare(`${where} phi`, theirs.phi, point.phi);
    compare(`${where} c`, theirs.c, point.c / small);
    compare(`${where} mn`, theirs.mn, point.moment / unit.moment);
    const nominal = smallest(nominalOf(axial));
    const strong = smallest(probableOf(axial));
    if (nominal !== null) compare(`${where} cNominal`, theirs.cNominal, nominal.c / small);
    if (nominal !== null) compare(`${where} mnNominal`, theirs.mnNominal, nominal.moment / unit.moment);
    if (strong !== null) compare(`${where} mpr`, theirs.mpr, strong.moment / unit.moment);
    const again = atDepth(section, point.c);
    compare(`${where} axial carried`, action.axial === 0 ? 0 : (again.phi * again.force) / unit.force, action.axial);
  }
  if (given.horizontal === undefined) return;
  const { curtains, bar, spacing } = given.horizontal;
  const ratio = (curtains * barArea(bar, system)) / (spacing * small * segment.thickness);
  const shear = shearStrength(segment, wallHeight, axial, ratio, settings) / unit.force;
  compare(`${where} phiVn`, output.shear[i].phiVn, shear);
  const root = Math.min(100, Math.sqrt(segment.fc / psi)) * psi;
  const concrete = alphaC(segment, wallHeight, axial) * settings.lambda * root * segment.length * segment.thickness;
  compare(`${where} vc`, output.shear[i].vc, concrete / unit.force);
});

for (const line of lines.slice(0, 40)) process.stdout.write(`differs: ${line}\n`);
process.stdout.write(
  `compared ${String(compared)} numbers, ${lines.length === 0 ? 'no difference' : `${String(lines.length)} differences`}\n`,
);
process.exitCode = lines.length === 0 ? 0 : 1;
