import type { Column } from '#shared/contracts/tableColumns';
import { formatNumber } from '#shared/format/number';

import type { CellValue } from '#shared/contracts/tables';

/** Least decimals of a column: lengths in ft one, in m two, forces one but none in a column above 100; the rest as typed. */
const least: Readonly<Record<string, Readonly<Record<'us' | 'si', number>>>> = {
  length: { us: 1, si: 2 },
  force: { us: 1, si: 1 },
  moment: { us: 0, si: 0 },
  area: { us: 0, si: 1 },
  fraction: { us: 2, si: 2 },
};

const most = 4;

/** Decimals that a typed number needs, at most four. */
function decimalsOf(value: number): number {
  for (let decimals = 0; decimals < most; decimals += 1) {
    if (Number(value.toFixed(decimals)) === value) return decimals;
  }
  return most;
}

/** One number of decimals for a whole column, so that points stand under each other and nothing typed is hidden. */
export function columnDecimals(column: Column, values: readonly CellValue[], units: 'us' | 'si'): number {
  const large = values.some((value) => typeof value === 'number' && Math.abs(value) > 100);
  let decimals = column.quantity === 'force' && large ? 0 : (least[column.quantity ?? 'plain']?.[units] ?? 0);
  for (const value of values) if (typeof value === 'number') decimals = Math.max(decimals, decimalsOf(value));
  return decimals;
}

/** An optional cell that nobody filled reads as a dash: it does not apply. */
export const absent = '–';

export function cellText(value: CellValue, decimals: number): string {
  if (value === null || value === '') return absent;
  return typeof value === 'number' ? formatNumber(value, decimals) : value;
}

/** What stands in the field when editing starts: every digit, no commas. */
export const cellEditText = (value: CellValue): string => (value === null ? '' : String(value));
