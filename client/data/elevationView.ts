import type { LevelRow, WallRow } from '#shared/engineering/input';
import { baseElevation, levelOrder } from '#shared/engineering/model/check-tables/levelOrder';

/** A building as far as its elevation can be drawn: what is unknown is left out, nothing is refused. */
export interface ElevationView {
  /** from the top down; elevation of the level, height of the story below it */
  readonly stories: readonly { readonly level: string; readonly elevation: number; readonly height: number }[];
  readonly walls: readonly {
    readonly name: string;
    readonly x1: number;
    readonly y1: number;
    readonly x2: number;
    readonly y2: number;
    readonly fromElevation: number;
    readonly toElevation: number;
  }[];
  readonly base: number;
  readonly height: number;
}

export function elevationView(levels: readonly LevelRow[], walls: readonly WallRow[]): ElevationView {
  const base = baseElevation(levels);
  const stories: ElevationView['stories'][number][] = [];
  const feet = new Map<string, number>();
  const tops = new Map<string, number>();
  let elevation = base;
  for (const index of levelOrder(levels)) {
    const row = levels[index];
    if (row === undefined || feet.has(row.level)) continue;
    feet.set(row.level, elevation);
    elevation += row.height;
    tops.set(row.level, elevation);
    stories.unshift({ level: row.level, elevation, height: row.height });
  }
  const bands: ElevationView['walls'][number][] = [];
  for (const wall of walls) {
    const fromElevation = feet.get(wall.from_level);
    const toElevation = tops.get(wall.to_level);
    if (fromElevation === undefined || toElevation === undefined || toElevation <= fromElevation) continue;
    const { x1, y1, x2, y2 } = wall;
    bands.push({ name: wall.wall, x1, y1, x2, y2, fromElevation, toElevation });
  }
  return { stories, walls: bands, base, height: elevation - base };
}
