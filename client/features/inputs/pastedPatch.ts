import { tableColumns, type Column, type EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, TablePatch } from '#shared/contracts/tables';
import { readCell } from '#shared/csv/readCell';

import type { GridColumn } from '../../components/grid/gridTypes.ts';
import { pastedEdits } from '../../components/grid/pastedEdits.ts';
import { valueOf, type InputRow } from './inputColumns.ts';

export type PastedPatch =
  { readonly ok: true; readonly patch: Partial<TablePatch> } | { readonly ok: false; readonly message: string };

export interface PasteOptions {
  readonly table: EditableTable;
  readonly columns: readonly GridColumn<InputRow>[];
  readonly rows: readonly InputRow[];
  readonly at: { readonly rowId: string | null; readonly columnId: string };
}

/** Pasted rows that reach beyond the last one: the first ones edit, the others are added. All or nothing. */
export function pastedPatch(cells: readonly (readonly string[])[], options: PasteOptions): PastedPatch {
  const { table, columns, rows, at } = options;
  const start = at.rowId === null ? rows.length : rows.findIndex((row) => row.id === at.rowId);
  const firstColumn = Math.max(
    0,
    columns.findIndex((column) => column.id === at.columnId),
  );
  const rowId = (row: InputRow) => row.id;
  const existing = pastedEdits(cells, { rows, columns, rowId, row: start, column: firstColumn });
  if (!existing.ok) return existing;
  const byId = new Map(rows.map((row) => [row.id, row]));
  const edits = existing.edits.map((edit) => {
    const row = byId.get(edit.rowId);
    return {
      id: edit.rowId,
      column: edit.columnId,
      was: row === undefined ? null : valueOf(row, edit.columnId),
      to: edit.value as CellValue,
    };
  });
  const ours: readonly Column[] = tableColumns[table];
  const after = rows[rows.length - 1]?.id ?? null;
  const inserts: TablePatch['inserts'] = [];
  for (const [down, texts] of cells.entries()) {
    if (start + down < rows.length) continue;
    const row: Record<string, CellValue> = {};
    for (const [place, column] of ours.entries()) {
      const reading = readCell(column, texts[place - firstColumn] ?? '');
      if (!reading.ok) {
        return { ok: false, message: `Row ${down + 1} of the pasted rows: ${reading.message}. Nothing was pasted.` };
      }
      row[column.name] = reading.value;
    }
    inserts.push({ after, row });
  }
  return { ok: true, patch: { edits, inserts } };
}
