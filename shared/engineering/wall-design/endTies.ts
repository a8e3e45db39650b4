import type { UnitSystem } from '../input.ts';

import type { Bar } from './bars.ts';
import { barTables } from './bars.ts';
import { endColumns } from './barLayers.ts';
import type { WallBars } from './barLayers.ts';
import type { DetailLimits } from './detailLimits.ts';

/**
 * Largest vertical spacing of ties around end-zone bars (25.7.2.1): 16 bar diameters, 48 tie diameters, the least dimension of the
 * tied zone. Inches.
 */
export function tieSpacingLimit(ends: NonNullable<WallBars['ends']>, tie: Bar, thicknessIn: number): number {
  return Math.min(16 * ends.bar.diameterIn, 48 * tie.diameterIn, thicknessIn, ends.lengthIn);
}

/** Least tie (25.7.2.2): No. 3 for bars to No. 10, No. 4 above (soft-metric 10, 32 and 13). */
export function leastTie(units: UnitSystem, ends: NonNullable<WallBars['ends']>): number {
  const table = barTables[units];
  const tenth = table[7];
  const small = tenth === undefined || ends.bar.number <= tenth.number;
  return (small ? table[0]?.number : table[1]?.number) ?? 0;
}

/**
 * Legs through the thickness (25.7.2.3): every corner and alternate column held, and every column where the clear distance
 * between columns is above 6 in (150 mm). Two legs run along the wall, one at each face.
 */
export function tieLegsAcross(ends: NonNullable<WallBars['ends']>, edgeIn: number, limits: DetailLimits): number {
  const columns = endColumns(ends.count, ends.lengthIn, edgeIn);
  if (columns.length < 3) return 2;
  const clearIn = (columns[1] as number) - (columns[0] as number) - ends.bar.diameterIn;
  return clearIn > limits.sixIn + 1e-9 ? columns.length : Math.floor(columns.length / 2) + 1;
}
