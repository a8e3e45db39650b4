import type { WallLine } from '../model/model.ts';

/** How far the centroid of the story above stands from this story's along the wall, in; 0 at the top and where it does not move. */
export function centroidShiftIn(wall: WallLine, story: number): number {
  const segment = wall.segments[story - wall.fromStory];
  const above = wall.segments[story + 1 - wall.fromStory];
  if (!segment || !above) return 0;
  return (
    (above.centroidXIn - segment.centroidXIn) * segment.cos + (above.centroidYIn - segment.centroidYIn) * segment.sin
  );
}
