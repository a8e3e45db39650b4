import { formatNumber, thinSpace } from './number.ts';

/** Decimals of a column of forces in a table: none where its largest value is above 100, else one. */
export function forceDecimals(values: readonly number[]): 0 | 1 {
  let largest = 0;
  for (const value of values) largest = Math.max(largest, Math.abs(value));
  return largest > 100 ? 0 : 1;
}

/** kip or kN in balances and sheets: one decimal. */
export const formatForce = (force: number, decimals: 0 | 1 = 1): string => formatNumber(force, decimals);

/** kip-ft or kN-m: no decimals. */
export const formatMoment = (moment: number): string => formatNumber(moment, 0);

/** A fraction as percent with one decimal and a thin space. */
export const formatShare = (fraction: number): string => `${formatNumber(fraction * 100, 1)}${thinSpace}%`;

/** Steel ratio: four decimals. */
export const formatSteelRatio = (steelRatio: number): string => formatNumber(steelRatio, 4);
