import { checkExpression } from '#shared/combination-text/checkExpression';
import type { ApiProblem } from '#shared/contracts/errors';
import { tableColumns, type Column, type EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

import { cleanText } from '#shared/csv/cleanText';
import { largestNumber } from '#shared/csv/parseNumber';
import { longestText } from '#shared/csv/readCell';

export type CellReading =
  { readonly ok: true; readonly value: CellValue } | { readonly ok: false; readonly message: string };

const columnsOf = (table: EditableTable): readonly Column[] => tableColumns[table];

const shown = (value: CellValue): string => (value === null || value === '' ? 'nothing' : `"${String(value)}"`);

function rangeOf({ above, min, max }: Column): string {
  const parts: string[] = [];
  if (above !== undefined) parts.push(`above ${above}`);
  if (min !== undefined) parts.push(`not below ${min}`);
  if (max !== undefined) parts.push(`not above ${max}`);
  return parts.length === 0 ? 'a number' : `a number ${parts.join(' and ')}`;
}

/** One cell by its column: trimmed names, finite numbers in range, known choices; blank where the column may be blank. */
export function readCell(column: Column, value: CellValue): CellReading {
  const blank = value === null || (typeof value === 'string' && value.trim() === '');
  const refuse = (expected: string): CellReading => ({
    ok: false,
    message: `${column.name} reads ${shown(value)}, expected ${expected}; correct the cell`,
  });
  if (blank)
    return column.required ? refuse(column.type === 'number' ? rangeOf(column) : 'a value') : { ok: true, value: null };
  if (column.type === 'number') {
    if (typeof value !== 'number' || !(Math.abs(value) <= largestNumber)) return refuse(rangeOf(column));
    const { above, min, max } = column;
    const inRange =
      (above === undefined || value > above) &&
      (min === undefined || value >= min) &&
      (max === undefined || value <= max);
    // 0 for -0: the two are equal to everybody and differ as text
    return inRange ? { ok: true, value: value === 0 ? 0 : value } : refuse(rangeOf(column));
  }
  const text = cleanText(String(value));
  if (text === null || text === '' || text.length > longestText) {
    return refuse(`text of 1 to ${longestText} characters that can be shown`);
  }
  if (column.type === 'choice' && !(column.choices ?? []).includes(text)) {
    return refuse(`one of ${(column.choices ?? []).join(', ')}`);
  }
  return { ok: true, value: text };
}

/** What GET gives beside the cells and a client may send back. */
const notCells = new Set(['id', 'version', 'position']);

export type RowReading =
  | { readonly ok: true; readonly cells: Readonly<Record<string, CellValue>> }
  | { readonly ok: false; readonly problems: readonly ApiProblem[] };

/** A whole row; `row` is its place in the request, from 1. */
export function readRow(
  table: EditableTable,
  given: Readonly<Record<string, CellValue | undefined>>,
  row: number,
): RowReading {
  const cells: Record<string, CellValue> = {};
  const problems: ApiProblem[] = [];
  for (const column of columnsOf(table)) {
    const reading = readOf(table, column, given[column.name] ?? null);
    if (reading.ok) cells[column.name] = reading.value;
    else problems.push({ table, row, column: column.name, message: reading.message });
  }
  for (const name of Object.keys(given)) {
    if (!Object.hasOwn(cells, name) && !notCells.has(name) && !problems.some((problem) => problem.column === name)) {
      problems.push({ table, row, column: name, message: `${name} is no column of ${table}` });
    }
  }
  return problems.length === 0 ? { ok: true, cells } : { ok: false, problems };
}

/** One cell of a stored row. */
export function readNamedCell(table: EditableTable, name: string, value: CellValue): CellReading {
  const column = columnsOf(table).find((one) => one.name === name);
  if (column === undefined) return { ok: false, message: `${name} is no column of ${table}` };
  return readOf(table, column, value);
}

/** Texts of combinations are read at once: a text that can't be read is a fault of its cell. */
function readOf(table: EditableTable, column: Column, value: CellValue): CellReading {
  const reading = readCell(column, value);
  if (!reading.ok || table !== 'combinations' || column.name !== 'expression') return reading;
  const fault = checkExpression(String(reading.value));
  return fault === null ? reading : { ok: false, message: fault };
}
