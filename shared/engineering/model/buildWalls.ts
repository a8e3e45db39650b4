import type { Settings, WallRow } from '../input.ts';
import { unitFactors } from '../units.ts';

import type { StoryHeight } from './buildStories.ts';
import type { WallLine, WallSegment } from './model.ts';

/**
 * Wall lines in the order in which their names first appear, each with one segment a story. Assumes tables that passed
 * `checkTables`: levels exist, bands follow each other without gap or overlap.
 */
export function buildWalls(rows: readonly WallRow[], stories: readonly StoryHeight[], settings: Settings): WallLine[] {
  const factors = unitFactors[settings.units];
  const storyOf = new Map(stories.map((story, index) => [story.row.level, index]));
  const byName = new Map<string, WallSegment[]>();
  for (const row of rows) {
    const segments = byName.get(row.wall) ?? [];
    byName.set(row.wall, segments);
    const from = storyOf.get(row.from_level) ?? 0;
    const to = storyOf.get(row.to_level) ?? -1;
    for (let story = from; story <= to; story += 1) segments.push(segmentOf(row, story, factors, settings));
  }
  return [...byName].map(([name, unordered]) => {
    const segments = [...unordered].sort((a, b) => a.story - b.story);
    const fromStory = segments[0]?.story ?? 0;
    const toStory = fromStory + segments.length - 1;
    const heightIn = segments.reduce((sum, segment) => sum + (stories[segment.story]?.heightIn ?? 0), 0);
    return { name, fromStory, toStory, segments, heightIn };
  });
}

function segmentOf(row: WallRow, story: number, factors: (typeof unitFactors)['us'], settings: Settings): WallSegment {
  const x1In = row.x1 * factors.planLength;
  const y1In = row.y1 * factors.planLength;
  const x2In = row.x2 * factors.planLength;
  const y2In = row.y2 * factors.planLength;
  const dx = x2In - x1In;
  const dy = y2In - y1In;
  const lengthIn = Math.sqrt(dx * dx + dy * dy);
  return {
    story,
    x1In,
    y1In,
    x2In,
    y2In,
    cos: dx / lengthIn,
    sin: dy / lengthIn,
    lengthIn,
    thicknessIn: row.thickness * factors.barLength,
    fcPsi: (row.fc ?? settings.fc) * factors.concreteStrength,
    opening: row.opening ?? 0,
    flexureFactor: row.flexure_factor ?? settings.stiffness.flexure,
    shearFactor: row.shear_factor ?? settings.stiffness.shear,
    shares: row.share_x === null && row.share_y === null ? null : { x: row.share_x ?? 0, y: row.share_y ?? 0 },
    centroidXIn: (x1In + x2In) / 2,
    centroidYIn: (y1In + y2In) / 2,
  };
}
