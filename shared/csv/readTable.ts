import { checkExpression } from '../combination-text/checkExpression.ts';
import { tableColumns } from '../contracts/tableColumns.ts';

import { decodeText } from './decodeText.ts';
import { detectDelimiter } from './detectDelimiter.ts';
import { limitProblems } from './fileProblem.ts';
import { knownHeaders, matchHeader } from './matchHeader.ts';
import { ProblemList } from './problemList.ts';
import { normalizeLineEnds, readRecords } from './readRecords.ts';
import { readRows } from './readRows.ts';

import type { TableName, Tables, UnitSystem } from '../engineering/input.ts';

import type { Encoding } from './decodeText.ts';
import type { FileProblem } from './fileProblem.ts';
import type { ColumnChoices, HeaderMatch } from './matchHeader.ts';
import type { Delimiter } from './readRecords.ts';

export interface TableReading<T extends TableName = TableName> {
  readonly table: T;
  /**
   * One row a record. Only where `problems` is empty may they be used as input: a number that could not be read is NaN here and
   * a missing name is '', so that the checks across tables can still pass over them in silence.
   */
  readonly rows: Tables[T];
  /** physical line of each row's start */
  readonly lines: readonly number[];
  readonly notices: readonly string[];
  readonly problems: readonly FileProblem[];
  /** how many problems there are; `problems` holds the first 500 and a count of the rest */
  readonly problemCount: number;
  readonly columns: HeaderMatch['columns'];
  readonly delimiter: Delimiter;
  readonly encoding: Encoding;
  readonly headerUnits: Readonly<Record<string, string>>;
}

/** Tables that a building can't do without: their files need at least one row. */
export const requiredTables: readonly TableName[] = ['levels', 'walls', 'forces'];

const emptyMatch: HeaderMatch = { matched: [], columns: [], headerUnits: {}, problems: [], notices: [] };

/** Bytes of one CSV file to rows of its table in the building's units, or to all problems of the file. */
export function readTable<T extends TableName>(
  table: T,
  bytes: Uint8Array,
  fileName: string,
  units: UnitSystem,
  choices: ColumnChoices = {},
): TableReading<T> {
  const list = new ProblemList(fileName);
  const finish = (
    rows: readonly unknown[],
    lines: readonly number[],
    match: HeaderMatch,
    delimiter: Delimiter,
    encoding: Encoding,
    notices: readonly string[] = [],
  ): TableReading<T> => ({
    table,
    rows: rows as Tables[T],
    lines,
    notices: [...match.notices, ...notices],
    problems: limitProblems(list.kept, list.count, fileName),
    problemCount: list.count,
    columns: match.columns,
    delimiter,
    encoding,
    headerUnits: match.headerUnits,
  });

  const decoded = decodeText(bytes);
  if (!decoded.ok) {
    list.add(decoded.row, null, decoded.message);
    return finish([], [], emptyMatch, ',', 'utf-8');
  }
  const text = normalizeLineEnds(decoded.text);
  const delimiter = detectDelimiter(text, knownHeaders(table, choices));
  const [header, ...records] = readRecords(text, delimiter);
  if (!header) {
    const names = tableColumns[table].filter((column) => column.required).map((column) => column.name);
    list.add(null, null, `the file is empty, expected a header with ${names.join(', ')} and one row a line`);
    return finish([], [], emptyMatch, delimiter, decoded.encoding);
  }
  if (header.brokenQuote !== null) {
    list.add(header.line, null, 'a double quote in the header does not close; close it or take it out');
    return finish([], [], emptyMatch, delimiter, decoded.encoding);
  }
  if (records.length === 0 && requiredTables.includes(table)) {
    list.add(null, null, 'the file has a header and no rows, expected at least one row; fill the table');
  }
  const match = matchHeader(table, header.cells, units, choices);
  for (const problem of match.problems) list.add(header.line, problem.column, problem.message);
  const { rows, lines } = readRows(records, header, match, table, delimiter, list);
  if (table === 'combinations') addExpressionProblems(rows, lines, list);
  const complete = tableColumns[table].every(
    (column) => !column.required || match.matched.some((entry) => entry.column === column),
  );
  const unnamed = header.cells.flatMap((cell, index) =>
    cell.trim() === '' && records.some((record) => (record.cells[index] ?? '').trim() !== '')
      ? [`column number ${index + 1} has no header and was left out`]
      : [],
  );
  return finish(complete ? rows : [], complete ? lines : [], match, delimiter, decoded.encoding, unnamed);
}

/** A combination that can't be read is a problem of its file, with the place in the text. */
function addExpressionProblems(
  rows: readonly Readonly<Record<string, unknown>>[],
  lines: readonly number[],
  list: ProblemList,
): void {
  rows.forEach(({ expression }, index) => {
    if (typeof expression !== 'string' || expression === '') return;
    const fault = checkExpression(expression);
    if (fault !== null) list.add(lines[index] ?? null, 'expression', fault);
  });
}
