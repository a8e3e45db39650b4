import type { Warning } from '../input.ts';
import type { Analysis, WallOutcome } from '../stages.ts';

import { sayStress } from './sayAmount.ts';
import { heldStories, levelOf, sayRun, storyRuns } from './storyRuns.ts';
import { wallExtremes } from './wallExtremes.ts';

/** Table 6.6.3.1.1(a): 0.35 cracked, 0.70 uncracked; the 0.5 of 6.6.3.1.2 is neither and contradicts nothing. */
const uncrackedFrom = 0.7;
const crackedTo = 0.35;

/**
 * `cracked-state`: tension M y/I - P/A under factored loads against the modulus of rupture 7.5 lambda sqrt(f'c) (19.2.3.1). A wall entered
 * as uncracked that cracks, story by story; a wall entered as cracked that cracks nowhere, once.
 */
export function crackedStateWarnings(
  { model }: Pick<Analysis, 'model'>,
  outcomes: readonly Pick<WallOutcome, 'demand'>[],
): Warning[] {
  const { stories, settings } = model;
  return model.walls.flatMap((wall, index): Warning[] => {
    const demand = outcomes[index]?.demand;
    const stated = wall.segments.some(
      ({ flexureFactor }) => flexureFactor >= uncrackedFrom || flexureFactor <= crackedTo,
    );
    if (!demand || !stated || demand.forces.every(({ expansions }) => expansions.length === 0)) return [];
    const found = wallExtremes(demand).map(({ tensionPsi }, place) => {
      const fcPsi = wall.segments[place]?.fcPsi ?? 0;
      const rupturePsi = 7.5 * settings.lambda * Math.sqrt(fcPsi);
      return { tensionPsi, rupturePsi, factor: wall.segments[place]?.flexureFactor ?? 0 };
    });
    const runs = storyRuns(stories.length, (story) => {
      const here = found[story - wall.fromStory];
      return here && here.factor >= uncrackedFrom && here.tensionPsi > here.rupturePsi ? here : null;
    });
    const warnings = runs.map((run): Warning => {
      const worst = run.facts.reduce((a, b) => (b.tensionPsi > a.tensionPsi ? b : a));
      return {
        code: 'cracked-state',
        level: levelOf(stories, run),
        wall: wall.name,
        message: `${wall.name} is entered as uncracked, flexure factor ${worst.factor}, but its tension M y/I - P/A reaches ${sayStress(worst.tensionPsi, settings.units)} at ${sayRun(stories, run)}, above 7.5 sqrt(f'c) = ${sayStress(worst.rupturePsi, settings.units)}: it cracks, gives way, and the other walls take more than is computed. Lower the factor to 0.35.`,
        holds: { walls: null, ...heldStories(stories, run) },
      };
    });
    const cracks = found.some(({ tensionPsi, rupturePsi }) => tensionPsi > rupturePsi);
    if (!cracks && found.every(({ factor }) => factor <= crackedTo)) {
      const most = found.reduce((a, b) => (b.tensionPsi / b.rupturePsi > a.tensionPsi / a.rupturePsi ? b : a));
      warnings.push({
        code: 'cracked-state',
        level: stories[wall.fromStory]?.level ?? '',
        wall: wall.name,
        message: `${wall.name} is entered as cracked, flexure factor ${most.factor}, but its tension M y/I - P/A stays at ${sayStress(Math.max(most.tensionPsi, 0), settings.units)} or less, below 7.5 sqrt(f'c) = ${sayStress(most.rupturePsi, settings.units)}: it does not crack and draws more shear than is computed. Raise the factor to 0.70.`,
        holds: { walls: [wall.name], ...heldStories(stories, { from: wall.fromStory, to: wall.toStory }) },
      });
    }
    return warnings;
  });
}
