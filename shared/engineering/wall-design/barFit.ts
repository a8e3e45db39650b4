import type { Bar } from './bars.ts';
import { endStep } from './barLayers.ts';
import type { WallBars } from './barLayers.ts';
import type { DetailLimits } from './detailLimits.ts';

export interface BarFit {
  /** clear distance that is there, laps doubled; may be below 0 */
  readonly clearIn: number;
  readonly neededIn: number;
}

/** Clear distance between vertical bars (25.2.3): 1.5 in (40 mm), 1.5 db. The coarse aggregate is not known and not judged. */
export function neededClear(bar: Bar, limits: DetailLimits): number {
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
  judge(bars.webSpacingIn - 2 * bars.web.diameterIn, neededClear(bars.web, limits));
  const web = webAcross(bars.curtains, bars.web, thicknessIn, coverIn, outerDiameterIn, limits);
  judge(web.clearIn, web.neededIn);
  if (bars.ends) {
    const { bar, count } = bars.ends;
    if (count > 2) judge(endStep(bars.ends, bars.edgeIn) - 2 * bar.diameterIn, neededClear(bar, limits));
    judge(acrossIn - 2 * bar.diameterIn, neededClear(bar, limits));
  }
  return worst;
}

/** Whether web bars of one size stand clear through the thickness: the part of `barFit` that no spacing changes. */
export function acrossFit(
  curtains: 1 | 2,
  bar: Bar,
  thicknessIn: number,
  coverIn: number,
  outerDiameterIn: number,
  limits: DetailLimits,
): boolean {
  const { clearIn, neededIn } = webAcross(curtains, bar, thicknessIn, coverIn, outerDiameterIn, limits);
  return clearIn >= neededIn * (1 - 1e-9);
}

/** Two curtains stand clear of each other; one curtain keeps the cover of both faces beside the horizontal bar. */
function webAcross(
  curtains: 1 | 2,
  bar: Bar,
  thicknessIn: number,
  coverIn: number,
  outerDiameterIn: number,
  limits: DetailLimits,
): BarFit {
  if (curtains === 1) {
    return { clearIn: thicknessIn - 2 * coverIn - outerDiameterIn, neededIn: bar.diameterIn };
  }
  return {
    clearIn: thicknessIn - 2 * (coverIn + outerDiameterIn) - 2 * bar.diameterIn,
    neededIn: neededClear(bar, limits),
  };
}
