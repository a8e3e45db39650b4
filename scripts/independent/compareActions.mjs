import { Comparison } from './compareArrays.mjs';
import { ownUnits } from './siUnits.mjs';

/** Listed actions against the own expansion: every one must be among mine, and the extremes must be the same. */
export function compareActions(building, result, solution) {
  const comparison = new Comparison();
  const counts = new Map();
  for (const basis of solution.bases) compareBasis(comparison, building, result, solution, basis, counts);
  return { comparison, counts };
}

function compareBasis(comparison, building, result, solution, basis, counts) {
  const unit = ownUnits[building.system];
  const listed = new Map();
  for (const action of result.actions.filter((row) => row.basis === basis)) {
    const key = JSON.stringify([action.wall, building.index.get(action.level)]);
    if (!listed.has(key)) listed.set(key, []);
    listed.get(key).push(action);
  }
  for (const [key, forces] of solution.actions.get(basis)) {
    const own = forces.map(({ axial, moment, shear }) => [
      axial / unit.force,
      moment / unit.moment,
      shear / unit.force,
    ]);
    const theirs = listed.get(key) ?? [];
    const scales = [0, 1, 2].map((n) => Math.max(1e-9, ...own.map((values) => Math.abs(values[n]))));
    const free = new Set(own);
    for (const { combination, axial, moment, shear } of theirs) {
      const match = [...free].find((values) =>
        [axial, moment, shear].every((value, n) => Math.abs(value - values[n]) <= 1e-6 * scales[n]),
      );
      comparison.compared += 1;
      if (match === undefined)
        comparison.lines.push(
          `actions ${basis} ${key} ${combination}: [${[axial, moment, shear].join(', ')}] is not in the own expansion`,
        );
      else free.delete(match);
    }
    const extremes = [
      ['axial largest', ([a]) => a],
      ['axial smallest', ([a]) => -a],
      ['moment', ([, m]) => Math.abs(m)],
      ['shear', ([, , v]) => Math.abs(v)],
    ];
    for (const [name, pick] of extremes) {
      const mine = Math.max(...own.map(pick));
      const there = Math.max(...theirs.map(({ axial, moment, shear }) => pick([axial, moment, shear])));
      comparison.number(`actions ${basis} ${key} ${name}`, there, mine, Math.abs(mine));
    }
    if (!counts.has(basis)) counts.set(basis, { own: own.length, listed: theirs.length });
  }
}
