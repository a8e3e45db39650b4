import { editableTables, type EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, UploadAnswer } from '#shared/contracts/tables';
import { limitProblems, problemLimit, type FileProblem } from '#shared/csv/fileProblem';
import { readTable } from '#shared/csv/readTable';
import { byRowAndColumn } from '#shared/csv/sortProblems';

import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';
import { checkRows, readSurroundings } from '../tables/checkRows.ts';
import { planReplacement } from '../tables/planReplacement.ts';
import { storeTable } from '../tables/replaceTable.ts';

export interface UploadRequest {
  readonly fileName: string;
  readonly bytes: Uint8Array;
  readonly table: EditableTable;
  readonly dryRun: boolean;
  readonly columns: Readonly<Record<string, string | null>>;
}

/** A building can do without the others. */
const neededTables: readonly EditableTable[] = ['levels', 'walls', 'forces'];

export const isEditableTable = (name: string): name is EditableTable =>
  (editableTables as readonly string[]).includes(name);

/** Parsing and checking happen before the transaction, never inside; nothing of a file with problems is taken. */
export class UploadService {
  constructor(private readonly context: Context) {}

  async take(caller: Caller, building: BuildingRecord, upload: UploadRequest): Promise<UploadAnswer> {
    const { table, fileName, bytes, dryRun, columns } = upload;
    const { units } = building.settings;
    const reading = readTable(table, bytes, fileName, units, columns);
    const rows = reading.rows as unknown as readonly Readonly<Record<string, CellValue>>[];
    const { others, stored, version } = await readSurroundings(this.context.gate, building.id, table);
    const checked = checkRows(table, rows, others, building.settings);
    const across = checked.problems.map(({ row, column, message }): FileProblem => ({
      file: fileName,
      row: row === null ? null : (reading.lines[row - 1] ?? null),
      column,
      message,
    }));
    if (neededTables.includes(table) && rows.length === 0 && reading.problemCount === 0) {
      const message = 'the file has a header and no rows, expected at least one; fill it';
      across.push({ file: fileName, row: null, column: null, message });
    }
    const total = reading.problemCount + across.length;
    if (total > 0) throw refused(table, fileName, [...reading.problems.slice(0, problemLimit), ...across], total);

    const taken = dryRun
      ? { counts: planReplacement(table, stored, rows, this.context.newId).counts, version }
      : await storeTable(this.context, caller, building.id, table, rows, null, {
          file: fileName,
          delimiter: reading.delimiter,
          encoding: reading.encoding,
          headerUnits: reading.headerUnits,
          by: caller.id,
          at: this.context.now(),
        });
    return {
      table,
      rows: reading.rows,
      notices: [...reading.notices, ...checked.notices.map((notice) => notice.message)],
      changes: taken.counts,
      version: taken.version,
      columns: reading.columns,
    };
  }
}

function refused(table: EditableTable, fileName: string, problems: readonly FileProblem[], total: number): HttpError {
  const sorted = [...problems].sort(byRowAndColumn(table));
  return new HttpError(422, 'problems', `${fileName} has problems; nothing of it was taken.`, {
    problems: limitProblems(sorted, total, fileName).map((problem) => ({ ...problem, table })),
  });
}
