/** A cell whose edit the server has not answered yet: at first `saving`, after a while `not saved`. */
export type CellPending = 'saving' | 'not saved';

export interface CellPlaceId {
  readonly rowId: string;
  readonly columnId: string;
}

/** Edits that were sent together. */
export interface PendingBatch {
  readonly id: number;
  readonly cells: readonly CellPlaceId[];
  readonly late: boolean;
}

export type PendingRow = ReadonlyMap<string, CellPending>;
export type PendingRows = ReadonlyMap<string, PendingRow>;

/** The marks of every row that waits. A cell in two batches reads `not saved` as soon as one of them is late. */
export function pendingRows(batches: readonly PendingBatch[]): PendingRows {
  const rows = new Map<string, Map<string, CellPending>>();
  for (const { cells, late } of batches) {
    for (const { rowId, columnId } of cells) {
      const row = rows.get(rowId) ?? new Map<string, CellPending>();
      if (late || !row.has(columnId)) row.set(columnId, late ? 'not saved' : 'saving');
      rows.set(rowId, row);
    }
  }
  return rows;
}
