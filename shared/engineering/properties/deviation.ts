const numberOf = (row: object, column: string): number =>
  Number(new Map<string, unknown>(Object.entries(row)).get(column));
const textKey = (row: object): string =>
  JSON.stringify(Object.entries(row).filter(([, value]) => typeof value === 'string'));

/**
 * Largest difference of a numeric column between two lists of rows, over the column's largest magnitude. Rows are matched by
 * their text columns; `by` scales the second list. Infinite where a row has no twin.
 */
export function deviation(a: readonly object[], b: readonly object[], column: string, by = 1): number {
  const others = new Map(b.map((row) => [textKey(row), row]));
  if (others.size !== a.length) return Infinity;
  let scale = 1e-12;
  let worst = 0;
  for (const row of a) {
    const other = others.get(textKey(row));
    const left = numberOf(row, column);
    const right = other === undefined ? NaN : numberOf(other, column) * by;
    scale = Math.max(scale, Math.abs(left));
    worst = Math.max(worst, Number.isFinite(right) ? Math.abs(left - right) : Infinity);
  }
  return worst / scale;
}
