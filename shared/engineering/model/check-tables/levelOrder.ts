import type { LevelRow } from '../../input.ts';

/** What the order of levels is judged by, ft or m: wide enough for either unit system's tolerance on elevations. */
const coarseTolerance = 0.006;

const known = (value: number | null): value is number => value !== null && !Number.isNaN(value);

/**
 * Levels whose elevation contradicts the heights, as indices. `order` runs from the base up. Every given elevation is compared
 * with the last one that held; where the one after it fits that one again, only the level between is to blame.
 * Lengths in ft or m. A level without an elevation is passed over; unread heights (NaN) contradict nothing.
 */
export function contradictingElevations(
  levels: readonly LevelRow[],
  order: readonly number[],
  tolerance: number,
): number[] {
  const tops: number[] = [];
  let top = 0;
  for (const index of order) {
    top += levels[index]?.height ?? 0;
    tops[index] = top;
  }
  const given = order.filter((index) => known(levels[index]?.elevation ?? null));
  const disagree = (lower: number, upper: number): boolean => {
    const typed = (levels[upper]?.elevation ?? 0) - (levels[lower]?.elevation ?? 0);
    return Math.abs(typed - ((tops[upper] ?? 0) - (tops[lower] ?? 0))) > tolerance * (1 + 1e-9) + 1e-9;
  };
  const contradicting: number[] = [];
  let reference = given[0];
  given.slice(1).forEach((index, position) => {
    if (reference === undefined) return;
    if (!disagree(reference, index)) {
      reference = index;
      return;
    }
    contradicting.push(index);
    const next = given[position + 2];
    if (next === undefined || disagree(reference, next)) reference = index;
  });
  return contradicting;
}

/**
 * Indices of the levels from the base up. Rows run from the top down unless elevations say otherwise: of the orders top down,
 * bottom up and by elevation (where every level has one), that which contradicts the heights least, the first of them on a tie.
 */
export function levelOrder(levels: readonly LevelRow[]): number[] {
  const bottomUp = levels.map((_, index) => index);
  const topDown = [...bottomUp].reverse();
  const candidates = [topDown, bottomUp];
  if (levels.every((level) => known(level.elevation))) {
    candidates.push([...topDown].sort((a, b) => (levels[a]?.elevation ?? 0) - (levels[b]?.elevation ?? 0)));
  }
  let best = topDown;
  let fewest = Number.POSITIVE_INFINITY;
  for (const candidate of candidates) {
    const count = contradictingElevations(levels, candidate, coarseTolerance).length;
    if (count < fewest) {
      best = candidate;
      fewest = count;
    }
  }
  return best;
}

/** Elevation of the base, ft or m: from the lowest elevation given less the heights below it; 0 where none is given. */
export function baseElevation(levels: readonly LevelRow[]): number {
  let below = 0;
  for (const index of levelOrder(levels)) {
    const level = levels[index];
    if (!level) continue;
    below += level.height;
    if (known(level.elevation)) return level.elevation - below;
  }
  return 0;
}
