import { z } from 'zod';

/** POST /api/buildings/:id/acknowledgments: settles the warnings of this code, level and wall. */
export const acknowledgmentSchema = z.strictObject({
  code: z.string().trim().min(1).max(60),
  level: z.string().min(1).max(500).nullish(),
  wall: z.string().min(1).max(500).nullish(),
  reason: z
    .string()
    .trim()
    .min(1)
    .max(2000)
    .regex(/^[^\p{Cc}]*$/u),
});
export type AcknowledgmentBody = z.infer<typeof acknowledgmentSchema>;

export interface AcknowledgmentRow {
  readonly id: string;
  readonly code: string;
  readonly level: string | null;
  readonly wall: string | null;
  readonly reason: string;
  /** short name of the facts as they stood; the page's own computation asks for it */
  readonly factsHash: string;
  readonly by: { readonly id: string; readonly name: string };
  readonly at: string;
  /** whether the facts still stand; false: it has lapsed; null: the building does not compute */
  readonly stands: boolean | null;
}

/** GET /api/buildings/:id/acknowledgments */
export interface AcknowledgmentList {
  readonly rows: readonly AcknowledgmentRow[];
  readonly seq: number;
}
