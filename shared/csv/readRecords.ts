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

/** More than any list of problems shows; what follows is not read, since nothing of the file is taken anyway. */
const brokenQuoteLimit = 600;
/** After a broken quote the text is read in pieces, since each such quote means reading on to the end of the piece. */
const firstPiece = 16_384;

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

type Piece = 'whole' | 'broken' | 'cut';

/**
 * Records of a text with LF line ends; blank lines and lines of empty cells are left out but counted. After a record whose
 * quotes do not close, reading goes on with the next physical line, so that its neighbors still get their own problems.
 */
export function readRecords(text: string, delimiter: Delimiter): CsvRecord[] {
  const records: CsvRecord[] = [];
  let offset = 0;
  let line = 1;
  let broken = 0;

  const readPiece = (end: number): Piece => {
    const base = offset;
    let outcome: Piece = 'whole';
    Papa.parse<string[]>(base === 0 && end === text.length ? text : text.slice(base, end), {
      delimiter,
      newline: '\n',
      skipEmptyLines: false,
      step: (result: ParseStepResult<string[]>, parser: Parser) => {
        const raw = text.slice(offset, base + result.meta.cursor);
        const errors = result.errors.filter((error) => error.type === 'Quotes');
        const [error] = errors;
        if (error) {
          parser.abort();
          // a cell that only lacks its end may have it behind the end of the piece
          outcome = end < text.length && errors.every(({ code }) => code === 'MissingQuotes') ? 'cut' : 'broken';
          if (outcome === 'cut') return;
          const brokenQuote = cellIndexAt(raw, (error.index ?? 1) - 1 - (offset - base), delimiter);
          records.push({ cells: result.data, line, raw, brokenQuote });
          offset = lineEndFrom(text, offset);
          line += 1;
          return;
        }
        if (!isBlank(result.data)) records.push({ cells: result.data, line, raw, brokenQuote: null });
        line += countLineEnds(raw);
        offset += raw.length;
      },
    });
    return outcome;
  };

  let size = text.length;
  while (offset < text.length && broken < brokenQuoteLimit) {
    const outcome = readPiece(lineEndFrom(text, Math.min(text.length, offset + size) - 1));
    if (outcome === 'broken') {
      broken += 1;
      size = firstPiece;
    } else {
      size *= 4;
    }
  }
  return records;
}

/** Where the line that holds `offset` ends, its line end included. */
function lineEndFrom(text: string, offset: number): number {
  const end = text.indexOf('\n', offset);
  return end === -1 ? text.length : end + 1;
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
