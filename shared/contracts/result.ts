import type { Basis, CodeEdition, LoadStandard, UnitSystem, Warning } from '../engineering/input.ts';
import type { BalanceLineName } from '../engineering/balance/balanceLines.ts';
import type { LapCell, ScheduleCells, TieCell } from '../engineering/wall-design/designTypes.ts';

/** result.json of the contract: the building's units, unrounded. */
export interface ResultDocument {
  readonly units: UnitSystem;
  readonly code: CodeEdition;
  readonly loads: LoadStandard;
  readonly basis: readonly (Basis | 'envelope')[];
  readonly engine: string;
  readonly warnings: readonly Warning[];
  readonly timing: Readonly<Record<string, number>>;
  readonly levels: readonly ResultLevel[];
  readonly rigidities: readonly { level: string; wall: string; k: number }[];
  readonly distribution: readonly ResultDistribution[];
  readonly drifts: readonly ResultDrift[];
  /** an addition to the contract: what the displaced outline is drawn from */
  readonly displacements: readonly ResultDisplacement[];
  readonly lateral: readonly ResultLateral[];
  readonly gravity: readonly { level: string; wall: string; case: string; axial: number; moment: number }[];
  readonly transferred: readonly ResultTransferred[];
  readonly actions: readonly ResultAction[];
  readonly checks: readonly ResultCheck[];
  readonly schedule: readonly ResultRow[];
  readonly quantities: ResultQuantities;
  readonly balance: readonly ResultBalance[];
}

export type Variant = '0' | '+' | '-';

export interface ResultLevel {
  readonly level: string;
  readonly elevation: number;
  readonly height: number;
  readonly rigidity: { readonly x: number; readonly y: number } | null;
  readonly force: Readonly<Record<string, { fx: number; fy: number; mz: number }>>;
  readonly shear: Readonly<Record<string, { vx: number; vy: number; mz: number }>>;
  /** the level's own point and extent as used, ft or m (an addition to the contract) */
  readonly point: { readonly x: number; readonly y: number };
  readonly extent: { readonly x: number; readonly y: number; readonly edgeX: number; readonly edgeY: number };
}

export interface ResultDistribution {
  readonly basis: Basis;
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
  readonly wall: string;
  readonly direct?: number;
  readonly torsional?: number;
  readonly total: number;
}

export interface ResultDrift {
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
  readonly x: number | null;
  readonly y: number | null;
  readonly edge: number | null;
  readonly torsionRatio: number | null;
  readonly ax: number | null;
  readonly theta: number | null;
}

/** at the level's own point: in or mm, and radians */
export interface ResultDisplacement {
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
  readonly x: number;
  readonly y: number;
  readonly rotation: number;
}

export interface ResultLateral {
  readonly basis: Basis;
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
  readonly wall: string;
  readonly shear: number;
  readonly moment: number;
}

export interface ResultTransferred {
  readonly basis: Basis;
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
  readonly wall: string;
  readonly axial: number;
  readonly shear: number;
  readonly moment: number;
}

export interface ResultAction {
  readonly basis: Basis;
  readonly level: string;
  readonly wall: string;
  readonly combination: string;
  readonly axial: number;
  readonly moment: number;
  readonly shear: number;
}

export interface ResultCheck {
  readonly basis: Basis | 'envelope';
  readonly level: string;
  readonly wall: string;
  readonly check: string;
  readonly demand: number;
  readonly capacity: number | null;
  readonly unit: string;
  readonly ratio: number | null;
  readonly clause: string;
  readonly combination: string | null;
  readonly ok: boolean;
}

export type RowState = 'ok' | 'over' | 'not settled';

export interface ResultRow {
  readonly wall: string;
  readonly from: string;
  readonly to: string;
  readonly levels: string;
  readonly thickness: number;
  readonly fc: number;
  readonly vertical: ScheduleCells['vertical'];
  readonly horizontal: ScheduleCells['horizontal'];
  readonly ends: ScheduleCells['ends'];
  readonly ties: TieCell | null;
  readonly laps: LapCell;
  readonly extendAbove: number | null;
  readonly dowels: { bar: number; count: number | null; spacing: number | null; embedment: number } | null;
  readonly joint: string;
  readonly trim: string | null;
  readonly notes: readonly string[];
  readonly notDesigned: readonly string[];
  readonly ratio: number | null;
  readonly governs: {
    check: string;
    clause: string;
    combination: string | null;
    level: string;
    basis: Basis;
  } | null;
  readonly ok: boolean;
  readonly state: RowState;
}

export interface ResultQuantities {
  readonly concrete: number;
  readonly steel: number;
  readonly rate: number;
  readonly walls: readonly {
    wall: string;
    concrete: number;
    steel: number;
    rate: number;
    bands: readonly { from: string; to: string; concrete: number; steel: number; rate: number }[];
  }[];
}

export interface ResultBalance {
  readonly basis: Basis;
  readonly case: string;
  readonly variant: Variant;
  readonly level: string;
  readonly residual: number;
  /** the four lines behind the residual (an addition to the contract) */
  readonly lines: readonly {
    line: BalanceLineName;
    applied: number;
    resisted: number;
  }[];
}
