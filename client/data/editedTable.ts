import type { EditableTable } from '#shared/contracts/tableColumns';
import type { StoredRow, TablePatch, TableResource } from '#shared/contracts/tables';

/** The table as it will read once the patch is stored; new rows wait for the server's ids. */
export function editedTable<T extends EditableTable>(
  table: TableResource<T>,
  patch: Partial<TablePatch>,
): TableResource<T> {
  const gone = new Set((patch.deletes ?? []).map((one) => one.id));
  const changes = new Map<string, Record<string, unknown>>();
  for (const edit of patch.edits ?? []) {
    changes.set(edit.id, { ...changes.get(edit.id), [edit.column]: edit.to });
  }
  const rows: StoredRow<T>[] = [];
  for (const row of table.rows) {
    if (gone.has(row.id)) continue;
    const change = changes.get(row.id);
    rows.push(change === undefined ? row : { ...row, ...change });
  }
  return { ...table, rows };
}
