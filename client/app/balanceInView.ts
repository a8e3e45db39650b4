import type { ResultBalance, ResultDocument } from '#shared/contracts/result';
import type { WallRow } from '#shared/engineering/input';

import { shareSums, type ShareSum } from './shareSums.ts';
import type { Choice } from './useChoice.ts';

/** Largest residual that still counts as closed. */
export const closedResidual = 1e-9;

export interface BalanceInView {
  readonly case: string;
  /** the worst of every level, basis and variant of the case */
  readonly worst: ResultBalance;
  /** base shear of the case as applied and resisted, in the direction with the larger force */
  readonly base: { readonly applied: number; readonly resisted: number } | null;
  readonly closed: boolean;
  /** shares that do not add up to what the balance says is resisted, the worst of them; null where all do */
  readonly lost: ShareSum | null;
}

/**
 * The balance of the case in the URL, or of the first case, with the shares added up once more against the walls in plan; null
 * where nothing was computed.
 */
export function balanceInView(
  document: Pick<ResultDocument, 'balance' | 'levels' | 'distribution'>,
  choice: Pick<Choice, 'case'>,
  walls: readonly WallRow[] = [],
): BalanceInView | null {
  const first = document.balance[0];
  if (first === undefined) return null;
  const wanted = document.balance.some((one) => one.case === choice.case) ? choice.case : first.case;
  const ofCase = document.balance.filter((one) => one.case === wanted);
  const worst = ofCase.reduce((a, b) => (Math.abs(b.residual) > Math.abs(a.residual) ? b : a));
  const lowest = document.levels.reduce<ResultDocument['levels'][number] | null>(
    (low, level) => (low === null || level.elevation < low.elevation ? level : low),
    null,
  );
  const atBase = ofCase.find((one) => one.level === lowest?.level && one.variant === '0') ?? null;
  const lines = (atBase?.lines ?? []).filter((line) => line.line === 'force x' || line.line === 'force y');
  const base = lines.reduce<BalanceInView['base']>(
    (large, line) => (large === null || Math.abs(line.applied) > Math.abs(large.applied) ? line : large),
    null,
  );
  const lost = shareSums(document, walls, worst.case).reduce<ShareSum | null>(
    (most, one) => (one.residual > Math.max(closedResidual, most?.residual ?? 0) ? one : most),
    null,
  );
  return { case: worst.case, worst, base, closed: Math.abs(worst.residual) <= closedResidual && lost === null, lost };
}
