import Papa from 'papaparse';

import type { ParseStepResult, Parser } from 'papaparse';

export type Delimiter = ',' | ';' | '\t';

/** One record of the file as split by papaparse. */
export interface CsvRecord {
  readonly cells: readonly string[];
  /** physical line on which the record starts, 1 for the first line of the file */
  readonly line: number;
  /** the record as it stands in the file, with its line end */
  readonly raw: string;
  /** index of a cell whose quotes do not close, else null */
  readonly brokenQuote: number | null;
}

/** Broken quotes after this many are not looked for: each one means reading the rest of the file anew. */
const restartLimit = 50;

/** CRLF and CR become LF, so that one character ends a line and lines can be counted. */
export const normalizeLineEnds = (text: string): string => text.replace(/\r\n?/g, '\n');

const isBlank = (cells: readonly string[]): boolean => cells.every((cell) => cell.trim() === '');

function countLineEnds(text: string): number {
  let count = 0;
  for (let at = text.indexOf('\n'); at !== -1; at = text.indexOf('\n', at + 1)) count += 1;
  return count;
}

/** Which cell of a record starts at `offset`: the number of cells before it. */
const cellIndexAt = (raw: string, offset: number, delimiter: Delimiter): number =>
  Math.max(
    0,
    (Papa.parse<string[]>(raw.slice(0, Math.max(0, offset)), { delimiter, newline: '\n' }).data[0]?.length ?? 1) - 1,
  );

/**
 * Records of a text with LF line ends; blank lines and lines of empty cells are left out but counted. After a record whose
 * quotes do not close, reading goes on with the next physical line, so that its neighbors still get their own problems.
 */
export function readRecords(text: string, delimiter: Delimiter): CsvRecord[] {
  const records: CsvRecord[] = [];
  let offset = 0;
  let line = 1;
  let restarts = 0;
  let going = true;
  while (going && offset < text.length) {
    going = false;
    const base = offset;
    const rest = base === 0 ? text : text.slice(base);
    Papa.parse<string[]>(rest, {
      delimiter,
      newline: '\n',
      skipEmptyLines: false,
      step: (result: ParseStepResult<string[]>, parser: Parser) => {
        const end = base + result.meta.cursor;
        const raw = text.slice(offset, end);
        const broken = result.errors.find((error) => error.type === 'Quotes');
        if (broken) {
          const brokenQuote = cellIndexAt(raw, (broken.index ?? 1) - 1 - (offset - base), delimiter);
          records.push({ cells: result.data, line, raw, brokenQuote });
          const lineEnd = text.indexOf('\n', offset);
          offset = lineEnd === -1 ? text.length : lineEnd + 1;
          line += 1;
          restarts += 1;
          going = restarts < restartLimit;
          parser.abort();
          return;
        }
        if (!isBlank(result.data)) records.push({ cells: result.data, line, raw, brokenQuote: null });
        line += countLineEnds(raw);
        offset = end;
      },
    });
  }
  return records;
}

/** True where the cell stands in double quotes in the file; papaparse itself does not say. */
export function isQuoted(record: CsvRecord, index: number, delimiter: Delimiter): boolean {
  let cell = 0;
  let inQuotes = false;
  let atStart = true;
  for (const character of record.raw) {
    if (atStart && cell === index) return character === '"';
    if (inQuotes) {
      if (character === '"') inQuotes = false;
    } else if (character === '"') {
      inQuotes = true;
    } else if (character === delimiter) {
      cell += 1;
      atStart = true;
      continue;
    }
    atStart = false;
  }
  return false;
}
