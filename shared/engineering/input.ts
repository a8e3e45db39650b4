/**
 * What a user typed, in the building's own units: the only form in which inputs are stored, sent and hashed.
 * `toModel` in model/ turns it into the kip-inch model; nothing is ever converted and converted back.
 */

export type UnitSystem = 'us' | 'si';
export type CodeEdition = 'aci318-19' | 'aci318-14';
export type LoadStandard = 'asce7-22' | 'asce7-16';
export type WallClass = 'ordinary' | 'special';
export type JointSurface = 'roughened' | 'plain';
export type Basis = 'rigid' | 'flexible' | 'compatible';
export type LoadKind = 'wind' | 'seismic' | 'other';

/** Bar numbers (5 = No. 5; SI: 16 = soft-metric No. 16) and spacings (in or mm) that the automatic choice may use. */
export interface BarList {
  readonly sizes: readonly number[];
  readonly spacings: readonly number[];
}

export interface BarLists {
  readonly web: BarList;
  readonly horizontal: BarList;
  readonly ends: BarList;
  readonly ties: BarList;
}

/** building.json with every default filled in. Units as in the contract: psi or MPa, ksi or MPa, pcf or kN/m3, in or mm. */
export interface Settings {
  readonly name: string;
  readonly number: string;
  readonly units: UnitSystem;
  readonly code: CodeEdition;
  readonly loads: LoadStandard;
  readonly wallClass: WallClass;
  /** psi or MPa */
  readonly fc: number;
  /** ksi or MPa */
  readonly fy: number;
  /** ksi or MPa */
  readonly fyt: number;
  readonly lambda: number;
  /** pcf or kN/m3 */
  readonly concreteWeight: number;
  readonly selfWeight: boolean;
  /** in or mm, to the outermost bar */
  readonly cover: number;
  /** in or mm, wall end to the first bar */
  readonly edge: number;
  readonly joint: JointSurface;
  /** in or mm */
  readonly slabThickness: number;
  readonly stiffness: {
    readonly flexure: number;
    readonly shear: number;
    readonly end: 'cantilever' | 'fixed';
    /** pcf or kN/m3; null: Ec from f'c alone */
    readonly unitWeight: number | null;
  };
  readonly basis: readonly (Basis | 'envelope')[];
  readonly accidental: number;
  readonly amplify: boolean;
  readonly orthogonal: number;
  readonly windCases: boolean;
  readonly liveReduction: boolean;
  readonly liveFactor: number;
  readonly kll: number;
  readonly sds: number;
  readonly rho: number;
  readonly omega0: number;
  readonly cd: number;
  readonly ie: number;
  readonly sdc: string | null;
  readonly riskCategory: 'I' | 'II' | 'III' | 'IV';
  readonly driftLimit: number | null;
  readonly windDriftFactor: number;
  readonly shearMethod: 'simplified' | 'detailed';
  readonly forcesAre: 'level-force' | 'story-shear';
  readonly forceLevel: 'strength' | 'service';
  readonly expectedBaseShear: Readonly<Record<string, number>>;
  readonly criticalLevel: Readonly<Record<string, string>>;
  /** rotation springs at wall bases by wall, kip-ft or kN-m per radian (an addition to the contract) */
  readonly baseSprings: Readonly<Record<string, number>>;
  /** in or mm */
  readonly oopEccentricity: number;
  readonly bandStories: number;
  readonly mergeShare: number;
  readonly bars: BarLists;
  /** names of the settings that were typed rather than taken from the defaults */
  readonly given: readonly string[];
}

/** ft or m unless said otherwise; rows from the top down unless elevations say otherwise. */
export interface LevelRow {
  readonly level: string;
  readonly height: number;
  readonly elevation: number | null;
  readonly x: number | null;
  readonly y: number | null;
  readonly extent_x: number | null;
  readonly extent_y: number | null;
  readonly edge_x: number | null;
  readonly edge_y: number | null;
  readonly diaphragm: 'rigid' | 'flexible' | null;
  /** kip or kN */
  readonly weight: number | null;
  /** kip or kN */
  readonly gravity: number | null;
}

export interface WallRow {
  readonly wall: string;
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
  /** in or mm */
  readonly thickness: number;
  readonly from_level: string;
  readonly to_level: string;
  /** psi or MPa */
  readonly fc: number | null;
  readonly share_x: number | null;
  readonly share_y: number | null;
  readonly opening: number | null;
  readonly flexure_factor: number | null;
  readonly shear_factor: number | null;
}

/** kip, kip-ft or kN, kN-m; x, y in ft or m */
export interface ForceRow {
  readonly level: string;
  readonly case: string;
  readonly kind: LoadKind;
  readonly fx: number;
  readonly fy: number;
  readonly x: number | null;
  readonly y: number | null;
  readonly mz: number | null;
}

/** kip or kN; area ft2 or m2; eccentricity ft or m toward (x2, y2) */
export interface GravityRow {
  readonly level: string;
  readonly wall: string;
  readonly dead: number;
  readonly live: number | null;
  readonly roof_live: number | null;
  readonly snow: number | null;
  readonly tributary_area: number | null;
  readonly eccentricity: number | null;
  readonly live_class: 'reducible' | 'heavy' | 'garage' | 'assembly' | 'storage' | null;
}

export interface CombinationRow {
  readonly name: string | null;
  readonly expression: string;
}

export interface OverrideRow {
  readonly kind: 'transfer' | 'share';
  readonly level: string;
  readonly wall: string;
  readonly case: string | null;
  readonly shear: number | null;
  readonly axial: number | null;
  readonly moment: number | null;
  readonly share: number | null;
  readonly reason: string;
}

export interface Tables {
  readonly levels: readonly LevelRow[];
  readonly walls: readonly WallRow[];
  readonly forces: readonly ForceRow[];
  readonly gravity: readonly GravityRow[];
  readonly combinations: readonly CombinationRow[];
  readonly overrides: readonly OverrideRow[];
}

export type TableName = keyof Tables;

/** Everything the engine starts from. */
export interface BuildingInput {
  readonly settings: Settings;
  readonly tables: Tables;
}

/**
 * A reason why a building is refused. `row` is 1 for the first data row of the table (its place in `Tables`, plus one);
 * the caller turns it into a file line or a row id. Null where no cell is to blame.
 */
export interface Problem {
  readonly table: TableName | 'building' | 'schedule';
  readonly row: number | null;
  readonly column: string | null;
  readonly message: string;
  readonly code?: 'not-designed-yet';
}

/** A named limit or plausibility warning of engineering.md section 8, or a notice. */
export interface Warning {
  readonly code: string;
  readonly level?: string;
  readonly wall?: string;
  readonly message: string;
  /** rows of the schedule that read `not settled` until an engineer has settled it; absent: none */
  readonly holds?: HeldRows;
  /** an engineer has settled it, on facts that still stand */
  readonly settled?: true;
}

/** Rows of these walls (null: of every wall) that stand in a story from the lowest to the highest level, both included. */
export interface HeldRows {
  readonly walls: readonly string[] | null;
  readonly from: string;
  readonly to: string;
}
