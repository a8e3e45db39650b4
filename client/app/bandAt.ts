import type { ResultLevel } from '#shared/contracts/result';
import type { WallRow } from '#shared/engineering/input';

type Levels = readonly Pick<ResultLevel, 'level' | 'elevation'>[];

const elevationOf = (levels: Levels, name: string): number | undefined =>
  levels.find((level) => level.level === name)?.elevation;

/** The row of a wall that stands in the story of a level. */
export function bandAt<Row extends WallRow>(
  levels: Levels,
  rows: readonly Row[],
  wall: string,
  level: string,
): Row | undefined {
  const at = elevationOf(levels, level);
  return rows.find((row) => {
    const [from, to] = [elevationOf(levels, row.from_level), elevationOf(levels, row.to_level)];
    if (row.wall !== wall || at === undefined || from === undefined || to === undefined) return false;
    return at >= from && at <= to;
  });
}
