import { tableColumns } from '../contracts/tableColumns.ts';

import { quoteText } from './quoteText.ts';
import { readCell } from './readCell.ts';
import { isQuoted } from './readRecords.ts';

import type { TableName } from '../engineering/input.ts';

import type { HeaderMatch } from './matchHeader.ts';
import type { ProblemList } from './problemList.ts';
import type { CsvRecord, Delimiter } from './readRecords.ts';

type Row = Record<string, string | number | null>;

/** Records below the header to rows, one each; what could not be read is NaN or '' there and a problem in the list. */
export function readRows(
  records: readonly CsvRecord[],
  header: CsvRecord,
  match: HeaderMatch,
  table: TableName,
  delimiter: Delimiter,
  list: ProblemList,
): { rows: Row[]; lines: number[] } {
  const blank: Row = {};
  const unread: Row = {};
  for (const column of tableColumns[table]) {
    blank[column.name] = null;
    unread[column.name] = column.type === 'number' ? NaN : '';
  }
  const rows: Row[] = [];
  const lines: number[] = [];
  for (const record of records) {
    if (record.brokenQuote !== null) {
      const entry = match.columns[record.brokenQuote];
      list.add(
        record.line,
        entry?.column ?? entry?.header ?? null,
        'a double quote opens the cell and does not close before the next separator; close it, or write a quote inside a quoted cell twice',
      );
      rows.push(unread);
      lines.push(record.line);
      continue;
    }
    const row = { ...blank };
    for (const { column, index, convert, unitKnown } of match.matched) {
      const cell = record.cells[index] ?? '';
      const ambiguous = delimiter !== ',' && cell.includes(',') && !isQuoted(record, index, delimiter);
      const reading = readCell(column, cell, convert, ambiguous);
      if (reading.ok) row[column.name] = unitKnown || reading.value === null ? reading.value : NaN;
      else {
        list.add(record.line, column.name, reading.message);
        row[column.name] = unread[column.name] ?? null;
      }
    }
    const extra = record.cells.slice(header.cells.length).find((cell) => cell.trim() !== '');
    if (extra !== undefined) {
      list.add(
        record.line,
        null,
        `the row has ${record.cells.length} cells, the header ${header.cells.length}; ${quoteText(extra)} stands under no header: quote a cell that holds the separator, or take the cell out`,
      );
    }
    rows.push(row);
    lines.push(record.line);
  }
  return { rows, lines };
}
