import type { ResultAction, ResultDocument } from '#shared/contracts/result';

import { governing, type Governing } from './governing.ts';

export interface FoundationRow {
  readonly wall: string;
  readonly level: string;
  readonly atBase: boolean;
  readonly governing: readonly Governing[];
  /** smallest line load at an edge of the length, P/lw - 6|M|/lw2; negative: the edge lifts */
  readonly edge: { readonly value: number; readonly action: ResultAction } | null;
  /** some combination has |M|/P above lw/6, or no compression at all */
  readonly lifts: boolean;
}

/** Extremes at the foot of every wall over all listed combinations and bases, as a foundation designer asks for them. */
export function foundationRows(
  document: Pick<ResultDocument, 'actions'>,
  feet: readonly { readonly wall: string; readonly level: string; readonly length: number; readonly atBase: boolean }[],
): readonly FoundationRow[] {
  return feet.map(({ wall, level, length, atBase }) => {
    const here = document.actions.filter((one) => one.wall === wall && one.level === level);
    const edgeOf = ({ axial, moment }: ResultAction): number =>
      axial / length - (6 * Math.abs(moment)) / (length * length);
    const least = here.reduce<ResultAction | null>(
      (low, one) => (low === null || edgeOf(one) < edgeOf(low) ? one : low),
      null,
    );
    return {
      wall,
      level,
      atBase,
      governing: governing(document, wall, level, null),
      edge: least === null || length <= 0 ? null : { value: edgeOf(least), action: least },
      lifts: here.some(({ axial, moment }) => axial <= 0 || Math.abs(moment) / axial > length / 6),
    };
  });
}
