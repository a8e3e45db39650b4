import type { ResultDocument, Variant } from '#shared/contracts/result';
import type { Basis, WallRow } from '#shared/engineering/input';

import { bandAt } from '../../app/bandAt.ts';

export interface StoryChoice {
  readonly basis: Basis;
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
}

/** One wall of the story; forces along (x1, y1) to (x2, y2) in the building's units. */
export interface WallShare {
  readonly wall: string;
  readonly geometry: WallRow;
  readonly rigidity: number;
  /** of the sum of the story's rigidities */
  readonly rigidityShare: number;
  /** the basis tells direct and torsional part apart; without, the total stands as direct */
  readonly parted: boolean;
  readonly direct: number;
  readonly torsional: number;
  readonly total: number;
  /** of the story shear, by magnitude; null where the story has none */
  readonly share: number | null;
}

export interface StoryShares {
  readonly walls: readonly WallShare[];
  readonly vx: number;
  readonly vy: number;
  readonly size: number;
  /** sum of the walls' forces along the story shear, for the foot of the table */
  readonly sum: number;
}

/** What each wall of a story takes of a case, in the order of the result. */
export function storyShares(document: ResultDocument, rows: readonly WallRow[], choice: StoryChoice): StoryShares {
  const level = document.levels.find((one) => one.level === choice.level);
  const { vx = 0, vy = 0 } = level?.shear[choice.case] ?? {};
  const size = Math.sqrt(vx * vx + vy * vy);
  const rigidities = new Map(
    document.rigidities.filter((one) => one.level === choice.level).map((one) => [one.wall, one.k]),
  );
  const rigiditySum = [...rigidities.values()].reduce((sum, k) => sum + k, 0);
  let along = 0;
  const walls = document.distribution.flatMap((one): WallShare[] => {
    if (one.level !== choice.level || one.case !== choice.case) return [];
    if (one.variant !== choice.variant || one.basis !== choice.basis) return [];
    const geometry = bandAt(document.levels, rows, one.wall, one.level);
    if (!geometry) return [];
    const [dx, dy] = [geometry.x2 - geometry.x1, geometry.y2 - geometry.y1];
    const length = Math.sqrt(dx * dx + dy * dy) || 1;
    if (size > 0) along += (one.total * (dx * vx + dy * vy)) / length / size;
    const rigidity = rigidities.get(one.wall) ?? 0;
    return [
      {
        wall: one.wall,
        geometry,
        rigidity,
        rigidityShare: rigiditySum > 0 ? rigidity / rigiditySum : 0,
        parted: one.direct !== undefined && one.torsional !== undefined,
        direct: one.direct ?? one.total,
        torsional: one.torsional ?? 0,
        total: one.total,
        share: size > 0 ? Math.abs(one.total) / size : null,
      },
    ];
  });
  return { walls, vx, vy, size, sum: along };
}
