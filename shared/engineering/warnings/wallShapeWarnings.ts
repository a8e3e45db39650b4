import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';
import { centroidShiftIn } from '../takedown/centroidShift.ts';

import { sayLength } from './sayAmount.ts';
import { heldStories, levelOf, sayRun, storyRuns } from './storyRuns.ts';

/** 1/16 in: below it a centroid has not moved */
const drawnIn = 1 / 16;

/**
 * What a wall's own shape says (engineering.md section 8): `opening-solid`, `wall-pier`, `wall-stops-below-roof`, `offset`,
 * `transfer-not-assigned` and `transfer-assigned` for walls that start above the base.
 */
export function wallShapeWarnings({ model, transfers }: Pick<Analysis, 'model' | 'transfers'>): Warning[] {
  return [...transferWarnings(model, transfers), ...model.walls.flatMap((wall) => shapeWarnings(model, wall))];
}

function transferWarnings(model: Analysis['model'], transfers: Analysis['transfers']): Warning[] {
  return transfers.map(({ wallIndex, level, fromStory }): Warning => {
    const wall = model.walls[wallIndex]?.name ?? '';
    const rows = model.overrides.filter(({ kind, story }) => kind === 'transfer' && story === fromStory - 1).length;
    if (rows > 0) {
      return {
        code: 'transfer-assigned',
        level,
        wall,
        message: `${wall} starts above the base and arrives on ${level}, where ${rows === 1 ? 'a transfer is' : `${rows} transfers are`} assigned. Compare what they hand over, gravity cases included, with what is listed as transferred.`,
      };
    }
    return {
      code: 'transfer-not-assigned',
      level,
      wall,
      message: `${wall} starts above the base and arrives on ${level}: what it brings down is listed as transferred and added to no wall below. Assign it in the overrides with a reason.`,
      holds: { walls: null, from: model.stories[0]?.level ?? level, to: level },
    };
  });
}

function shapeWarnings(model: Analysis['model'], wall: Analysis['model']['walls'][number]): Warning[] {
  const { stories, settings } = model;
  const warnings: Warning[] = [];
  const segment = (story: number) => wall.segments[story - wall.fromStory];
  if (wall.toStory < stories.length - 1) {
    const top = stories[wall.toStory]?.level ?? '';
    warnings.push({
      code: 'wall-stops-below-roof',
      level: top,
      wall: wall.name,
      message: `${wall.name} stops at ${top}: where a wall ends, story-by-story shares can hide a reversal of shear in the walls that go on.`,
    });
  }
  const open = storyRuns(stories.length, (story) => ((segment(story)?.opening ?? 0) > 0 ? story : null));
  for (const run of open) {
    const most = run.facts.reduce((largest, story) => Math.max(largest, segment(story)?.opening ?? 0), 0);
    warnings.push({
      code: 'opening-solid',
      level: levelOf(stories, run),
      wall: wall.name,
      message: `${wall.name} has openings of up to ${(100 * most).toFixed(0)} % of its face at ${sayRun(stories, run)}: its self-weight is net of them, its stiffness and strength are those of the solid wall. Piers and the beams between them need a design of their own.`,
      holds: { walls: [wall.name], ...heldStories(stories, run) },
    });
  }
  const piers = storyRuns(stories.length, (story) => {
    const here = segment(story);
    const clear = (stories[story]?.heightIn ?? 0) - settings.slabThicknessIn;
    return here && here.lengthIn <= 6 * here.thicknessIn && clear >= 2 * here.lengthIn ? here : null;
  });
  for (const run of piers) {
    const shortest = run.facts.reduce((least, one) => Math.min(least, one.lengthIn / one.thicknessIn), 6);
    warnings.push({
      code: 'wall-pier',
      level: levelOf(stories, run),
      wall: wall.name,
      message: `${wall.name} is a wall pier at ${sayRun(stories, run)}: its length is ${shortest.toFixed(1)} times its thickness and its clear height at least twice its length (ACI 318 18.10.8). It is designed as a wall; piers of special walls need the ties and the shear of columns.`,
      holds: { walls: [wall.name], ...heldStories(stories, run) },
    });
  }
  for (let story = wall.fromStory; story < wall.toStory; story += 1) {
    const shift = centroidShiftIn(wall, story);
    if (Math.abs(shift) <= drawnIn) continue;
    warnings.push({
      code: 'offset',
      level: stories[story]?.level ?? '',
      wall: wall.name,
      message: `The centroid of ${wall.name} above ${stories[story]?.level} stands ${sayLength(Math.abs(shift), settings.units)} toward its ${shift > 0 ? 'second' : 'first'} end from the one below: the moment there gains the axial load from above times that distance, and the floor has to carry the couple.`,
    });
  }
  return warnings;
}
