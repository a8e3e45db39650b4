import type { BarLists } from '../input.ts';
import { acrossFit, neededClear } from '../wall-design/barFit.ts';
import { webRatio } from '../wall-design/barLayers.ts';
import { findBar } from '../wall-design/bars.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { ScheduleCells } from '../wall-design/designTypes.ts';
import type { HorizontalBars } from '../wall-design/reinforcement.ts';
import { curtainsNeeded, leastRatios, spacingLimits } from '../wall-design/steelNeeded.ts';
import { horizontalRatio } from '../wall-design/detailChecks.ts';

import type { BandNeeds } from './bandNeeds.ts';

export type VerticalCell = ScheduleCells['vertical'];

const slack = 1 - 1e-9;

/** A curtain-and-spacing cell with the area of its bar in in2. */
export interface SpacedSteel {
  readonly curtains: number;
  readonly spacing: number;
  readonly areaIn2: number;
}

/** Bars and steel of a cell are no fewer than those of the cell above. Spacings in one unit. */
export function notLighter(curtains: number, spacing: number, areaIn2: number, above: SpacedSteel): boolean {
  const bars = curtains / spacing;
  const barsAbove = (above.curtains / above.spacing) * slack;
  return curtains >= above.curtains && bars >= barsAbove && bars * areaIn2 >= barsAbove * above.areaIn2;
}

/**
 * Web cells that a band may take, as one ladder for each number of curtains and bar size, lightest first. A cell stands in a ladder
 * where curtains, spacing, least ratio, fit and the band above allow it and its steel is not above 1 % (beyond that the web would need
 * ties; end zones serve better). `relaxed` keeps only the band above and the curtains: the last resort when no cell meets all.
 */
export function webLadders(
  needs: BandNeeds,
  lists: BarLists,
  horizontal: HorizontalBars,
  above: VerticalCell | null,
  context: DesignContext,
  relaxed: boolean,
): VerticalCell[][] {
  const { thicknessIn, lengthIn } = needs;
  const { units, limits, rules } = context;
  const rhoT = horizontalRatio(horizontal, thicknessIn);
  const spacingLimitIn = spacingLimits(needs.shear.low, lengthIn, thicknessIn, context).verticalIn;
  const aboveSteel = above && { ...above, areaIn2: findBar(units, above.bar).areaIn2 };
  const lightFirst = [...lists.web.spacings].sort((a, b) => b - a);
  const spacingsOf = (size: number): readonly number[] => {
    if (size !== above?.bar || lightFirst.includes(above.spacing)) return lightFirst;
    return [...lightFirst, above.spacing].sort((a, b) => b - a);
  };
  const listed = lists.web.sizes;
  const sizes = above && !listed.includes(above.bar) ? [...listed, above.bar] : listed;
  const ladders: VerticalCell[][] = [];
  for (const curtains of [1, 2] as const) {
    if (curtains < curtainsNeeded(thicknessIn, context)) continue;
    for (const size of sizes) {
      const bar = findBar(units, size);
      const least = leastRatios(needs.shear, bar, horizontal.bar, rhoT, context).vertical * slack;
      const clearIn = neededClear(bar, limits) * slack + 2 * bar.diameterIn;
      const across = acrossFit(curtains, bar, thicknessIn, context.coverIn, horizontal.bar.diameterIn, limits);
      if (!across && !relaxed) continue;
      const ladder: VerticalCell[] = [];
      for (const spacing of size === above?.bar && !listed.includes(size) ? [above.spacing] : spacingsOf(size)) {
        if (aboveSteel && !notLighter(curtains, spacing, bar.areaIn2, aboveSteel)) continue;
        const spacingIn = spacing * limits.toIn;
        const rho = webRatio(curtains, bar, spacingIn, thicknessIn);
        const stands = spacingIn <= spacingLimitIn * (1 + 1e-9) && spacingIn >= clearIn;
        const inRange = rho >= least && rho <= rules.tiesAboveRatio * (1 + 1e-9);
        if (relaxed || (stands && inRange)) ladder.push({ curtains, bar: size, spacing });
      }
      if (ladder.length > 0) ladders.push(ladder);
    }
  }
  return ladders;
}
