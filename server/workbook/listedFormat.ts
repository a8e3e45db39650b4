/** The number format of a length or strength as typed or listed: up to two decimals, none that are zero at the end. */
export function listedFormat(value: number): string {
  const decimals =
    value
      .toFixed(2)
      .replace(/\.?0+$/, '')
      .split('.')[1]?.length ?? 0;
  return decimals === 0 ? '#,##0' : `#,##0.${'0'.repeat(decimals)}`;
}
