import type { Bar } from './bars.ts';
import type { SectionLayer } from './sectionCurve.ts';

/** Reinforcement of a wall in engine units. */
export interface WallBars {
  readonly curtains: 1 | 2;
  readonly web: Bar;
  readonly webSpacingIn: number;
  readonly ends: null | { readonly bar: Bar; readonly count: number; readonly lengthIn: number };
  /** wall end to the first bar */
  readonly edgeIn: number;
}

/** The bars in a zone may count in compression. */
export interface CompressionZones {
  readonly web: boolean;
  readonly ends: boolean;
}

/** Distance between the columns of an end zone; 0 where it has one column or is too short. */
export function endStep(ends: { readonly count: number; readonly lengthIn: number }, edgeIn: number): number {
  const columns = Math.max(1, Math.round(ends.count / 2));
  return columns === 1 ? 0 : Math.max(0, ends.lengthIn - 2 * edgeIn) / (columns - 1);
}

/** Places of the end-zone columns from the wall end: count/2 columns on two faces, spread evenly from edge to length - edge. */
export function endColumns(count: number, zoneLengthIn: number, edgeIn: number): number[] {
  const columns = Math.max(1, Math.round(count / 2));
  if (columns === 1) return [edgeIn];
  const stepIn = endStep({ count, lengthIn: zoneLengthIn }, edgeIn);
  return Array.from({ length: columns }, (_, column) => edgeIn + column * stepIn);
}

/** Where the web begins: the innermost column of the end zone, or the edge bar; and into how many spaces the run between is cut. */
function webRun(bars: WallBars, lengthIn: number): { startIn: number; runIn: number; spaces: number } {
  let startIn = Math.min(bars.edgeIn, lengthIn / 2);
  if (bars.ends && bars.ends.count > 2) startIn = Math.max(bars.edgeIn, bars.ends.lengthIn - bars.edgeIn);
  const runIn = lengthIn - 2 * startIn;
  return { startIn, runIn, spaces: runIn <= 0 ? 0 : Math.ceil(runIn / bars.webSpacingIn - 1e-9) };
}

/** Number of places of `webPlaces`. */
export function webCount(bars: WallBars, lengthIn: number): number {
  const { spaces } = webRun(bars, lengthIn);
  return bars.ends ? Math.max(0, spaces - 1) : spaces + 1;
}

/**
 * Places of the web bars: G is the clear run between the innermost end bars (without end zones, between the edge bars), cut in
 * ceil(G/s) equal spaces with bars at the inner points; without end zones the edge bars are web bars themselves. No gap above s.
 * A sliver of 1e-9 of a space does not add one.
 */
export function webPlaces(bars: WallBars, lengthIn: number): number[] {
  const { startIn, runIn, spaces } = webRun(bars, lengthIn);
  const places: number[] = [];
  for (let index = 1; index < spaces; index += 1) places.push(startIn + (runIn * index) / spaces);
  if (bars.ends) return places;
  return spaces > 0 ? [startIn, ...places, lengthIn - startIn] : [startIn];
}

/** The bars of a row as layers along the wall, both ends alike, in order from the compression face. */
export function barLayers(bars: WallBars, lengthIn: number, zones: CompressionZones): SectionLayer[] {
  const layers: SectionLayer[] = [];
  const columns = bars.ends ? endColumns(bars.ends.count, bars.ends.lengthIn, bars.edgeIn) : [];
  const endAreaIn2 = bars.ends ? (bars.ends.count * bars.ends.bar.areaIn2) / columns.length : 0;
  const webAreaIn2 = bars.curtains * bars.web.areaIn2;
  for (const positionIn of columns) layers.push({ positionIn, areaIn2: endAreaIn2, compression: zones.ends });
  for (const positionIn of webPlaces(bars, lengthIn)) {
    layers.push({ positionIn, areaIn2: webAreaIn2, compression: zones.web });
  }
  for (const positionIn of columns.reverse()) {
    layers.push({ positionIn: lengthIn - positionIn, areaIn2: endAreaIn2, compression: zones.ends });
  }
  return layers;
}

/** Steel over concrete of the web: curtains x bar area / (spacing x thickness). End-zone bars do not count. */
export function webRatio(curtains: number, bar: Bar, spacingIn: number, thicknessIn: number): number {
  return (curtains * bar.areaIn2) / (spacingIn * thicknessIn);
}

/** Steel over concrete of the web as its bars are laid: between the end zones, or over the whole length without them. */
export function laidWebRatio(bars: WallBars, lengthIn: number, thicknessIn: number): number {
  const runIn = bars.ends ? lengthIn - 2 * bars.ends.lengthIn : lengthIn;
  const steelIn2 = webCount(bars, lengthIn) * bars.curtains * bars.web.areaIn2;
  return steelIn2 === 0 ? 0 : steelIn2 / (Math.max(runIn, bars.webSpacingIn) * thicknessIn);
}

/** Steel over concrete of one end zone: bars over length x thickness; 0 without one. */
export function endRatio(ends: WallBars['ends'], thicknessIn: number): number {
  return ends ? (ends.count * ends.bar.areaIn2) / (ends.lengthIn * thicknessIn) : 0;
}
