import type { ApiProblem } from '#shared/contracts/errors';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

import { recordChange } from '../../change-log/recordChange.ts';
import { writeRows } from '../../change-log/writeRows.ts';
import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';

import { checkRows, readSurroundings } from './checkRows.ts';
import { planReplacement, type Replacement } from './planReplacement.ts';
import { readRow } from './readCells.ts';

type Cells = Readonly<Record<string, CellValue>>;

export interface TakenTable {
  readonly counts: Replacement['counts'];
  readonly version: number;
}

/** Writes checked rows over a table. `version` null: whatever stands (uploads). */
export async function storeTable(
  context: Context,
  caller: Caller,
  buildingId: string,
  table: EditableTable,
  rows: readonly Cells[],
  version: number | null,
  source: Readonly<Record<string, unknown>> | null,
): Promise<TakenTable> {
  return context.gate.write(
    async (store) => {
      const seq = await store.buildings.nextSeq(buildingId, true);
      const standing = await store.tables.version(buildingId, table);
      if (version !== null && version !== standing) {
        throw new HttpError(409, 'version', `The table ${table} has been changed since it was read.`, {
          current: { version: standing },
        });
      }
      const plan = planReplacement(table, await store.tables.rows(buildingId, table), rows, context.newId);
      if (!(await writeRows(store, buildingId, table, plan.work))) {
        throw new HttpError(409, 'version', 'A row has been changed at the same moment.');
      }
      if (source !== null) await store.tables.setSource(buildingId, table, source);
      await recordChange(store, context, {
        buildingId,
        personId: caller.id,
        seq,
        kind: source === null ? 'replace' : 'upload',
        delta: { before: { tables: { [table]: plan.before } }, after: { tables: { [table]: plan.after } } },
      });
      return { counts: plan.counts, version: standing + 1 };
    },
    { long: true },
  );
}

/** PUT: every cell by its column, then the table against itself and the others, then stored. */
export async function replaceTable(
  context: Context,
  caller: Caller,
  building: BuildingRecord,
  table: EditableTable,
  rows: readonly Readonly<Record<string, CellValue | undefined>>[],
  version: number,
): Promise<TakenTable & { readonly notices: readonly string[] }> {
  const problems: ApiProblem[] = [];
  const cells: Cells[] = [];
  rows.forEach((given, place) => {
    const reading = readRow(table, given, place + 1);
    if (reading.ok) cells.push(reading.cells);
    else problems.push(...reading.problems);
  });
  if (problems.length > 0) {
    throw new HttpError(422, 'problems', `The rows of ${table} have problems; nothing of them was taken.`, {
      problems: problems.slice(0, 500),
    });
  }
  const { others } = await readSurroundings(context.gate, building.id, table);
  const checked = checkRows(table, cells, others, building.settings);
  if (checked.problems.length > 0) {
    throw new HttpError(422, 'problems', `The rows of ${table} do not fit; nothing of them was taken.`, {
      problems: checked.problems.slice(0, 500).map(({ row, column, message }) => ({ table, row, column, message })),
    });
  }
  const taken = await storeTable(context, caller, building.id, table, cells, version, null);
  return { ...taken, notices: checked.notices.map((notice) => notice.message) };
}
