import type { ApiProblem } from '#shared/contracts/errors';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, MovedCell, TablePatch, TablePatchAnswer } from '#shared/contracts/tables';

import type { RowState } from '../../change-log/delta.ts';
import { recordChange } from '../../change-log/recordChange.ts';
import { writeRows } from '../../change-log/writeRows.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import type { RowRecord } from '../../db/repositories/TableRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';

import { cascadeRename, renamesOf } from './cascadeRename.ts';
import { placeInserts } from './placeInserts.ts';
import { wholeState } from './planReplacement.ts';
import { readNamedCell, readRow } from './readCells.ts';
import { storedRow } from './storedRow.ts';

interface ReadPatch {
  readonly edits: readonly { id: string; column: string; was: CellValue; to: CellValue }[];
  readonly inserts: readonly { after: string | null; cells: Readonly<Record<string, CellValue>> }[];
}

/** Every cell by its column, or 422 with all problems. */
function readPatch(table: EditableTable, patch: TablePatch): ReadPatch {
  const problems: ApiProblem[] = [];
  const edits = patch.edits.map((edit) => {
    const reading = readNamedCell(table, edit.column, edit.to);
    if (reading.ok) return { ...edit, to: reading.value };
    problems.push({ table, row: null, column: edit.column, rowId: edit.id, message: reading.message });
    return edit;
  });
  const inserts = patch.inserts.map(({ after, row }, place) => {
    const reading = readRow(table, row, place + 1);
    if (reading.ok) return { after, cells: reading.cells };
    problems.push(...reading.problems);
    return { after, cells: {} };
  });
  if (problems.length > 0) {
    throw new HttpError(422, 'problems', `The edit of ${table} has problems; nothing of it was taken.`, {
      problems: problems.slice(0, 500),
    });
  }
  return { edits, inserts };
}

function checkMoved(byId: ReadonlyMap<string, RowRecord>, read: ReadPatch, patch: TablePatch): void {
  const moved: MovedCell[] = [];
  for (const { id, column, was } of read.edits) {
    const row = byId.get(id);
    if (row === undefined) moved.push({ id, column, was });
    else if ((row.cells[column] ?? null) !== was) moved.push({ id, column, was, stored: row.cells[column] ?? null });
  }
  if (moved.length > 0) {
    throw new HttpError(409, 'cell-moved', 'A cell has been changed since it was read.', { current: moved });
  }
  const gone = patch.deletes.flatMap(({ id, version }) => {
    const row = byId.get(id);
    if (row === undefined) return [{ id }];
    return row.version === version ? [] : [storedRow(row)];
  });
  if (gone.length > 0) {
    throw new HttpError(409, 'version', 'A row has been changed since it was read.', { current: gone });
  }
}

/** New rows need their neighbors, names of levels, walls and cases all rows that could bear them. */
const needsWholeTable = (table: EditableTable, patch: TablePatch): boolean =>
  patch.inserts.length > 0 ||
  table === 'levels' ||
  table === 'walls' ||
  patch.edits.some((edit) => table === 'forces' && edit.column === 'case');

/** No id of ours is longer, and some texts are more than a database takes. */
const namedRows = (patch: TablePatch): string[] => [
  ...new Set([...patch.edits, ...patch.deletes].map(({ id }) => id).filter((id) => /^[0-9a-f-]{36}$/.test(id))),
];

/**
 * {edits, inserts, deletes} of one table in one transaction. Two people in one table meet only in one cell: an edit conflicts
 * where its `was` is no longer stored. The building may pass through states that do not compute.
 */
export async function editTable(
  context: Context,
  caller: Caller,
  buildingId: string,
  table: EditableTable,
  patch: TablePatch,
): Promise<TablePatchAnswer> {
  const read = readPatch(table, patch);
  return context.gate.write(
    async (store) => {
      const seq = await store.buildings.nextSeq(buildingId, true);
      const stored = needsWholeTable(table, patch)
        ? await store.tables.rows(buildingId, table)
        : await store.tables.rowsByIds(buildingId, table, namedRows(patch));
      const byId = new Map(stored.map((row) => [row.id, row]));
      checkMoved(byId, read, patch);

      const next = new Map<string, RowRecord>();
      for (const { id, column, to } of read.edits) {
        const row = next.get(id) ?? byId.get(id);
        if (row !== undefined) next.set(id, { ...row, cells: { ...row.cells, [column]: to } });
      }
      const before: Record<string, RowState> = {};
      const after: Record<string, RowState> = {};
      const remove = patch.deletes.map(({ id }) => id);
      for (const id of remove) {
        const row = byId.get(id);
        if (row !== undefined) before[id] = wholeState(row);
        after[id] = null;
        next.delete(id);
      }
      const update: { stored: RowRecord; next: RowRecord }[] = [];
      for (const [id, row] of next) {
        const old = byId.get(id);
        if (old === undefined) continue;
        const names = Object.keys(row.cells).filter((name) => row.cells[name] !== old.cells[name]);
        if (names.length === 0) continue;
        update.push({ stored: old, next: row });
        before[id] = Object.fromEntries(names.map((name) => [name, old.cells[name] ?? null]));
        after[id] = Object.fromEntries(names.map((name) => [name, row.cells[name] ?? null]));
      }
      const { insert, moved } = placeInserts(stored, remove, read.inserts, context.newId);
      for (const row of insert) {
        before[row.id] = null;
        after[row.id] = wholeState(row);
      }
      const nothingChanges = update.length === 0 && insert.length === 0 && remove.length === 0;
      if (nothingChanges) {
        // no change to record: an undo would have nothing to turn back
        return {
          rows: [],
          deleted: [],
          version: await store.tables.version(buildingId, table),
          seq,
          alsoChanged: [],
        };
      }
      for (const { id, position } of moved) await store.tables.setPosition(table, id, position);
      if (!(await writeRows(store, buildingId, table, { insert, update, remove }))) {
        throw new HttpError(409, 'version', 'A row has been changed at the same moment.');
      }

      const removed = new Set(remove);
      const standing = stored.filter((row) => !removed.has(row.id)).map((row) => next.get(row.id) ?? row);
      const renames = renamesOf(table, stored, [...standing, ...insert]);
      const cascade = await cascadeRename(store, buildingId, renames);
      await recordChange(store, context, {
        buildingId,
        personId: caller.id,
        seq,
        kind: 'edit',
        delta: {
          before: {
            tables: { ...cascade.before, [table]: before },
            ...(cascade.settings === null ? {} : { settings: cascade.settings.before }),
            renames: renames.map(turned),
          },
          after: {
            tables: { ...cascade.after, [table]: after },
            ...(cascade.settings === null ? {} : { settings: cascade.settings.after }),
            renames,
          },
        },
      });
      const shown = [...update.map(({ next: row }) => row.id), ...insert.map((row) => row.id)];
      const rows = await store.tables.rowsByIds(buildingId, table, shown);
      return {
        rows: rows.map(storedRow),
        deleted: remove,
        version: await store.tables.version(buildingId, table),
        seq,
        alsoChanged: Object.keys(cascade.after) as EditableTable[],
      };
    },
    { long: patch.edits.length + patch.inserts.length + patch.deletes.length > 1000 },
  );
}

const turned = <R extends { from: string; to: string }>(rename: R): R => ({
  ...rename,
  from: rename.to,
  to: rename.from,
});
