import type { BarLists } from '../input.ts';
import { barFit } from '../wall-design/barFit.ts';
import { findBar } from '../wall-design/bars.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { ScheduleCells } from '../wall-design/designTypes.ts';
import type { HorizontalBars } from '../wall-design/reinforcement.ts';
import { wallBars } from '../wall-design/reinforcement.ts';

import type { BandNeeds } from './bandNeeds.ts';
import type { VerticalCell } from './webChoices.ts';

export type EndsCell = NonNullable<ScheduleCells['ends']>;

/** usual end zones; more bars only where these do not do */
const usualCounts = [4, 6, 8, 10, 12];
const moreCounts = [14, 16, 18, 20, 22, 24];
/** steel over concrete of an end zone is not chosen above this (common practice) */
const largestEndRatio = 0.04;
/** both end zones together leave at least this much of the length to the web */
const largestShareOfLength = 0.6;

/**
 * End zones that a band may take with one bar size, fewest bars first: even counts from 4 to 12 (with `more` to 24), the shortest length in steps of 2 in
 * (50 mm) in which the columns stand clear with laps doubled (25.2.3) and steel stays within 4 %, never shorter, with fewer bars or less
 * steel than the end zone above.
 */
export function endLadder(
  needs: BandNeeds,
  size: number,
  vertical: VerticalCell,
  horizontal: HorizontalBars,
  above: EndsCell | null,
  context: DesignContext,
  more: boolean,
): EndsCell[] {
  const { limits, units, edgeIn } = context;
  const bar = findBar(units, size);
  const stepIn = 2 * bar.diameterIn + Math.max(limits.clearIn, 1.5 * bar.diameterIn);
  const aboveIn2 = above ? above.count * findBar(units, above.bar).areaIn2 : 0;
  const ladder: EndsCell[] = [];
  for (const count of more ? [...usualCounts, ...moreCounts] : usualCounts) {
    if (above && (count < above.count || count * bar.areaIn2 < aboveIn2 * (1 - 1e-9))) continue;
    const lengthIn = Math.max(
      2 * edgeIn + (count / 2 - 1) * stepIn,
      (count * bar.areaIn2) / (largestEndRatio * needs.thicknessIn),
    );
    const steps = Math.ceil(lengthIn / limits.toIn / limits.endZoneStep - 1e-9);
    const length = Math.max(steps * limits.endZoneStep, above ? above.length : 0);
    if (2 * length * limits.toIn > largestShareOfLength * needs.lengthIn) break;
    const cell: EndsCell = { bar: size, count, length };
    const fit = barFit(
      wallBars({ vertical, ends: cell }, context),
      needs.thicknessIn,
      context.coverIn,
      horizontal.bar.diameterIn,
      limits,
    );
    if (fit.clearIn >= fit.neededIn * (1 - 1e-9)) ladder.push(cell);
  }
  return ladder;
}

/** Sizes for end zones: the office's list, and that of the end zone above where it is another. */
export function endSizes(lists: BarLists, above: EndsCell | null): number[] {
  const sizes = [...lists.ends.sizes];
  if (above && !sizes.includes(above.bar)) sizes.push(above.bar);
  return sizes;
}
