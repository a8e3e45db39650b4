import type { BarLists } from '../input.ts';
import { barFit } from '../wall-design/barFit.ts';
import type { WallBars } from '../wall-design/barLayers.ts';
import { findBar } from '../wall-design/bars.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { ScheduleCells } from '../wall-design/designTypes.ts';
import { horizontalRatio } from '../wall-design/detailChecks.ts';
import { lapNeeded } from '../wall-design/rowLaps.ts';
import { leastRatios, spacingLimits } from '../wall-design/steelNeeded.ts';

import type { BandNeeds } from './bandNeeds.ts';
import { score } from './choosing.ts';
import { horizontalMass } from './rowMass.ts';
import { notLighter } from './webChoices.ts';

export type HorizontalCell = ScheduleCells['horizontal'];

/**
 * Horizontal steel of a band: the lowest score among the office's bars and spacings that give rho_t for strength and 11.6, keep the
 * spacing, leave the vertical bars room, and are not lighter than the band above; as many curtains as the vertical bars. Where none does,
 * the one with the most steel that comes nearest, which the checks then mark as over.
 */
export function chooseHorizontal(question: {
  readonly needs: BandNeeds;
  readonly lists: BarLists;
  readonly bars: WallBars;
  readonly above: HorizontalCell | null;
  readonly used: ReadonlySet<number>;
  readonly context: DesignContext;
}): HorizontalCell {
  const { needs, lists, bars, above, used, context } = question;
  const { thicknessIn, lengthIn, heightsIn } = needs;
  const { units, limits } = context;
  const spacingLimitIn = spacingLimits(needs.shear.low, lengthIn, thicknessIn, context).horizontalIn;
  const aboveSteel = above && { ...above, areaIn2: findBar(units, above.bar).areaIn2 };
  const { curtains } = bars;
  let best: HorizontalCell | null = null;
  let bestScore = Infinity;
  let strongest: HorizontalCell | null = null;
  let strongestRatio = -Infinity;
  const consider = (size: number, spacing: number, end: HorizontalCell['end']): void => {
    const bar = findBar(units, size);
    if (aboveSteel && !notLighter(curtains, spacing, bar.areaIn2, aboveSteel)) return;
    const horizontal = { curtains, bar, spacingIn: spacing * limits.toIn };
    const ratio = horizontalRatio(horizontal, thicknessIn);
    const spaced = horizontal.spacingIn <= spacingLimitIn * (1 + 1e-9);
    const rank = ratio + (spaced ? 1 : 0);
    if (rank > strongestRatio) {
      strongest = { curtains, bar: size, spacing, end };
      strongestRatio = rank;
    }
    const least = leastRatios(needs.shear, bars.web, bar, ratio, context).horizontal;
    if (!spaced || ratio < Math.max(least, needs.shear.horizontalForStrength) * (1 - 1e-9)) return;
    const lapIn = lapNeeded('horizontal', bars, horizontal, needs.fcPsi, context);
    const value = score(horizontalMass(horizontal, lengthIn, heightsIn, lapIn, limits), [size], used);
    if (value >= bestScore) return;
    const fit = barFit(bars, thicknessIn, context.coverIn, bar.diameterIn, limits);
    if (fit.clearIn < fit.neededIn * (1 - 1e-9)) return;
    best = { curtains, bar: size, spacing, end };
    bestScore = value;
  };
  for (const size of lists.horizontal.sizes) {
    for (const spacing of lists.horizontal.spacings) consider(size, spacing, 'hook');
  }
  if (above) consider(above.bar, above.spacing, above.end);
  const chosen = (best ?? strongest) as HorizontalCell | null;
  if (chosen) return chosen;
  // an engineer's own curtains below heavier bars: nothing in the list is as heavy as above, so that only this band's needs count
  if (above) return chooseHorizontal({ ...question, above: null });
  throw new Error('no horizontal bars to choose from: the bar lists are empty');
}
