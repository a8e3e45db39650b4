import { tableColumns } from '../contracts/tableColumns.ts';

import type { TableName } from '../engineering/input.ts';

/** The order in which an engineer goes through one file: by line, then by column of the contract; without a column last. */
export function byRowAndColumn(
  table: TableName,
): (
  a: { readonly row: number | null; readonly column: string | null },
  b: { readonly row: number | null; readonly column: string | null },
) => number {
  const names: readonly string[] = tableColumns[table].map((column) => column.name);
  const place = (column: string | null): number => {
    const at = column === null ? -1 : names.indexOf(column);
    return at === -1 ? names.length : at;
  };
  return (a, b) => (a.row ?? 0) - (b.row ?? 0) || place(a.column) - place(b.column);
}
