import type { Warning } from '../input.ts';
import type { Analysis, WallOutcome } from '../stages.ts';
import { listed } from '../stages.ts';

import { sayLength, sayPercent } from './sayAmount.ts';
import { levelOf, sayRun, storyRuns } from './storyRuns.ts';

/** Limits of plausibility: common practice, no source (engineering.md section 8). */
const shareLimit = 0.4;
const centerLimit = 0.2;

/** `plausibility-share`, `plausibility-center`, `plausibility-governs`: what an engineer would look at twice in the analysis. */
export function plausibilityWarnings(analysis: Analysis, outcomes: readonly WallOutcome[]): Warning[] {
  return [...centerWarnings(analysis), ...shareWarnings(analysis), ...governingWarnings(analysis, outcomes)];
}

/** Center of rigidity against the level's own point. */
function centerWarnings({ model, stiffness }: Analysis): Warning[] {
  const { stories, settings } = model;
  return (['x', 'y'] as const).flatMap((axis) => {
    const runs = storyRuns(stories.length, (story) => {
      const level = stories[story];
      const center = stiffness[story];
      if (!level || !center) return null;
      const offIn = Math.abs(axis === 'x' ? center.centerXIn - level.xIn : center.centerYIn - level.yIn);
      const extentIn = axis === 'x' ? level.extentXIn : level.extentYIn;
      return extentIn > 0 && offIn > centerLimit * extentIn ? { offIn, part: offIn / extentIn } : null;
    });
    return runs.map((run): Warning => {
      const worst = run.facts.reduce((a, b) => (b.part > a.part ? b : a));
      return {
        code: 'plausibility-center',
        level: levelOf(stories, run),
        message: `The center of rigidity stands up to ${sayLength(worst.offIn, settings.units)}, ${sayPercent(worst.part)} of the extent, from the point of the force in ${axis} at ${sayRun(stories, run)}: above 20 % torsion decides the shares (common practice). Look at the plan again.`,
      };
    });
  });
}

/** One wall with more than 40 % of a story shear, in any basis: the largest over cases without eccentricity. */
function shareWarnings({ model, actions, bases }: Analysis): Warning[] {
  const { stories, walls } = model;
  const plane = stories.length * walls.length;
  return walls.flatMap((wall, wallIndex) => {
    const runs = storyRuns(stories.length, (story) => {
      const segment = wall.segments[story - wall.fromStory];
      if (!segment) return null;
      let most = 0;
      let name = '';
      actions.forEach((action, index) => {
        if (action.variant !== '0' || !listed(action, false)) return;
        const along = action.direction === 'x' ? segment.cos : segment.sin;
        const total = Math.abs((action.direction === 'x' ? action.storyFxKip : action.storyFyKip)[story] ?? 0);
        if (total === 0) return;
        for (const { shearKip } of bases) {
          const part = Math.abs((shearKip[index * plane + story * walls.length + wallIndex] ?? 0) * along) / total;
          if (part <= most) continue;
          most = part;
          name = action.case;
        }
      });
      return most > shareLimit ? { most, name } : null;
    });
    return runs.map((run): Warning => {
      const worst = run.facts.reduce((a, b) => (b.most > a.most ? b : a));
      return {
        code: 'plausibility-share',
        level: levelOf(stories, run),
        wall: wall.name,
        message: `${wall.name} takes up to ${sayPercent(worst.most)} of the story shear of ${worst.name} at ${sayRun(stories, run)}: above 40 % the building leans on one wall (common practice). Check redundancy, and the diaphragm that brings the force there.`,
      };
    });
  });
}

/** Squat walls are usually governed by shear, slender ones by flexure. */
function governingWarnings({ model }: Analysis, outcomes: readonly WallOutcome[]): Warning[] {
  return outcomes.flatMap(({ demand, design }): Warning[] => {
    const base = demand.stories[0];
    if (!base) return [];
    const aspect = demand.heightIn / base.lengthIn;
    const worst = (check: string): number =>
      design.checks.reduce(
        (most, one) => (one.check === check ? Math.max(most, one.ratio ?? Number.POSITIVE_INFINITY) : most),
        0,
      );
    const flexure = worst('flexure');
    const shear = worst('shear');
    const odd = aspect < 2 ? flexure > shear : shear > flexure;
    if (!odd || Math.max(flexure, shear) === 0) return [];
    return [
      {
        code: 'plausibility-governs',
        level: model.stories[base.story]?.level ?? '',
        wall: demand.wall,
        message: `${demand.wall}, hw/lw ${aspect.toFixed(1)}, is governed by ${aspect < 2 ? 'flexure' : 'shear'}; walls with hw/lw ${aspect < 2 ? 'below 2 mostly are by shear' : 'of 2 and more mostly are by flexure'} (common practice). Check forces and heights.`,
      },
    ];
  });
}
