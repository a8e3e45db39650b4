import type { Model } from '../model/model.ts';

/** sin(0.5 degree): walls closer than this to an axis are parallel to it. */
const parallelSine = 0.008726535498373935;

/** Clear distances between successive lines of walls parallel to `direction` in a story, in; empty with fewer than two lines. */
export function spansBetweenLines(model: Model, story: number, direction: 'x' | 'y'): number[] {
  const lines = model.walls
    .flatMap((wall) => {
      const segment = wall.segments[story - wall.fromStory];
      if (!segment) return [];
      const off = direction === 'x' ? segment.sin : segment.cos;
      if (Math.abs(off) > parallelSine) return [];
      return [direction === 'x' ? segment.centroidYIn : segment.centroidXIn];
    })
    .sort((a, b) => a - b);
  return lines.slice(1).map((at, index) => at - (lines[index] ?? at));
}
