import type { ScheduleCells } from '../wall-design/designTypes.ts';

/** 2 % of score for each bar size that a wall does not have yet (engineering.md section 7). */
export const extraSizeShare = 0.02;

/** Mass with 2 % for every size that is new to the wall; the wall's first size is no extra. */
export function score(massLb: number, sizes: readonly number[], used: ReadonlySet<number>): number {
  let fresh = used.size === 0 ? -1 : 0;
  sizes.forEach((size, index) => {
    if (!used.has(size) && sizes.indexOf(size) === index) fresh += 1;
  });
  return massLb * (1 + extraSizeShare * Math.max(0, fresh));
}

/** The cells of the band above that nothing below may undercut. */
export type CellsAbove = Pick<ScheduleCells, 'vertical' | 'horizontal' | 'ends'>;

/** Candidates from the lightest to the heaviest, of which each next is at least as strong as the one before. */
export type Ladder<T> = readonly T[];

/**
 * The lightest candidate that passes, over ladders that each grow in strength. A ladder is entered only where it holds a candidate
 * lighter than the best so far; its strongest such candidate is asked first, then it is halved. Deterministic; equal scores keep the first.
 */
export function lightest<T extends { readonly score: number }>(
  ladders: readonly Ladder<T>[],
  accept: (candidate: T) => boolean,
): T | null {
  let best: T | null = null;
  for (const ladder of ladders) {
    const limit = best === null ? Infinity : (best as T).score;
    let high = ladder.length - 1;
    while (high >= 0 && (ladder[high] as T).score >= limit) high -= 1;
    if (high < 0 || !accept(ladder[high] as T)) continue;
    let low = 0;
    while (low < high) {
      const middle = Math.floor((low + high) / 2);
      if (accept(ladder[middle] as T)) high = middle;
      else low = middle + 1;
    }
    best = ladder[low] as T;
  }
  return best;
}
