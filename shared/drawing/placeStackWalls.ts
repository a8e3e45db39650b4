import type { WallRow } from '../engineering/input.ts';
import type { StoryHeight } from './heightScale.ts';
import type { StackWall } from './stackTypes.ts';

type PlanRow = Pick<WallRow, 'wall' | 'x1' | 'y1' | 'x2' | 'y2' | 'from_level' | 'to_level'>;

/** Wall rows between the elevations of their levels; a row whose levels are not there is left out. */
export function placeStackWalls(levels: readonly StoryHeight[], walls: readonly PlanRow[]): StackWall[] {
  const byName = new Map(levels.map((level) => [level.level, level]));
  return walls.flatMap((wall) => {
    const from = byName.get(wall.from_level);
    const to = byName.get(wall.to_level);
    if (!from || !to) return [];
    const { x1, y1, x2, y2 } = wall;
    return [
      { name: wall.wall, x1, y1, x2, y2, fromElevation: from.elevation - from.height, toElevation: to.elevation },
    ];
  });
}
