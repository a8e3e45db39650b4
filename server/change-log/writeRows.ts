import type { EditableTable } from '#shared/contracts/tableColumns';

import type { RowRecord } from '../db/repositories/TableRepository.ts';
import type { Store } from '../db/Store.ts';

/** Stored rows as they were read, and as they shall be. */
export interface RowWork {
  readonly insert: readonly RowRecord[];
  readonly update: readonly { readonly stored: RowRecord; readonly next: RowRecord }[];
  readonly remove: readonly string[];
}

/** Above this many rows one statement for all is faster than one each. */
const manyRows = 200;

/**
 * Writes rows of one table and moves its version. False where a row has moved on since it was read; the caller then throws, and
 * the transaction is rolled back.
 */
export async function writeRows(
  store: Store,
  buildingId: string,
  table: EditableTable,
  { insert, update, remove }: RowWork,
): Promise<boolean> {
  if (update.length > manyRows) {
    const moved = update.map(({ stored, next }) => ({ ...next, id: stored.id, version: stored.version + 1 }));
    await store.tables.remove(table, [...remove, ...moved.map((row) => row.id)]);
    await store.tables.insert(buildingId, table, [...moved, ...insert]);
  } else {
    await store.tables.remove(table, remove);
    for (const { stored, next } of update) {
      const done = await store.tables.update(table, stored.id, stored.version, next.cells, next.position);
      if (!done) return false;
    }
    await store.tables.insert(buildingId, table, insert);
  }
  await store.tables.bump(buildingId, table);
  return true;
}
