import type { BarLists, Basis, CodeEdition, JointSurface, LoadKind, UnitSystem, WallClass } from '../input.ts';

/**
 * The engine's own building: kip, inch, ksi; f'c in psi. Stories are numbered from the base: story 0 stands on the base and
 * its level is the lowest floor. Walls keep the order in which their names first appear.
 */
export interface Model {
  readonly settings: ModelSettings;
  readonly stories: readonly Story[];
  readonly walls: readonly WallLine[];
  readonly cases: readonly LoadCase[];
  readonly gravity: GravityColumns;
  readonly overrides: readonly Override[];
}

/** An engineer's transfer or share, in engine units; `caseName` null: every case. */
export interface Override {
  readonly kind: 'transfer' | 'share';
  readonly story: number;
  readonly wallIndex: number;
  readonly caseName: string | null;
  readonly shearKip: number;
  readonly axialKip: number;
  readonly momentKipIn: number;
  /** part of the story shear along the wall's own direction */
  readonly share: number;
}

export interface ModelSettings {
  readonly units: UnitSystem;
  readonly code: CodeEdition;
  readonly wallClass: WallClass;
  readonly fyKsi: number;
  readonly fytKsi: number;
  readonly lambda: number;
  readonly coverIn: number;
  readonly edgeIn: number;
  readonly joint: JointSurface;
  readonly slabThicknessIn: number;
  readonly flexureFactor: number;
  readonly shearFactor: number;
  readonly endFactor: 3 | 12;
  /** pcf; null: Ec = 57,000 sqrt(f'c) */
  readonly stiffnessWeightPcf: number | null;
  readonly selfWeight: boolean;
  readonly concreteWeightPcf: number;
  readonly basis: readonly (Basis | 'envelope')[];
  readonly accidental: number;
  readonly amplify: boolean;
  readonly orthogonal: number;
  readonly windCases: boolean;
  readonly liveReduction: boolean;
  readonly kll: number;
  readonly cd: number;
  readonly ie: number;
  readonly driftLimit: number;
  readonly windDriftFactor: number;
  /** what turns a typed wind or seismic force into strength level: 1, or 1/0.6 and 1/0.7 for service forces */
  readonly strengthFactor: { readonly wind: number; readonly seismic: number };
  /** rotation springs at wall bases, kip-in/rad */
  readonly baseSprings: ReadonlyMap<string, number>;
  readonly liveFactor: number;
  readonly sds: number;
  readonly rho: number;
  readonly omega0: number;
  readonly oopEccentricityIn: number;
  readonly bandStories: number;
  /** sizes are bar numbers, spacings in the building's own unit (in or mm) */
  readonly bars: BarLists;
}

export interface Story {
  readonly level: string;
  readonly heightIn: number;
  /** elevation of the floor at the top of the story */
  readonly elevationIn: number;
  readonly bottomElevationIn: number;
  /** the level's own point: where its force acts unless a force row says otherwise */
  readonly xIn: number;
  readonly yIn: number;
  readonly extentXIn: number;
  readonly extentYIn: number;
  readonly edgeXIn: number;
  readonly edgeYIn: number;
  /** D + 0.5L of the whole floor, for stability; null where it is not given */
  readonly gravityKip: number | null;
  /** true where the extent had to be taken from the wall ends */
  readonly extentAssumed: boolean;
}

export interface WallLine {
  readonly name: string;
  readonly fromStory: number;
  readonly toStory: number;
  /** one a story, `segments[story - fromStory]` */
  readonly segments: readonly WallSegment[];
  /** from the wall's base to its own top */
  readonly heightIn: number;
}

export interface WallSegment {
  readonly story: number;
  readonly x1In: number;
  readonly y1In: number;
  readonly x2In: number;
  readonly y2In: number;
  /** unit direction from end 1 to end 2 */
  readonly cos: number;
  readonly sin: number;
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  /** fraction of the face that is open, for self-weight only */
  readonly opening: number;
  readonly flexureFactor: number;
  readonly shearFactor: number;
  /** parts of Fx and Fy that the wall takes in the flexible basis; null where the row gives neither */
  readonly shares: { readonly x: number; readonly y: number } | null;
  readonly centroidXIn: number;
  readonly centroidYIn: number;
}

export interface LoadCase {
  readonly name: string;
  readonly kind: LoadKind;
  /** at each story's level: force and moment about the vertical through the origin; `[story]` */
  readonly fxKip: Float64Array;
  readonly fyKip: Float64Array;
  /** Mz + x Fy - y Fx */
  readonly torqueKipIn: Float64Array;
  /** mz as given, without the lever of the force */
  readonly mzKipIn: Float64Array;
  /** seismic only: the direction of the larger total force */
  readonly direction: 'x' | 'y';
}

export const gravityCases = ['D', 'L', 'Lr', 'S'] as const;
export type GravityCase = (typeof gravityCases)[number];

/** Gravity brought in at each level, wall by wall: `[case][story * walls + wall]`; moment = axial x eccentricity. */
export interface GravityColumns {
  readonly axialKip: Readonly<Record<GravityCase, Float64Array>>;
  readonly momentKipIn: Readonly<Record<GravityCase, Float64Array>>;
  /** live load that may be reduced, with its area and its number of floors; the rest of L may not */
  readonly reducible: {
    readonly axialKip: Float64Array;
    readonly momentKipIn: Float64Array;
    readonly areaIn2: Float64Array;
    readonly floors: Float64Array;
  };
  /** live load whose factor in the standard's combinations never falls below 1.0 (heavy, garage, assembly, storage) */
  readonly full: { readonly axialKip: Float64Array; readonly momentKipIn: Float64Array };
}
