import type { ResultDocument, ResultLevel, Variant } from '#shared/contracts/result';
import type { Basis, WallRow } from '#shared/engineering/input';

import { bandAt } from '../../app/bandAt.ts';

export interface CollectorRow {
  readonly level: string;
  /** what each wall takes from the floor, in the order of the names; null where it stands neither above nor below */
  readonly taken: readonly (number | null)[];
  /** sum of what the walls take along the level's force, and the force itself; null where the level has none */
  readonly along: number | null;
  readonly force: number | null;
}

/**
 * What every wall takes from each floor: its shear in the story below less that in the story above. Negative: the floor takes from the
 * wall. The sum along the level's force is the force.
 */
export function collectorRows(
  document: Pick<ResultDocument, 'lateral' | 'levels'>,
  down: readonly ResultLevel[],
  names: readonly string[],
  rows: readonly WallRow[],
  choice: { readonly basis: Basis; readonly case: string; readonly variant: Variant },
): readonly CollectorRow[] {
  const shears = new Map(
    document.lateral
      .filter((one) => one.basis === choice.basis && one.case === choice.case && one.variant === choice.variant)
      .map((one) => [`${one.wall}\n${one.level}`, one.shear]),
  );
  return down.map((level, index) => {
    const above = down[index - 1]?.level;
    let [sumX, sumY] = [0, 0];
    const taken = names.map((wall) => {
      const below = shears.get(`${wall}\n${level.level}`);
      const over = above === undefined ? undefined : shears.get(`${wall}\n${above}`);
      if (below === undefined && over === undefined) return null;
      addAlong(bandAt(document.levels, rows, wall, level.level), below ?? 0);
      if (above !== undefined) addAlong(bandAt(document.levels, rows, wall, above), -(over ?? 0));
      return (below ?? 0) - (over ?? 0);
    });
    function addAlong(row: WallRow | undefined, shear: number): void {
      if (!row) return;
      const [dx, dy] = [row.x2 - row.x1, row.y2 - row.y1];
      const length = Math.sqrt(dx * dx + dy * dy) || 1;
      sumX += (shear * dx) / length;
      sumY += (shear * dy) / length;
    }
    const { fx = 0, fy = 0 } = level.force[choice.case] ?? {};
    const force = Math.sqrt(fx * fx + fy * fy);
    return force === 0
      ? { level: level.level, taken, along: null, force: null }
      : { level: level.level, taken, along: (sumX * fx + sumY * fy) / force, force };
  });
}
