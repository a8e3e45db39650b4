import { z } from 'zod';

import type { OverwritableCell, OwnCells } from '../engineering/wall-design/designTypes.ts';
import type { ResultRow } from './result.ts';

/** GET /api/buildings/:id/schedule: {rows: ScheduleResourceRow[], seq} */
export type ScheduleResourceRow = ResultRow & {
  readonly id: string;
  readonly version: number;
  readonly overwritten: readonly OverwritableCell[];
  /** what automatic choice says for this band, cell by cell */
  readonly automatic: Pick<ResultRow, OverwritableCell>;
  readonly reason: string | null;
};

/** Overwritten cells whose stories the wall no longer has; they stay until someone releases all of them. */
export interface OrphanedOverwrite {
  readonly id: string;
  readonly version: number;
  readonly wall: string;
  readonly from: string;
  readonly to: string;
  readonly own: OwnCells;
  readonly reason: string | null;
}

export interface ScheduleResource {
  readonly rows: readonly ScheduleResourceRow[];
  readonly seq: number;
  readonly orphans: readonly OrphanedOverwrite[];
}

const curtains = z.union([z.literal(1), z.literal(2)]);
const bar = z.number().int().positive().max(60);
const spacing = z.number().positive().max(2_000);

/** PATCH /api/buildings/:id/schedule/:rowId: whole cells, never text. */
export const schedulePatchSchema = z.strictObject({
  version: z.number().int(),
  vertical: z.strictObject({ curtains, bar, spacing }).optional(),
  horizontal: z.strictObject({ curtains, bar, spacing, end: z.enum(['hook', 'u-bar', 'in-core']) }).optional(),
  ends: z
    .strictObject({
      bar,
      count: z.number().int().min(2).max(80).multipleOf(2),
      length: z.number().positive().max(20_000),
    })
    .nullable()
    .optional(),
  ties: z
    .strictObject({
      bar,
      spacing,
      legsAlong: z.number().int().min(2).max(40),
      legsAcross: z.number().int().min(2).max(40),
      fromElevation: z.number(),
      toElevation: z.number(),
      kind: z.string().max(40),
    })
    .nullable()
    .optional(),
  laps: z
    .strictObject({
      web: z.number().positive().max(10_000).nullable(),
      ends: z.number().positive().max(10_000).nullable(),
      horizontal: z.number().positive().max(10_000).nullable(),
      splice: z.enum(['lap', 'coupler', 'no lap']),
    })
    .optional(),
  notes: z.array(z.string().max(300)).max(20).optional(),
  release: z.array(z.enum(['vertical', 'horizontal', 'ends', 'ties', 'laps', 'notes'])).optional(),
  reason: z.string().trim().max(500).optional(),
});
export type SchedulePatch = z.infer<typeof schedulePatchSchema>;

/** answer of the PATCH */
export interface SchedulePatchAnswer {
  /** null where an overwrite without stories was released: no row is left */
  readonly row: ScheduleResourceRow | null;
  readonly alsoChanged: readonly ScheduleResourceRow[];
  readonly seq: number;
}
