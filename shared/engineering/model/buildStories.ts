import type { LevelRow, Settings } from '../input.ts';
import { unitFactors } from '../units.ts';

import { baseElevation, levelOrder } from './check-tables/levelOrder.ts';
import type { Story, WallLine } from './model.ts';

/** A story before its plan size is known: heights and elevations in inches. */
export interface StoryHeight {
  readonly row: LevelRow;
  readonly heightIn: number;
  readonly elevationIn: number;
  readonly bottomElevationIn: number;
}

/**
 * Stories from the base up. The base stands at 0 unless elevations are given, then at the lowest elevation less its story.
 * Elevations are summed from heights, so that heights stay what was typed.
 */
export function buildStoryHeights(levels: readonly LevelRow[], settings: Settings): StoryHeight[] {
  const toIn = unitFactors[settings.units].planLength;
  const ordered = levelOrder(levels).map((index) => levels[index] as LevelRow);
  let bottom = baseElevation(levels) * toIn;
  return ordered.map((row) => {
    const heightIn = row.height * toIn;
    const story = { row, heightIn, bottomElevationIn: bottom, elevationIn: bottom + heightIn };
    bottom = story.elevationIn;
    return story;
  });
}

interface Range {
  readonly low: number;
  readonly high: number;
}

/** One axis of a level's plan: engineering.md section 1, "Extent". */
function planAxis(point: number | null, extent: number | null, edge: number | null, walls: Range) {
  const wallExtent = walls.high - walls.low;
  const wallMiddle = (walls.low + walls.high) / 2;
  if (extent === null) {
    return { point: point ?? wallMiddle, extent: wallExtent, edge: walls.low, assumed: true };
  }
  if (edge !== null) return { point: point ?? edge + extent / 2, extent, edge, assumed: false };
  const middle = point ?? wallMiddle;
  return { point: middle, extent, edge: middle - extent / 2, assumed: point === null };
}

function wallRange(walls: readonly WallLine[], story: number, axis: 'x' | 'y'): Range {
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const wall of walls) {
    const segment = wall.segments[story - wall.fromStory];
    if (!segment) continue;
    const ends = axis === 'x' ? [segment.x1In, segment.x2In] : [segment.y1In, segment.y2In];
    low = Math.min(low, ...ends);
    high = Math.max(high, ...ends);
  }
  return low <= high ? { low, high } : { low: 0, high: 0 };
}

/** Stories with the point of action and the extent of every level, in inches. */
export function buildStories(heights: readonly StoryHeight[], walls: readonly WallLine[], settings: Settings): Story[] {
  const toIn = unitFactors[settings.units].planLength;
  const inches = (value: number | null) => (value === null ? null : value * toIn);
  return heights.map(({ row, heightIn, elevationIn, bottomElevationIn }, story) => {
    const x = planAxis(inches(row.x), inches(row.extent_x), inches(row.edge_x), wallRange(walls, story, 'x'));
    const y = planAxis(inches(row.y), inches(row.extent_y), inches(row.edge_y), wallRange(walls, story, 'y'));
    return {
      level: row.level,
      heightIn,
      elevationIn,
      bottomElevationIn,
      xIn: x.point,
      yIn: y.point,
      extentXIn: x.extent,
      extentYIn: y.extent,
      edgeXIn: x.edge,
      edgeYIn: y.edge,
      gravityKip: row.gravity === null ? null : row.gravity * unitFactors[settings.units].force,
      extentAssumed: x.assumed || y.assumed,
    };
  });
}
