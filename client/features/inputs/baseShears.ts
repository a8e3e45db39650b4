import type { ForceRow, LevelRow } from '#shared/engineering/input';
import { levelOrder } from '#shared/engineering/model/check-tables/levelOrder';

/** The base shear of a case under both readings of its rows, in the direction of the larger one. */
export interface BaseShear {
  readonly case: string;
  readonly kind: ForceRow['kind'];
  /** rows as forces at each level: their sum */
  readonly asLevelForces: number;
  /** rows as story shears: what stands at the lowest level; null where it has no row */
  readonly asStoryShears: number | null;
}

const larger = (x: number, y: number): number => (Math.abs(y) > Math.abs(x) ? y : x);

export function baseShears(levels: readonly LevelRow[], forces: readonly ForceRow[]): BaseShear[] {
  const lowest = levels[levelOrder(levels)[0] ?? -1]?.level;
  const sum = (rows: readonly ForceRow[]): number =>
    larger(
      rows.reduce((total, row) => total + row.fx, 0),
      rows.reduce((total, row) => total + row.fy, 0),
    );
  return [...new Set(forces.map((row) => row.case))].map((name) => {
    const rows = forces.filter((row) => row.case === name);
    const bottom = rows.filter((row) => row.level === lowest);
    return {
      case: name,
      kind: rows[0]?.kind ?? 'other',
      asLevelForces: sum(rows),
      asStoryShears: bottom.length === 0 ? null : sum(bottom),
    };
  });
}

/** How far a base shear is from the load sheet's, as a part of the latter; signs aside. */
export const differenceFrom = (found: number, expected: number): number =>
  expected === 0 ? (found === 0 ? 0 : 1) : (Math.abs(found) - Math.abs(expected)) / Math.abs(expected);
