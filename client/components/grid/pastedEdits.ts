import type { GridColumn, GridEdit } from './gridTypes.ts';

export interface PasteTarget<Row> {
  readonly rows: readonly Row[];
  readonly columns: readonly GridColumn<Row>[];
  readonly rowId: (row: Row) => string;
  /** upper left cell */
  readonly row: number;
  readonly column: number;
}

export type PastedEdits =
  | { readonly ok: true; readonly edits: readonly GridEdit[] }
  /** the first cell that does not parse, in words; nothing is pasted then */
  | { readonly ok: false; readonly message: string };

export const isEditable = <Row>(column: GridColumn<Row>, row: Row): boolean =>
  typeof column.editable === 'function' ? column.editable(row) : column.editable;

export const editTextOf = <Row>(column: GridColumn<Row>, row: Row): string => (column.editText ?? column.text)(row);

/** Cells of the clipboard as edits of existing cells: read-only cells are passed over, unchanged ones too. All or nothing. */
export function pastedEdits<Row>(cells: readonly (readonly string[])[], target: PasteTarget<Row>): PastedEdits {
  const edits: GridEdit[] = [];
  for (const [down, texts] of cells.entries()) {
    const row = target.rows[target.row + down];
    if (row === undefined) break;
    for (const [right, raw] of texts.entries()) {
      const column = target.columns[target.column + right];
      if (column === undefined) break;
      const text = raw.trim();
      if (!isEditable(column, row) || text === editTextOf(column, row)) continue;
      const parsed = column.parse(text, row);
      if (!parsed.ok) {
        const read = text === '' ? 'blank' : text;
        const message = `Row ${down + 1} of the pasted rows, ${column.header}: read ${read}, expected ${parsed.expected}. Nothing was pasted.`;
        return { ok: false, message };
      }
      edits.push({ rowId: target.rowId(row), columnId: column.id, value: parsed.value, text });
    }
  }
  return { ok: true, edits };
}
