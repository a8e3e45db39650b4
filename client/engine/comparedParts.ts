import type { ResultDocument } from '#shared/contracts/result';

import { canonicalText } from './canonicalText.ts';

export const comparedParts = ['distribution', 'lateral', 'checks', 'schedule'] as const;
export type ComparedPart = (typeof comparedParts)[number];

/** Parts of two results that differ in any bit. */
export function differingParts(here: ResultDocument, there: ResultDocument): readonly ComparedPart[] {
  return comparedParts.filter((part) => canonicalText(here[part]) !== canonicalText(there[part]));
}
