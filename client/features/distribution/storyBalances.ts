import type { ResultBalance, ResultDocument } from '#shared/contracts/result';
import { basisOrder } from '#shared/drawing/basisStyles';
import type { Basis } from '#shared/engineering/input';

import { variantUnder, type ResultChoice } from '../../components/drawing/resultChoice.ts';

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

export interface BasisResidual {
  readonly basis: Basis;
  readonly residual: number;
}

/** The residual of the case at its story under every basis, gravity cases with it. */
export function basisResiduals(document: ResultDocument, chosen: ResultChoice): readonly BasisResidual[] {
  return basisOrder
    .filter((basis) => chosen.bases.includes(basis))
    .map((basis) => {
      const variant = variantUnder(document, basis, chosen.case, chosen.variant);
      const balances = storyBalances(document, { ...chosen, basis, variant });
      return { basis, residual: balances.reduce((worst, one) => Math.max(worst, Math.abs(one.residual)), 0) };
    });
}
