import type { Bar } from './bars.ts';
import { endColumns } from './barLayers.ts';
import type { WallBars } from './barLayers.ts';
import type { DetailLimits } from './detailLimits.ts';

export interface BarFit {
  /** clear distance that is there, laps doubled; may be below 0 */
  readonly clearIn: number;
  readonly neededIn: number;
}

/** Clear distance between vertical bars (25.2.3): 1.5 in (40 mm), 1.5 db. The coarse aggregate is not known and not judged. */
function needed(bar: Bar, limits: DetailLimits): number {
  return Math.max(limits.clearIn, 1.5 * bar.diameterIn);
}

/**
 * The tightest place of a row's vertical bars: between columns of an end zone and between web bars, both with the lapped bar
 * lying beside (two bar diameters taken from the spacing), and between the two faces through the thickness (cover, horizontal or
 * tie bar and vertical bar taken from both sides). One curtain is judged against the cover of both faces. Worst = clear over needed.
 */
export function barFit(
  bars: WallBars,
  thicknessIn: number,
  coverIn: number,
  outerDiameterIn: number,
  limits: DetailLimits,
): BarFit {
  let worst: BarFit = { clearIn: Infinity, neededIn: 1 };
  const judge = (clearIn: number, neededIn: number): void => {
    if (clearIn / neededIn < worst.clearIn / worst.neededIn) worst = { clearIn, neededIn };
  };
  const acrossIn = thicknessIn - 2 * (coverIn + outerDiameterIn);
  judge(bars.webSpacingIn - 2 * bars.web.diameterIn, needed(bars.web, limits));
  if (bars.curtains === 2) judge(acrossIn - 2 * bars.web.diameterIn, needed(bars.web, limits));
  else judge(thicknessIn - 2 * coverIn - outerDiameterIn, bars.web.diameterIn);
  if (bars.ends) {
    const { bar, count, lengthIn } = bars.ends;
    const columns = endColumns(count, lengthIn, bars.edgeIn);
    if (columns.length > 1) {
      const stepIn = (lengthIn - 2 * bars.edgeIn) / (columns.length - 1);
      judge(stepIn - 2 * bar.diameterIn, needed(bar, limits));
    }
    judge(acrossIn - 2 * bar.diameterIn, needed(bar, limits));
  }
  return worst;
}
