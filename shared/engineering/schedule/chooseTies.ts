import type { BarLists } from '../input.ts';
import { findBar } from '../wall-design/bars.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { TieCell } from '../wall-design/designTypes.ts';
import { leastTie, tieLegsAcross, tieSpacingLimit } from '../wall-design/endTies.ts';
import type { WallBars } from '../wall-design/barLayers.ts';

/**
 * Ties of an ordinary wall's end zones (11.7.4.1, 25.7.2): the least bar of the office's list that the standard allows, at the largest
 * spacing of the list within its limit; of those the largest that divides the horizontal spacing is preferred. Elevations in ft or m.
 */
export function chooseTies(
  ends: NonNullable<WallBars['ends']>,
  horizontalSpacing: number,
  thicknessIn: number,
  lists: BarLists,
  elevations: { readonly from: number; readonly to: number },
  context: DesignContext,
): TieCell {
  const least = leastTie(context.units, ends);
  const sizes = [...lists.ties.sizes].sort((a, b) => a - b);
  const bar = sizes.find((size) => size >= least) ?? sizes[sizes.length - 1] ?? least;
  const limit = tieSpacingLimit(ends, findBar(context.units, bar), thicknessIn) / context.limits.toIn;
  const spacings = [...lists.ties.spacings].sort((a, b) => b - a);
  const within = spacings.filter((spacing) => spacing <= limit * (1 + 1e-9));
  const divides = (spacing: number): boolean => {
    const parts = horizontalSpacing / spacing;
    return Math.abs(parts - Math.round(parts)) < 1e-9;
  };
  const spacing = within.find(divides) ?? within[0] ?? spacings[spacings.length - 1] ?? limit;
  const legsAcross = tieLegsAcross(ends, context.edgeIn, context.limits);
  return {
    bar,
    spacing,
    legsAlong: 2,
    legsAcross,
    fromElevation: elevations.from,
    toElevation: elevations.to,
    kind: legsAcross > 2 ? 'hoop and crossties' : 'hoop',
  };
}
