import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

import { sayLength, sayPercent } from './sayAmount.ts';
import { spansBetweenLines } from './spansBetweenLines.ts';
import { heldStories, levelOf, sayRun, storyRuns } from './storyRuns.ts';

/** A story so much stiffer than the one above is taken for a podium (common practice, no source). */
const podiumJump = 3;
/** ASCE/SEI 7 Table 12.3-2, type 1a */
const softLimit = 0.7;
/** ASCE/SEI 7 12.3.1.2: floors of concrete up to here may be taken as rigid */
const spanDepthLimit = 3;

const directions = ['x', 'y'] as const;

/** `soft-story`, `podium` and `diaphragm-span` (engineering.md section 8), by the rigidities of the stories. */
export function storyWarnings({ model, stiffness }: Pick<Analysis, 'model' | 'stiffness'>): Warning[] {
  const { stories } = model;
  const lateral = (story: number, direction: 'x' | 'y'): number =>
    (direction === 'x' ? stiffness[story]?.kxx : stiffness[story]?.kyy) ?? 0;
  const warnings: Warning[] = [];
  for (let story = 0; story < stories.length - 1; story += 1) {
    const here = stories[story]?.level ?? '';
    const above = stories[story + 1]?.level ?? '';
    const ratios = directions.map((direction) => ({
      direction,
      ratio: lateral(story, direction) / lateral(story + 1, direction),
    }));
    const soft = ratios.filter(({ ratio }) => ratio < softLimit);
    if (soft.length > 0) {
      warnings.push({
        code: 'soft-story',
        level: here,
        message: `Stiffness of the story below ${here} is ${soft.map(({ direction, ratio }) => `${sayPercent(ratio)} in ${direction}`).join(' and ')} of that below ${above}, under 70 % (ASCE/SEI 7 Table 12.3-2): drift gathers in it. Check what the category asks of a soft story.`,
      });
    }
    const stiff = ratios.filter(({ ratio }) => ratio >= podiumJump);
    if (stiff.length > 0) {
      warnings.push({
        code: 'podium',
        level: here,
        message: `The story below ${here} is ${stiff.map(({ direction, ratio }) => `${ratio.toFixed(1)} times in ${direction}`).join(' and ')} as stiff as the one below ${above}: walls that go on upward hand their overturning back through the floor, and shear can reverse below it. Only the compatible basis sees that; the floor at ${here} carries it.`,
      });
    }
  }
  if (model.settings.basis.every((basis) => basis === 'flexible' || basis === 'envelope')) return warnings;
  const held = model.settings.basis.includes('flexible') ? null : true;
  for (const direction of directions) {
    const runs = storyRuns(stories.length, (story) => {
      const spans = spansBetweenLines(model, story, direction);
      const depth = (direction === 'x' ? stories[story]?.extentXIn : stories[story]?.extentYIn) ?? 0;
      const longest = spans.reduce((most, span) => Math.max(most, span), 0);
      return depth > 0 && longest / depth > spanDepthLimit ? { longest, depth } : null;
    });
    for (const run of runs) {
      const worst = run.facts.reduce((a, b) => (b.longest / b.depth > a.longest / a.depth ? b : a));
      const { units } = model.settings;
      warnings.push({
        code: 'diaphragm-span',
        level: levelOf(stories, run),
        message: `Under forces in ${direction} the floor at ${sayRun(stories, run)} spans ${sayLength(worst.longest, units)} between walls with a depth of ${sayLength(worst.depth, units)}, ${(worst.longest / worst.depth).toFixed(1)} to 1: beyond 3 it can't be taken as rigid without proof (ASCE/SEI 7 12.3.1.2), and walls in the middle take more than their rigidity says. Compare with the flexible basis.`,
        ...(held === null ? {} : { holds: { walls: null, ...heldStories(stories, run) } }),
      });
    }
  }
  return warnings;
}
