import { unitLabels } from '../contracts/quantities.ts';
import { tableColumns } from '../contracts/tableColumns.ts';

import { parseNumber } from './parseNumber.ts';

import type { Column } from '../contracts/tableColumns.ts';
import type { TableName, Tables, UnitSystem } from '../engineering/input.ts';

const lineEnd = '\r\n';

function header(column: Column, units: UnitSystem): string {
  const unit = column.quantity ? unitLabels[column.quantity][units] : '';
  return unit === '' ? column.name : `${column.name} (${unit})`;
}

/** Text that a spreadsheet would run as a formula goes behind an apostrophe, which reading takes off again; numbers do not. */
function guarded(text: string): string {
  if (!/^'*[=+\-@]/.test(text)) return text;
  return !text.startsWith("'") && parseNumber(text).ok ? text : `'${text}`;
}

function cell(column: Column, value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const text = column.type === 'text' ? guarded(value) : value;
  return /[",;\t\r\n]/.test(text) ? `"${text.replace(/"/g, '""')}"` : text;
}

/** The header of a table with the building's units, ready to be filled in. */
export function templateCsv(table: TableName, units: UnitSystem): string {
  const columns: readonly Column[] = tableColumns[table];
  return columns.map((column) => header(column, units)).join(',') + lineEnd;
}

/** A table as CSV with a header that names the units; `readTable` gives the same rows again. */
export function writeCsv<T extends TableName>(table: T, rows: Tables[T], units: UnitSystem): string {
  const columns: readonly Column[] = tableColumns[table];
  const lines = rows.map((row) => {
    const values = row as unknown as Readonly<Record<string, string | number | null>>;
    return columns.map((column) => cell(column, values[column.name] ?? null)).join(',') + lineEnd;
  });
  return templateCsv(table, units) + lines.join('');
}
