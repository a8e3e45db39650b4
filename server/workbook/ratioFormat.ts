/**
 * The number format of a ratio: three decimals, or as many as it takes that a ratio over its limit does not read 1.000.
 * The stored value stays the unrounded one.
 */
export function ratioFormat(ratio: number | null): string {
  if (ratio === null || ratio <= 1) return '0.000';
  for (let decimals = 3; decimals < 9; decimals += 1) {
    if (Number(ratio.toFixed(decimals)) > 1) return `0.${'0'.repeat(decimals)}`;
  }
  return '0.000000000';
}
