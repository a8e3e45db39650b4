import { applyShares } from './applyOverrides.mjs';
import { amplification, storyDrifts } from './solveDrifts.mjs';
import { makeFrame, solveFrame } from './solveFrame.mjs';
import { levelActions, solveStories, sumDown, takeDown, variantsOf } from './solveLateral.mjs';
import { solveLines } from './solveLines.mjs';

/**
 * Every chosen basis, case and variant: shares, what goes down the walls, and drifts from the whole height. `twist` is a
 * set of its own for every wind case where wind cases are asked for; it is combined, never listed.
 */
export function solveBases(building) {
  const { settings } = building;
  const frame = makeFrame(building);
  const bases = settings.basis.filter((basis) => basis !== 'envelope' && (basis !== 'compatible' || frame !== null));
  const sets = [];
  const drifts = [];
  for (const load of building.cases) {
    const ax = frame === null ? building.stories.map(() => 3) : axOf(building, frame, load);
    const twists = settings.windCases && load.kind === 'wind' ? ['twist'] : [];
    for (const variant of [...variantsOf(load, settings), ...twists]) {
      const levels = levelActions(building, load, variant, settings.amplify ? ax : null);
      const actions = sumDown(levels);
      const whole = frame === null ? null : solveFrame(frame, levels);
      for (const basis of bases) {
        if (basis === 'flexible' && variant !== '0') continue;
        const found =
          basis === 'rigid'
            ? solveStories(building, actions)
            : basis === 'flexible'
              ? solveLines(building, load)
              : whole.shares;
        const shares = applyShares(building, load, actions, found);
        const down = takeDown(building, variant === 'twist' ? null : load, shares);
        if (basis === 'compatible' && building.overrides.length === 0) agree(found, down.lateral);
        sets.push({ basis, load, variant, actions, shares, ...down });
      }
      if (variant === 'twist') continue;
      if (whole === null) drifts.push({ load, variant, rows: null });
      else {
        const plain = solveFrame(frame, levelActions(building, load, variant, null)).floors;
        drifts.push({ load, variant, rows: storyDrifts(building, load, variant, { floors: whole.floors, plain, ax }) });
      }
    }
  }
  return { sets, drifts, bases };
}

function axOf(building, frame, load) {
  if (load.kind !== 'seismic' || building.settings.accidental === 0) return null;
  const [plus, minus] = ['+', '-'].map((variant) => solveFrame(frame, levelActions(building, load, variant, null)));
  return amplification(building, load, plus, minus);
}

/** The end moments of the pieces against the sum of shear times height: two ways to the same moment. */
function agree(found, lateral) {
  const size = Math.max(...lateral.map(({ moment }) => Math.abs(moment)), 1e-9);
  const ends = new Map(found.map((piece) => [`${String(piece.story)} ${piece.wall}`, piece.moment]));
  for (const { story, wall, moment } of lateral) {
    const end = ends.get(`${String(story)} ${wall}`);
    if (!(Math.abs(end - moment) <= 1e-7 * size))
      throw new Error(`frame of ${wall}: ${String(end)}, ${String(moment)}`);
  }
}
