import { z } from 'zod';

import type { EditableTable } from './tableColumns.ts';
import type { Tables } from '../engineering/input.ts';

/** One stored row: the columns of its table plus id and version. */
export type StoredRow<T extends EditableTable = EditableTable> = Tables[T][number] & {
  readonly id: string;
  readonly version: number;
};

/** GET /api/buildings/:id/<table>; `version` is the table's, for If-Match. */
export interface TableResource<T extends EditableTable = EditableTable> {
  readonly rows: readonly StoredRow<T>[];
  readonly version: number;
  readonly seq: number;
  /** said when the rows were taken: unknown columns, rows added up ... */
  readonly notices?: readonly string[];
}

export const cellValueSchema = z.union([z.string().max(500), z.number(), z.null()]);
export type CellValue = z.infer<typeof cellValueSchema>;

/** PATCH /api/buildings/:id/<table> */
export const tablePatchSchema = z.object({
  edits: z
    .array(z.object({ id: z.string(), column: z.string(), was: cellValueSchema, to: cellValueSchema }))
    .max(50_000)
    .default([]),
  /** `after`: id of the row above, null for the top */
  inserts: z
    .array(z.object({ after: z.string().nullable(), row: z.record(z.string(), cellValueSchema) }))
    .max(50_000)
    .default([]),
  deletes: z
    .array(z.object({ id: z.string(), version: z.number().int() }))
    .max(50_000)
    .default([]),
});
export type TablePatch = z.infer<typeof tablePatchSchema>;

/** Answer of the PATCH: rows as they stand now, cascades of a rename in other tables included. */
export interface TablePatchAnswer<T extends EditableTable = EditableTable> {
  /** changed and inserted rows of this table */
  readonly rows: readonly StoredRow<T>[];
  readonly deleted: readonly string[];
  readonly version: number;
  readonly seq: number;
  /** other tables that a rename went through to */
  readonly alsoChanged: readonly EditableTable[];
}

/** `current` of a 409 `cell-moved`: cells whose `was` is no longer stored; `stored` is absent where the row is gone. */
export interface MovedCell {
  readonly id: string;
  readonly column: string;
  readonly was: CellValue;
  readonly stored?: CellValue;
}

/** PUT /api/buildings/:id/<table> with If-Match */
export const tablePutSchema = z.object({
  rows: z.array(z.record(z.string(), cellValueSchema.optional())).max(50_000),
});

/** POST /api/buildings/:id/uploads, 200. With dryRun nothing is stored and `version` is the table's as it stands. */
export interface UploadAnswer {
  readonly table: EditableTable;
  readonly rows: readonly Tables[EditableTable][number][];
  readonly notices: readonly string[];
  readonly changes: {
    readonly added: number;
    readonly removed: number;
    readonly changed: number;
    readonly same: number;
  };
  readonly version: number;
  /** header of the file as typed, and the column of ours that each was taken for (null: ignored) */
  readonly columns: readonly { readonly header: string; readonly column: string | null }[];
}
