import { cleanText } from './cleanText.ts';
import { largestNumber, parseNumber } from './parseNumber.ts';
import { quoteText } from './quoteText.ts';

import type { Column } from '../contracts/tableColumns.ts';

export type CellReading =
  { readonly ok: true; readonly value: string | number | null } | { readonly ok: false; readonly message: string };

export const longestText = 500;

function expectedOf(column: Column): string {
  if (column.type === 'choice') return `one of ${(column.choices ?? []).join(', ')}`;
  if (column.type === 'text') return 'text';
  if (column.min !== undefined && column.max !== undefined) return `a number from ${column.min} to ${column.max}`;
  if (column.above !== undefined) return `a number above ${column.above}`;
  if (column.min !== undefined) return `a number of at least ${column.min}`;
  if (column.max !== undefined) return `a number of at most ${column.max}`;
  return 'a number';
}

const refuse = (column: Column, read: string, remedy: string): CellReading => ({
  ok: false,
  message: `${column.name} reads ${read}, expected ${expectedOf(column)}; ${remedy}`,
});

/** Limits of a number in the building's own units. */
function checkNumber(column: Column, value: number, read: string): CellReading {
  if (!(Math.abs(value) <= largestNumber)) return refuse(column, read, 'write a number below 1e12');
  const { min, above, max } = column;
  const inside =
    (min === undefined || value >= min) &&
    (above === undefined || value > above) &&
    (max === undefined || value <= max);
  if (inside) return { ok: true, value: value === 0 ? 0 : value };
  if (column.quantity === 'fraction' && value >= 2 && value <= 100) {
    return refuse(column, read, `it is a fraction; ${value} percent is ${value / 100}`);
  }
  const unitless = column.quantity === 'fraction' || column.quantity === 'plain';
  return refuse(column, read, unitless ? 'correct the value' : 'correct the value or the unit in the header');
}

/** Text that a spreadsheet would take for a formula is kept behind an apostrophe in files; it comes off here. */
const withoutApostrophe = (text: string): string => (/^'+[=+\-@]/.test(text) ? text.slice(1) : text);

/**
 * One cell of a file: trimmed, required or not, number, choice or text. `convert` brings a number from the header's unit to the
 * building's own.
 */
export function readCell(
  column: Column,
  cell: string,
  convert: ((value: number) => number) | null = null,
  loneCommaIsAmbiguous = false,
): CellReading {
  const text = cell.trim();
  if (text === '') {
    if (!column.required) return { ok: true, value: null };
    return { ok: false, message: `${column.name} is empty, expected ${expectedOf(column)}; fill the cell` };
  }
  if (column.type === 'number') {
    const reading = parseNumber(text, loneCommaIsAmbiguous);
    if (!reading.ok) return refuse(column, quoteText(text), reading.remedy);
    return checkNumber(column, convert ? convert(reading.value) : reading.value, quoteText(text));
  }
  const own = cleanText(withoutApostrophe(text));
  if (own === null) return refuse(column, quoteText(text), 'take the control characters out');
  if (own.length > longestText) return refuse(column, `${own.length} characters`, `shorten it to ${longestText}`);
  if (column.type === 'text') return { ok: true, value: own };
  const folded = own.toLowerCase();
  const choice = column.choices?.find((candidate) => candidate === folded);
  return choice === undefined
    ? refuse(column, quoteText(own), 'write one of these words')
    : { ok: true, value: choice };
}

/** A cell that comes as JSON (grid, PUT, PATCH): numbers as they are, text by the same rules as in a file, apostrophes kept. */
export function readCellValue(column: Column, value: string | number | null): CellReading {
  if (typeof value === 'string') {
    const guarded = column.type !== 'number' && /^'+[=+\-@]/.test(value.trim()) ? `'${value.trim()}` : value;
    return readCell(column, guarded);
  }
  if (value === null) return readCell(column, '');
  if (column.type !== 'number') return readCell(column, String(value));
  return checkNumber(column, value, String(value));
}
