import type { Model } from '../model/model.ts';

import type { LateralAction } from './lateralActions.ts';

/**
 * Puts an engineer's shares into the wall shears of a basis, in place: V = share x the story shear along the wall's own direction; what
 * that adds or takes is handed to the other walls of the story by rigidity, force and torque. Where the others can't take the torque
 * (one line, or all through one point) they take the force alone and the torque stays open in the balance.
 */
export function applyShares(
  model: Model,
  rigidities: Float64Array,
  actions: readonly LateralAction[],
  shearKip: Float64Array,
): void {
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  for (const override of model.overrides) {
    if (override.kind !== 'share') continue;
    const segment = segmentOf(model, override.wallIndex, override.story);
    if (!segment) continue;
    actions.forEach((action, index) => {
      if (override.caseName !== null && override.caseName !== action.case) return;
      const at = index * plane + override.story * walls + override.wallIndex;
      const along =
        (action.storyFxKip[override.story] ?? 0) * segment.cos + (action.storyFyKip[override.story] ?? 0) * segment.sin;
      const change = override.share * along - (shearKip[at] ?? 0);
      shearKip[at] = override.share * along;
      const arm = segment.centroidXIn * segment.sin - segment.centroidYIn * segment.cos;
      const given = sharedAmongOthers(model, rigidities, override.story, override.wallIndex, [
        -change * segment.cos,
        -change * segment.sin,
        -change * arm,
      ]);
      for (const [wallIndex, kip] of given) {
        const other = index * plane + override.story * walls + wallIndex;
        shearKip[other] = (shearKip[other] ?? 0) + kip;
      }
    });
  }
}

function segmentOf(model: Model, wallIndex: number, story: number) {
  const wall = model.walls[wallIndex];
  return wall?.segments[story - wall.fromStory];
}

function sharedAmongOthers(
  model: Model,
  rigidities: Float64Array,
  story: number,
  except: number,
  action: readonly [number, number, number],
): Map<number, number> {
  const others = model.walls.flatMap((_, index) => {
    const segment = segmentOf(model, index, story);
    if (!segment || index === except) return [];
    const b = segment.centroidXIn * segment.sin - segment.centroidYIn * segment.cos;
    return [
      { index, k: rigidities[story * model.walls.length + index] ?? 0, b: [segment.cos, segment.sin, b] as const },
    ];
  });
  const solve = (size: 2 | 3): number[] | null => {
    const matrix = Array.from({ length: size }, (_, row) =>
      Array.from({ length: size }, (__, column) =>
        others.reduce((sum, wall) => sum + wall.k * (wall.b[row] ?? 0) * (wall.b[column] ?? 0), 0),
      ),
    );
    return solveSmall(matrix, action.slice(0, size));
  };
  const motion = solve(3) ?? solve(2);
  return new Map(
    others.map(({ index, k, b }) => [
      index,
      motion === null ? 0 : k * motion.reduce((sum, value, part) => sum + value * (b[part] ?? 0), 0),
    ]),
  );
}

/** Gauss elimination on a matrix scaled by its diagonal; null where it is singular. */
function solveSmall(matrix: readonly number[][], right: readonly number[]): number[] | null {
  const size = right.length;
  const scale = matrix.map((row, index) => 1 / Math.sqrt(row[index] ?? 0));
  if (scale.some((value) => !Number.isFinite(value))) return null;
  const a = matrix.map((row, i) => row.map((value, j) => value * (scale[i] ?? 0) * (scale[j] ?? 0)));
  const x = right.map((value, index) => value * (scale[index] ?? 0));
  for (let pivot = 0; pivot < size; pivot += 1) {
    const diagonal = a[pivot]?.[pivot] ?? 0;
    if (Math.abs(diagonal) < 1e-9) return null;
    for (let row = 0; row < size; row += 1) {
      if (row === pivot) continue;
      const factor = (a[row]?.[pivot] ?? 0) / diagonal;
      for (let column = pivot; column < size; column += 1) {
        const line = a[row];
        if (line) line[column] = (line[column] ?? 0) - factor * (a[pivot]?.[column] ?? 0);
      }
      x[row] = (x[row] ?? 0) - factor * (x[pivot] ?? 0);
    }
  }
  return x.map((value, index) => (value / (a[index]?.[index] ?? 1)) * (scale[index] ?? 0));
}
