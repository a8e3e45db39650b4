import { expandCombinations } from './expandCombinations.mjs';
import { solveBases } from './solveBases.mjs';
import { solveGravity } from './solveGravity.mjs';
import { storyRigidity } from './solveLateral.mjs';

const key = (...parts) => JSON.stringify(parts);

/** Everything the check compares, in newtons and meters. */
export function solveBuilding(building) {
  building.rigidity = building.stories.map((_, i) => storyRigidity(building, i));
  const { sets, drifts, bases } = solveBases(building);
  const gravity = solveGravity(building);
  const actions = new Map(bases.map((basis) => [basis, expandActions(building, basis, sets, gravity)]));
  return { bases, sets, drifts, gravity, actions };
}

/** Axial, moment and shear of every wall and story under every expanded combination of one basis: a map of lists. */
function expandActions(building, basis, sets, gravity) {
  const actions = new Map();
  const gravityOf = new Map();
  for (const row of gravity) {
    const place = key(row.wall, row.story);
    gravityOf.set(place, { ...gravityOf.get(place), [row.case]: row });
    actions.set(place, []);
  }
  const lateralOf = new Map();
  for (const set of sets) {
    if (set.basis !== basis) continue;
    lateralOf.set(key(set.load.name, set.variant), new Map(set.lateral.map((row) => [key(row.wall, row.story), row])));
  }
  for (const { form, kept, parts } of expandCombinations(building, basis)) {
    for (const [place, cases] of gravityOf) {
      const sum = { axial: 0, moment: 0, shear: 0, form, parts };
      for (const [name, row] of Object.entries(cases)) {
        const factor = form[name] ?? 0;
        sum.axial += factor * row.axial + (name === 'L' ? (kept - factor) * row.kept.axial : 0);
        sum.moment += factor * row.moment + (name === 'L' ? (kept - factor) * row.kept.moment : 0);
      }
      for (const { load, variant, by } of parts) {
        const row = lateralOf.get(key(load.name, variant)).get(place);
        sum.axial += by * row.axial;
        sum.moment += by * row.moment;
        sum.shear += by * row.shear;
      }
      actions.get(place).push(sum);
    }
  }
  return actions;
}
