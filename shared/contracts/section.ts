import { z } from 'zod';

const positive = z.number().gt(0).max(1e9);
const finite = z.number().min(-1e12).max(1e12);
const curtains = z.union([z.literal(1), z.literal(2)]);
const bar = z.number().int().positive().max(60);

/**
 * One wall section by itself, the file of `takedown --section`. Units as in building.json: `length`, `height` (story) and `totalHeight` (hw)
 * in ft or m; thickness, spacings, edge, positions in in or mm; areas in in2 or mm2; actions in kip and kip-ft or kN and kN-m.
 */
export const sectionFileSchema = z.object({
  units: z.enum(['us', 'si']),
  code: z.enum(['aci318-19', 'aci318-14']).default('aci318-19'),
  wallClass: z.enum(['ordinary', 'special']).default('ordinary'),
  fc: positive.optional(),
  fy: positive.optional(),
  fyt: positive.optional(),
  lambda: z.number().gt(0).max(1).default(1),
  length: positive,
  height: positive,
  /** default: `height` */
  totalHeight: positive.optional(),
  thickness: positive,
  edge: positive.optional(),
  cover: positive.optional(),
  shearMethod: z.enum(['simplified', 'detailed']).default('simplified'),
  atBase: z.boolean().default(true),
  oopEccentricity: z.number().min(0).max(1e6).default(0),
  joint: z.enum(['roughened', 'plain']).default('roughened'),
  /** unfactored dead load on the joint; without it the joint is not judged (an addition to the contract) */
  dead: finite.optional(),
  vertical: z.object({ curtains, bar, spacing: positive }).optional(),
  horizontal: z
    .object({ curtains, bar, spacing: positive, end: z.enum(['hook', 'u-bar', 'in-core']).optional() })
    .optional(),
  ends: z.object({ bar, count: z.number().int().min(2).max(200).multipleOf(2), length: positive }).nullish(),
  /** ties around the end-zone bars (an addition to the contract) */
  ties: z.object({ bar, spacing: positive }).nullish(),
  layers: z
    .array(z.object({ position: z.number().min(0).max(1e9), area: positive }))
    .min(1)
    .max(2000)
    .optional(),
  actions: z
    .array(z.object({ axial: finite, moment: finite, shear: finite.default(0) }))
    .min(1)
    .max(10_000),
});
export type SectionFile = z.infer<typeof sectionFileSchema>;

export interface SectionProblem {
  readonly column: string | null;
  readonly message: string;
  readonly code?: 'not-designed-yet';
}

/** Strength of the section at one action's axial force, in the file's units; null outside the axial limits. */
export interface SectionFlexure {
  readonly axial: number;
  readonly phi: number | null;
  /** in or mm, at phi Pn = Pu */
  readonly c: number | null;
  readonly phiMn: number | null;
  readonly mn: number | null;
  /** at Pn = Pu, phi 1 */
  readonly cNominal: number | null;
  readonly mnNominal: number | null;
  /** the same with 1.25 fy */
  readonly mpr: number | null;
}

export interface SectionShear {
  readonly vc: number;
  readonly vs: number;
  readonly vn: number;
  readonly phiVn: number;
  /** 8 sqrt(f'c) Acv, without phi */
  readonly limit: number;
}

export interface SectionCheck {
  readonly check: string;
  readonly demand: number;
  readonly capacity: number | null;
  readonly unit: string;
  readonly ratio: number | null;
  readonly clause: string;
  /** `action 1` is the first of the file */
  readonly combination: string | null;
  readonly ok: boolean;
}

export interface SectionOutput {
  readonly checks: readonly SectionCheck[];
  /** one an action, in their order */
  readonly flexure: readonly SectionFlexure[];
  readonly shear: readonly SectionShear[];
  /** keys of the file that say nothing here */
  readonly ignored: readonly string[];
}
