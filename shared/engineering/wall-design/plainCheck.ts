import type { ClauseKey } from '../codes/codeRules.ts';

import type { DesignContext } from './designContext.ts';
import type { Check, CheckQuantity } from './designTypes.ts';

/** A check of one section, before basis, level and wall are known. */
export interface PlainCheck extends Pick<
  Check,
  'check' | 'demand' | 'capacity' | 'quantity' | 'ratio' | 'clause' | 'ok'
> {
  /** index of the expansion that governs; null where none is to blame */
  readonly expansion: number | null;
}

/** Verdict of a ratio, with the tolerance that keeps a bar spaced exactly at its limit ok. */
export const passes = (ratio: number | null): boolean => ratio !== null && ratio <= 1 + 1e-9;

/** Demand over capacity: 0 where nothing is asked, null where something is asked and nothing resists. */
export function ratioOf(demand: number, capacity: number | null): number | null {
  if (capacity !== null && capacity > 0) return demand / capacity;
  return demand === 0 && capacity !== null ? 0 : null;
}

/** Makes a check from its demand and capacity. */
export function plainCheck(
  context: DesignContext,
  check: string,
  clause: ClauseKey,
  quantity: CheckQuantity,
  demand: number,
  capacity: number | null,
  expansion: number | null,
): PlainCheck {
  const ratio = ratioOf(demand, capacity);
  return {
    check,
    demand,
    capacity,
    quantity,
    ratio,
    clause: context.rules.clauses[clause],
    expansion,
    ok: passes(ratio),
  };
}

/** The worse of two checks: no ratio before any ratio, the larger before the smaller, ties to the first expansion in list order. */
export function worse(a: PlainCheck | null, b: PlainCheck): PlainCheck {
  if (!a) return b;
  const [left, right] = [a.ratio ?? Infinity, b.ratio ?? Infinity];
  if (right > left) return b;
  if (right < left) return a;
  return (b.expansion ?? Infinity) < (a.expansion ?? Infinity) ? b : a;
}
