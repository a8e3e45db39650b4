import type { UnitSystem } from '../engineering/input.ts';

export interface PlanPoint {
  readonly x: number;
  readonly y: number;
}

/** One wall of the story: ft or m in plan and thickness, kip or kN along (x1, y1) to (x2, y2). */
export interface PlanWall {
  readonly name: string;
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
  readonly thickness: number;
  readonly direct: number;
  readonly torsional: number;
  readonly total: number;
  /** part of the story shear; null where the story has none */
  readonly share: number | null;
}

/** Of the floor at the level's own point, in the plan's unit of length, and radians counterclockwise. */
export interface PlanDisplacement {
  readonly x: number;
  readonly y: number;
  readonly rotation: number;
}

export interface PlanInput {
  readonly units: UnitSystem;
  /** px to draw in */
  readonly width: number;
  readonly extent: { readonly x: number; readonly y: number; readonly edgeX: number; readonly edgeY: number };
  readonly walls: readonly PlanWall[];
  readonly mass: PlanPoint;
  /** what the level's own point is called: center of mass, point of the force */
  readonly massName: string;
  readonly rigidity: PlanPoint | null;
  /** story shear of the case; the text stands at the head of its arrow */
  readonly force: { readonly x: number; readonly y: number; readonly text: string; readonly note: string } | null;
  readonly chosenWall: string | null;
  /** draws the slab as the case moves it, exaggerated */
  readonly displaced?: PlanDisplacement;
}
