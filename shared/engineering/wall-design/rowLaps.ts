import type { WallBars } from './barLayers.ts';
import { endStep } from './barLayers.ts';
import type { DesignContext } from './designContext.ts';
import type { LapCell } from './designTypes.ts';
import { roundUpLength } from './detailLimits.ts';
import { classBLap, developmentLength } from './developmentLength.ts';
import type { AnchoredBar } from './developmentLength.ts';
import type { HorizontalBars } from './reinforcement.ts';

export type LappedBars = 'web' | 'ends' | 'horizontal';

/**
 * A row's bar as 25.4.2.4 sees it. `cover` is to the outermost, horizontal bar; a vertical bar lies inside it. Spacing is that of
 * the bars in one face: of the web, of the end-zone columns (not above the web's), of the horizontal bars.
 */
export function anchoredBar(
  which: LappedBars,
  bars: WallBars,
  horizontal: HorizontalBars,
  fcPsi: number,
  context: DesignContext,
): AnchoredBar {
  const { coverIn, fyKsi, fytKsi, lambda } = context;
  if (which === 'horizontal') {
    return {
      bar: horizontal.bar,
      fyKsi: fytKsi,
      fcPsi,
      lambda,
      coverToCenterIn: coverIn + horizontal.bar.diameterIn / 2,
      spacingIn: horizontal.spacingIn,
      horizontal: true,
    };
  }
  const bar = which === 'ends' && bars.ends ? bars.ends.bar : bars.web;
  let spacingIn = bars.webSpacingIn;
  if (which === 'ends' && bars.ends) {
    const stepIn = endStep(bars.ends, bars.edgeIn);
    if (stepIn > 0) spacingIn = Math.min(spacingIn, stepIn);
  }
  return {
    bar,
    fyKsi,
    fcPsi,
    lambda,
    coverToCenterIn: coverIn + horizontal.bar.diameterIn + bar.diameterIn / 2,
    spacingIn,
    horizontal: false,
  };
}

/** Class B lap needed, inches. */
export function lapNeeded(
  which: LappedBars,
  bars: WallBars,
  horizontal: HorizontalBars,
  fcPsi: number,
  context: DesignContext,
): number {
  return classBLap(anchoredBar(which, bars, horizontal, fcPsi, context), context.rules, context.limits);
}

/** Longest ld of a row's vertical bars, inches. */
export function verticalDevelopment(
  bars: WallBars,
  horizontal: HorizontalBars,
  fcPsi: number,
  context: DesignContext,
): number {
  const of = (which: LappedBars): number =>
    developmentLength(anchoredBar(which, bars, horizontal, fcPsi, context), context.rules, context.limits);
  return bars.ends ? Math.max(of('web'), of('ends')) : of('web');
}

/** The laps cell of a row: class B, rounded up to whole inches or 10 mm; larger bars than may be lapped are coupled. */
export function lapCell(bars: WallBars, horizontal: HorizontalBars, fcPsi: number, context: DesignContext): LapCell {
  const { limits } = context;
  const length = (which: LappedBars): number =>
    roundUpLength(lapNeeded(which, bars, horizontal, fcPsi, context), limits);
  const webLaps = bars.web.number <= limits.largestLappedBar;
  const endsLap = bars.ends !== null && bars.ends.bar.number <= limits.largestLappedBar;
  const coupled = !webLaps || (bars.ends !== null && !endsLap);
  return {
    web: webLaps ? length('web') : null,
    ends: endsLap ? length('ends') : null,
    horizontal: length('horizontal'),
    splice: coupled ? 'coupler' : 'lap',
  };
}
