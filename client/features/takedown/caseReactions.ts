import type { ResultDocument, Variant } from '#shared/contracts/result';
import type { Basis } from '#shared/engineering/input';

import type { Force } from './wallStories.ts';

export interface CaseReaction {
  readonly case: string;
  readonly variant: Variant;
  /** in the order of the bases; null where a basis does not list the variant */
  readonly forces: readonly (Force | null)[];
}

/** Shear and moment of one wall at one story by case, variant and basis. */
export function caseReactions(
  document: Pick<ResultDocument, 'lateral'>,
  wall: string,
  level: string,
  bases: readonly Basis[],
): readonly CaseReaction[] {
  const here = document.lateral.filter((one) => one.wall === wall && one.level === level);
  const rows = new Map<string, CaseReaction>();
  for (const one of here) {
    const key = `${one.case}\n${one.variant}`;
    if (rows.has(key)) continue;
    const same = here.filter((other) => other.case === one.case && other.variant === one.variant);
    const forces = bases.map((basis) => {
      const found = same.find((other) => other.basis === basis);
      return found ? { shear: found.shear, moment: found.moment } : null;
    });
    rows.set(key, { case: one.case, variant: one.variant, forces });
  }
  return [...rows.values()];
}
