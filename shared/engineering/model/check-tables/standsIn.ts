import type { WallSpan } from './checkWalls.ts';

/** From the lowest band to the highest: a gap between bands is a fault of walls.csv. Bands without known levels may be anywhere. */
export function standsIn(bands: readonly (WallSpan | null)[], story: number): boolean {
  let below = false;
  let above = false;
  for (const span of bands) {
    if (!span) return true;
    below ||= span.from <= story;
    above ||= story <= span.to;
  }
  return below && above;
}
