import type { Basis } from '../input.ts';
import type { ModelSettings } from '../model/model.ts';

/**
 * The seam between analysis and design. Forces of one wall arrive as columns over (expansion, story); the design answers with
 * schedule rows in the building's own units (they are what is printed, typed and stored) and checks in kip and inch.
 */

/** One expanded combination: every sign, case, variant and alternative written out. */
export interface Expansion {
  /** readable, for example `1.2D + 1.0W + 1.0L + 0.5Lr: WX negative` */
  readonly name: string;
  readonly seismic: boolean;
  readonly wind: boolean;
  readonly factors: { readonly D: number; readonly L: number; readonly Lr: number; readonly S: number };
  /** expansions with the same gravity factors share one axial load: index into `gravitySets` */
  readonly gravitySet: number;
}

export interface WallStory {
  readonly story: number;
  readonly level: string;
  readonly heightIn: number;
  readonly bottomElevationIn: number;
  readonly topElevationIn: number;
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
}

/** Column index = expansion * stories.length + story (0 = the wall's lowest). Compression positive, signs kept. */
export interface WallForces {
  readonly basis: Basis;
  /** the flexible basis knows no accidental eccentricity, so that each basis has its own list */
  readonly expansions: readonly Expansion[];
  readonly axialKip: Float64Array;
  readonly momentKipIn: Float64Array;
  readonly shearKip: Float64Array;
}

export interface WallDemand {
  readonly wall: string;
  /** from the wall's base up */
  readonly stories: readonly WallStory[];
  /** hw: base to the wall's own top */
  readonly heightIn: number;
  readonly gravitySetCount: number;
  /** one per basis */
  readonly forces: readonly WallForces[];
  /** unfactored dead load at the bottom of each story, for the joint */
  readonly deadKip: Float64Array;
}

export type HorizontalEnd = 'hook' | 'u-bar' | 'in-core';

/** Bars by number (US 5 = No. 5; SI 16 = soft-metric No. 16); spacings, lengths and laps in or mm, the building's own. */
export interface ScheduleCells {
  readonly vertical: { readonly curtains: 1 | 2; readonly bar: number; readonly spacing: number };
  readonly horizontal: {
    readonly curtains: 1 | 2;
    readonly bar: number;
    readonly spacing: number;
    readonly end: HorizontalEnd;
  };
  readonly ends: null | { readonly bar: number; readonly count: number; readonly length: number };
  readonly ties: null | TieCell;
  readonly laps: LapCell;
  readonly notes: readonly string[];
}

export interface TieCell {
  readonly bar: number;
  readonly spacing: number;
  readonly legsAlong: number;
  readonly legsAcross: number;
  /** ft or m */
  readonly fromElevation: number;
  readonly toElevation: number;
  readonly kind: string;
}

export interface LapCell {
  /** in or mm; null: none of these bars */
  readonly web: number | null;
  readonly ends: number | null;
  readonly horizontal: number | null;
  readonly splice: 'lap' | 'coupler' | 'no lap';
}

export const overwritableCells = ['vertical', 'horizontal', 'ends', 'ties', 'laps', 'notes'] as const;
export type OverwritableCell = (typeof overwritableCells)[number];
export type OwnCells = { readonly [C in OverwritableCell]?: ScheduleCells[C] };

/** Stories that carry an engineer's own cells. They break bands at both ends and keep their cells whatever the inputs do. */
export interface PinnedBand {
  readonly wall: string;
  readonly fromLevel: string;
  readonly toLevel: string;
  readonly own: OwnCells;
}

/** What a number in a check measures; the result writer turns it into the building's units. */
export type CheckQuantity = 'force' | 'moment' | 'barLength' | 'steelRatio' | 'count' | 'stress' | 'none';

export interface Check {
  readonly basis: Basis;
  readonly level: string;
  readonly wall: string;
  /** flexure, shear, shear-limit, horizontal-steel, vertical-steel, spacing, curtains, thickness, axial, ties, joint, fit, splice ... */
  readonly check: string;
  readonly demand: number;
  /** null: no capacity exists at this axial load; the check fails */
  readonly capacity: number | null;
  readonly quantity: CheckQuantity;
  /** null where the capacity is null or zero */
  readonly ratio: number | null;
  readonly clause: string;
  /** null where no combination is to blame (spacing, fit ...) */
  readonly combination: string | null;
  readonly ok: boolean;
}

export interface DesignRow {
  readonly wall: string;
  /** lowest and highest story of the band */
  readonly from: string;
  readonly to: string;
  /** what stands: automatic, with the engineer's own cells put over it */
  readonly cells: ScheduleCells;
  /** what automatic choice says for the same band */
  readonly automatic: ScheduleCells;
  readonly overwritten: readonly OverwritableCell[];
  /** in or mm */
  readonly extendAbove: number | null;
  readonly dowels: null | {
    readonly bar: number;
    readonly count: number | null;
    readonly spacing: number | null;
    readonly embedment: number;
  };
  readonly joint: string;
  readonly trim: string | null;
  readonly notDesigned: readonly string[];
  /** worst of every check; null where one has no ratio because nothing resists */
  readonly ratio: number | null;
  readonly governs: null | {
    readonly check: string;
    readonly clause: string;
    readonly combination: string | null;
    readonly level: string;
    readonly basis: Basis;
  };
  readonly ok: boolean;
  /** in3 and lb (laps included) */
  readonly concreteIn3: number;
  readonly steelLb: number;
}

export interface WallDesign {
  readonly wall: string;
  /** from the top band down, as a schedule is read */
  readonly rows: readonly DesignRow[];
  readonly checks: readonly Check[];
}

/** Designs one wall: bands, automatic choice, own cells, checks. Pure and deterministic. */
export type DesignWall = (demand: WallDemand, settings: ModelSettings, pinned: readonly PinnedBand[]) => WallDesign;
