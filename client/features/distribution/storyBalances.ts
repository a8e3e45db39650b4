import type { ResultBalance, ResultDocument } from '#shared/contracts/result';

import type { ResultChoice } from '../../components/drawing/resultChoice.ts';

/** The case in view at its story, then the vertical line of each gravity case that brings anything there. */
export function storyBalances(document: ResultDocument, chosen: ResultChoice): readonly ResultBalance[] {
  const here = document.balance.filter((one) => one.level === chosen.level.level && one.basis === chosen.basis);
  const lateral = here.filter((one) => one.case === chosen.case && one.variant === chosen.variant);
  const vertical = here.filter(
    (one) =>
      one.lines.every(({ line }) => line === 'vertical') &&
      one.lines.some((line) => line.applied !== 0 || line.resisted !== 0),
  );
  return [...lateral, ...vertical];
}
