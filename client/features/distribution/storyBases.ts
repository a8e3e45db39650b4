import type { ResultDocument, Variant } from '#shared/contracts/result';
import { basisOrder } from '#shared/drawing/basisStyles';
import type { Basis, WallRow } from '#shared/engineering/input';

import { variantUnder } from '../../components/drawing/resultChoice.ts';
import { storyShares } from './storyShares.ts';

export interface WallBases {
  readonly wall: string;
  /** wall shear by basis, in the order of `bases` */
  readonly values: readonly (number | null)[];
  /** largest less smallest */
  readonly spread: number;
}

export interface StoryBases {
  readonly bases: readonly Basis[];
  readonly walls: readonly WallBases[];
  /** along the story shear, in the order of `bases` */
  readonly sums: readonly number[];
  /** the story shear */
  readonly size: number;
  /** least and largest value of the story, zero among them */
  readonly least: number;
  readonly most: number;
  /** the wall whose bases lie farthest apart; null where they agree or there is one basis */
  readonly widest: WallBases | null;
}

export interface BasesChoice {
  readonly bases: readonly Basis[];
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
}

/** What every basis gives each wall of a story, with how far they lie apart. */
export function storyBases(document: ResultDocument, rows: readonly WallRow[], choice: BasesChoice): StoryBases {
  const bases = basisOrder.filter((basis) => choice.bases.includes(basis));
  const stories = bases.map((basis) =>
    storyShares(document, rows, {
      ...choice,
      basis,
      variant: variantUnder(document, basis, choice.case, choice.variant),
    }),
  );
  const names = [...new Set(stories.flatMap((story) => story.walls.map((one) => one.wall)))];
  const walls = names.map((wall): WallBases => {
    const values = stories.map((story) => story.walls.find((one) => one.wall === wall)?.total ?? null);
    return { wall, values, spread: spreadOf(values) };
  });
  const all = walls.flatMap((one) => one.values.map((value) => value ?? 0));
  const size = stories[0]?.size ?? 0;
  const widest = walls.reduce<WallBases | null>(
    (most, one) => (one.spread > Math.max(1e-9 * size, most?.spread ?? 0) ? one : most),
    null,
  );
  return {
    bases,
    walls,
    sums: stories.map((story) => story.sum),
    size,
    least: Math.min(0, ...all),
    most: Math.max(0, ...all),
    widest,
  };
}

export function spreadOf(values: readonly (number | null)[]): number {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? 0 : Math.max(...known) - Math.min(...known);
}
