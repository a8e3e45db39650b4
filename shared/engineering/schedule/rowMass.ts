import type { WallBars } from '../wall-design/barLayers.ts';
import { webCount } from '../wall-design/barLayers.ts';
import type { Bar } from '../wall-design/bars.ts';
import type { DetailLimits } from '../wall-design/detailLimits.ts';
import type { HorizontalBars, LapsInInches } from '../wall-design/reinforcement.ts';

function sum(values: readonly number[]): number {
  let total = 0;
  for (const value of values) total += value;
  return total;
}

/** Rows of bars at a spacing over every story: ceil(h/s), a sliver of 1e-9 adding none. */
function rowsOf(heightsIn: readonly number[], spacingIn: number): number {
  let rows = 0;
  for (const heightIn of heightsIn) rows += Math.ceil(heightIn / spacingIn - 1e-9);
  return rows;
}

/**
 * Mass of a band's vertical bars in lb: every bar runs the story and is lapped once a story (common practice), so its length is
 * the story height and one lap; coupled bars have none. `extraIn` is what the bars run on past the top of the band instead of that lap.
 */
export function verticalMass(
  bars: WallBars,
  lengthIn: number,
  heightsIn: readonly number[],
  laps: Pick<LapsInInches, 'webIn' | 'endsIn'>,
  extraIn = 0,
): number {
  const runIn = (lapIn: number | null): number => sum(heightsIn) + heightsIn.length * (lapIn ?? 0) + extraIn;
  const webLb = webCount(bars, lengthIn) * bars.curtains * bars.web.massLbPerIn * runIn(laps.webIn);
  const endsLb = bars.ends ? 2 * bars.ends.count * bars.ends.bar.massLbPerIn * runIn(laps.endsIn) : 0;
  return webLb + endsLb;
}

/**
 * Mass of a band's horizontal bars in lb: ceil(h/s) rows a story and curtain, each as long as the wall with a lap for every stock
 * length begun after the first (60 ft, 18 m) and a hook of 12 bar diameters at both ends.
 */
export function horizontalMass(
  horizontal: HorizontalBars,
  lengthIn: number,
  heightsIn: readonly number[],
  lapIn: number,
  limits: DetailLimits,
): number {
  const rows = rowsOf(heightsIn, horizontal.spacingIn);
  const laps = Math.ceil(lengthIn / limits.stockIn - 1e-9) - 1;
  const barIn = lengthIn + laps * lapIn + 24 * horizontal.bar.diameterIn;
  return rows * horizontal.curtains * barIn * horizontal.bar.massLbPerIn;
}

/** Mass of the ties of both end zones in lb: a hoop around the zone, inner legs through the thickness, two hooks of 6 db and 3 in on each piece. */
export function tieMass(
  ties: { readonly bar: Bar; readonly spacingIn: number; readonly legsAcross: number },
  zoneLengthIn: number,
  thicknessIn: number,
  coverIn: number,
  heightsIn: readonly number[],
): number {
  const sets = 2 * rowsOf(heightsIn, ties.spacingIn);
  const hooksIn = 2 * Math.max(3, 6 * ties.bar.diameterIn);
  const acrossIn = thicknessIn - 2 * coverIn;
  const hoopIn = 2 * (zoneLengthIn - coverIn + acrossIn) + hooksIn;
  const legsIn = Math.max(0, ties.legsAcross - 2) * (acrossIn + hooksIn);
  return sets * (hoopIn + legsIn) * ties.bar.massLbPerIn;
}
