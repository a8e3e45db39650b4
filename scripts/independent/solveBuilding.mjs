import { expandCombinations } from './expandCombinations.mjs';
import { solveGravity } from './solveGravity.mjs';
import { solveLateral, storyRigidity, variantsOf } from './solveLateral.mjs';

/** Everything the check compares, in newtons and meters. */
export function solveBuilding(building) {
  building.rigidity = building.stories.map((_, i) => storyRigidity(building, i));
  const lateral = building.cases.flatMap((load) =>
    variantsOf(load, building.settings).map((variant) => ({ load, variant, ...solveLateral(building, load, variant) })),
  );
  const gravity = solveGravity(building);
  return { lateral, gravity, actions: expandActions(building, lateral, gravity) };
}

/** Axial, moment and shear of every wall and story under every expanded combination: a map of lists. */
function expandActions(building, lateral, gravity) {
  const key = (wall, story) => JSON.stringify([wall, story]);
  const actions = new Map();
  const gravityOf = new Map();
  for (const row of gravity) {
    const place = key(row.wall, row.story);
    gravityOf.set(place, { ...gravityOf.get(place), [row.case]: row });
    actions.set(place, []);
  }
  const sets = new Map();
  for (const set of lateral) {
    const places = new Map(set.lateral.map((row) => [key(row.wall, row.story), row]));
    sets.set(JSON.stringify([set.load.name, set.variant]), places);
  }
  for (const { form, parts } of expandCombinations(building)) {
    for (const [place, cases] of gravityOf) {
      let axial = 0;
      let moment = 0;
      let shear = 0;
      for (const [name, row] of Object.entries(cases)) {
        axial += (form[name] ?? 0) * row.axial;
        moment += (form[name] ?? 0) * row.moment;
      }
      for (const { load, variant, by } of parts) {
        const row = sets.get(JSON.stringify([load.name, variant])).get(place);
        moment += by * row.moment;
        shear += by * row.shear;
      }
      actions.get(place).push({ axial, moment, shear, form, parts });
    }
  }
  return actions;
}
