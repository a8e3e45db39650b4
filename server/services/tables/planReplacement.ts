import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

import type { RowState, TableState } from '../../change-log/delta.ts';
import type { RowWork } from '../../change-log/writeRows.ts';
import type { RowRecord } from '../../db/repositories/TableRepository.ts';

import { naturalKey } from './naturalKey.ts';

type Cells = Readonly<Record<string, CellValue>>;

/** Rows stand this far apart, so that a row can be put between two without touching them. */
export const positionStep = 1024;

export interface Replacement {
  readonly work: RowWork;
  readonly before: TableState;
  readonly after: TableState;
  readonly counts: {
    readonly added: number;
    readonly removed: number;
    readonly changed: number;
    readonly same: number;
  };
}

export const wholeState = (row: RowRecord): RowState => ({ ...row.cells, position: row.position });

/** New rows against stored ones: matched by natural key (the nth to the nth where a key stands more than once). */
export function planReplacement(
  table: EditableTable,
  stored: readonly RowRecord[],
  rows: readonly Cells[],
  newId: () => string,
): Replacement {
  const waiting = new Map<string, RowRecord[]>();
  for (const row of stored) {
    const key = naturalKey(table, row.cells);
    const same = waiting.get(key);
    if (same === undefined) waiting.set(key, [row]);
    else same.push(row);
  }
  const insert: RowRecord[] = [];
  const update: { stored: RowRecord; next: RowRecord }[] = [];
  const before: Record<string, RowState> = {};
  const after: Record<string, RowState> = {};
  let changed = 0;
  rows.forEach((cells, place) => {
    const position = (place + 1) * positionStep;
    const old = waiting.get(naturalKey(table, cells))?.shift();
    if (old === undefined) {
      const row: RowRecord = { id: newId(), version: 1, position, cells };
      insert.push(row);
      before[row.id] = null;
      after[row.id] = wholeState(row);
      return;
    }
    const names = Object.keys(cells).filter((name) => cells[name] !== old.cells[name]);
    const moved = old.position !== position;
    if (names.length > 0) changed += 1;
    if (names.length === 0 && !moved) return;
    update.push({ stored: old, next: { ...old, position, cells } });
    const side = (from: Cells, at: number): RowState => ({
      ...Object.fromEntries(names.map((name) => [name, from[name] ?? null])),
      ...(moved ? { position: at } : {}),
    });
    before[old.id] = side(old.cells, old.position);
    after[old.id] = side(cells, position);
  });
  const gone = [...waiting.values()].flat();
  for (const row of gone) {
    before[row.id] = wholeState(row);
    after[row.id] = null;
  }
  const counts = {
    added: insert.length,
    removed: gone.length,
    changed,
    same: rows.length - insert.length - changed,
  };
  return { work: { insert, update, remove: gone.map((row) => row.id) }, before, after, counts };
}
