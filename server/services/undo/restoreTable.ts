import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

import type { TableState } from '../../change-log/delta.ts';
import { writeRows } from '../../change-log/writeRows.ts';
import type { RowRecord } from '../../db/repositories/TableRepository.ts';
import type { Store } from '../../db/Store.ts';

import { movedOn, type MovedPlace } from './movedOn.ts';

function splitPosition(state: Readonly<Record<string, CellValue>>): {
  readonly position: number | null;
  readonly cells: Readonly<Record<string, CellValue>>;
} {
  const { position, ...cells } = state;
  return { position: typeof position === 'number' ? position : null, cells };
}

/** Puts rows from the state `from` into the state `to`; refused where a cell of `from` is no longer stored. */
export async function restoreTable(
  store: Store,
  buildingId: string,
  table: EditableTable,
  from: TableState,
  to: TableState,
): Promise<void> {
  const stored = new Map((await store.tables.rows(buildingId, table)).map((row) => [row.id, row]));
  const moved: MovedPlace[] = [];
  const insert: RowRecord[] = [];
  const remove: string[] = [];
  const update: { stored: RowRecord; next: RowRecord }[] = [];
  for (const [id, wanted] of Object.entries(to)) {
    const expected = from[id] ?? null;
    const row = stored.get(id);
    if ((expected === null) !== (row === undefined)) {
      moved.push({ table, id });
      continue;
    }
    if (row === undefined || expected === null) {
      if (wanted === null) continue;
      const { position, cells } = splitPosition(wanted);
      insert.push({ id, version: 1, position: position ?? 0, cells });
      continue;
    }
    // the position is no cell: rows may have made room for others meanwhile
    const { cells: guard } = splitPosition(expected);
    const apart = Object.keys(guard).filter((column) => row.cells[column] !== guard[column]);
    moved.push(...apart.map((column) => ({ table, id, column, stored: row.cells[column] ?? null })));
    if (wanted === null) {
      remove.push(id);
      continue;
    }
    const { position, cells } = splitPosition(wanted);
    update.push({
      stored: row,
      next: { ...row, position: position ?? row.position, cells: { ...row.cells, ...cells } },
    });
  }
  if (moved.length > 0) throw movedOn(moved);
  if (!(await writeRows(store, buildingId, table, { insert, update, remove }))) throw movedOn([{ table, id: '' }]);
}
