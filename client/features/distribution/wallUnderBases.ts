import type { ResultDocument, ResultLevel } from '#shared/contracts/result';

import { variantUnder } from '../../components/drawing/resultChoice.ts';
import { spreadOf, type BasesChoice } from './storyBases.ts';

export interface WallUnderBases {
  readonly level: string;
  /** share of the wall by basis; null where it does not stand */
  readonly values: readonly (number | null)[];
  readonly spread: number;
}

/** One wall over all stories from the top down, what each basis gives it of the case. */
export function wallUnderBases(
  document: ResultDocument,
  down: readonly ResultLevel[],
  wall: string,
  { bases, case: caseName, variant }: Omit<BasesChoice, 'level'>,
): readonly WallUnderBases[] {
  const columns = bases.map((basis) => {
    const own = variantUnder(document, basis, caseName, variant);
    return new Map(
      document.distribution
        .filter((one) => one.wall === wall && one.basis === basis && one.case === caseName && one.variant === own)
        .map((one) => [one.level, one.total]),
    );
  });
  return down.map(({ level }) => {
    const values = columns.map((column) => column.get(level) ?? null);
    return { level, values, spread: spreadOf(values) };
  });
}
