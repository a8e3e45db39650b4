import type { Model } from '../model/model.ts';

import type { CholeskyFactor } from './cholesky.ts';
import { choleskyFactor, choleskySolve } from './cholesky.ts';
import type { LateralAction } from './lateralActions.ts';
import { wallStiffness } from './wallStiffness.ts';

/** The whole building ready to be loaded: floors rigid in plane, three displacements a floor about `centerXIn`, `centerYIn`. */
export interface WholeHeight {
  readonly centerXIn: number;
  readonly centerYIn: number;
  readonly factor: CholeskyFactor;
  /** one a wall: condensed stiffness at its floors */
  readonly stiffness: readonly Float64Array[];
}

/** What one action does to the building. */
export interface WholeHeightSolution {
  /** `[floor]`, in and rad, at the point (centerXIn, centerYIn) */
  readonly uxIn: Float64Array;
  readonly uyIn: Float64Array;
  readonly rotation: Float64Array;
}

/** Why a building has no whole-height solution: the walls that stand on a floor, or that some floor can move freely. */
export type NoWholeHeight = { readonly walls: readonly string[] } | { readonly walls: null };

/**
 * Assembles the whole height (engineering.md section 3.3): every wall a Timoshenko cantilever fixed at its base or on its
 * rotation spring (`baseSprings`, kip-in/rad by wall name). A wall that starts above the base can't be in it.
 */
export function assembleWholeHeight(
  model: Model,
  baseSprings: ReadonlyMap<string, number>,
): WholeHeight | NoWholeHeight {
  const above = model.walls.filter((wall) => wall.fromStory > 0).map(({ name }) => name);
  if (above.length > 0) return { walls: above };
  const floors = model.stories.length;
  const bases = model.walls.flatMap((wall) => wall.segments.slice(0, 1));
  const centerXIn = bases.reduce((sum, segment) => sum + segment.centroidXIn, 0) / Math.max(1, bases.length);
  const centerYIn = bases.reduce((sum, segment) => sum + segment.centroidYIn, 0) / Math.max(1, bases.length);
  const size = 3 * floors;
  const matrix = new Float64Array(size * size);
  const stiffness = model.walls.map((wall) => wallStiffness(model, wall, baseSprings.get(wall.name) ?? null));
  model.walls.forEach((wall, index) => {
    const own = stiffness[index];
    const direction = directionOf(model, index, centerXIn, centerYIn);
    const count = wall.segments.length;
    if (!own) return;
    for (let row = 0; row < count; row += 1) {
      for (let column = 0; column < count; column += 1) {
        const k = own[row * count + column] as number;
        for (let i = 0; i < 3; i += 1) {
          for (let j = 0; j < 3; j += 1) {
            const at = (3 * row + i) * size + 3 * column + j;
            matrix[at] = (matrix[at] as number) + k * (direction[i] as number) * (direction[j] as number);
          }
        }
      }
    }
  });
  const factor = choleskyFactor(matrix, size);
  return factor === null ? { walls: null } : { centerXIn, centerYIn, factor, stiffness };
}

/** (c, s, b): what a wall's line takes of a floor's three displacements; b = x s - y c about the center. */
function directionOf(
  model: Model,
  wallIndex: number,
  centerXIn: number,
  centerYIn: number,
): readonly [number, number, number] {
  const segment = model.walls[wallIndex]?.segments[0];
  if (!segment) return [0, 0, 0];
  const { cos, sin, centroidXIn, centroidYIn } = segment;
  return [cos, sin, (centroidXIn - centerXIn) * sin - (centroidYIn - centerYIn) * cos];
}

/**
 * Wall shears (`[story * walls + wall]`, kip) and floor displacements under one action. The forces get one refinement pass: what the
 * summed wall forces leave of the floor loads is solved for once more and added to the forces, so that equilibrium holds to the
 * last digits at any height.
 */
export function solveWholeHeight(
  model: Model,
  whole: WholeHeight,
  action: LateralAction,
): { readonly shearKip: Float64Array; readonly displacement: WholeHeightSolution } {
  const floors = model.stories.length;
  const load = floorLoads(action, floors, whole.centerXIn, whole.centerYIn);
  const floorKip = new Float64Array(floors * model.walls.length);
  const displacement = new Float64Array(3 * floors);
  let right = load;
  for (let pass = 0; pass < 2; pass += 1) {
    const step = choleskySolve(whole.factor, right);
    for (let index = 0; index < step.length; index += 1) {
      displacement[index] = (displacement[index] as number) + (step[index] as number);
    }
    addWallForces(model, whole, step, floorKip);
    right = remainder(model, whole, load, floorKip);
  }
  const shearKip = new Float64Array(floors * model.walls.length);
  model.walls.forEach((wall, wallIndex) => {
    let shear = 0;
    for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
      shear += floorKip[story * model.walls.length + wallIndex] as number;
      shearKip[story * model.walls.length + wallIndex] = shear;
    }
  });
  const part = (offset: number) =>
    Float64Array.from({ length: floors }, (_, floor) => displacement[3 * floor + offset] as number);
  return { shearKip, displacement: { uxIn: part(0), uyIn: part(1), rotation: part(2) } };
}

/** Loads at the floors, from the differences of the story actions; torque about the center. */
function floorLoads(action: LateralAction, floors: number, centerXIn: number, centerYIn: number): Float64Array {
  const load = new Float64Array(3 * floors);
  for (let floor = 0; floor < floors; floor += 1) {
    const fx = action.levelFxKip[floor] ?? 0;
    const fy = action.levelFyKip[floor] ?? 0;
    load[3 * floor] = fx;
    load[3 * floor + 1] = fy;
    load[3 * floor + 2] = (action.levelTorqueKipIn[floor] ?? 0) - (centerXIn * fy - centerYIn * fx);
  }
  return load;
}

function addWallForces(model: Model, whole: WholeHeight, step: Float64Array, floorKip: Float64Array): void {
  const walls = model.walls.length;
  model.walls.forEach((wall, wallIndex) => {
    const own = whole.stiffness[wallIndex];
    const [c, s, b] = directionOf(model, wallIndex, whole.centerXIn, whole.centerYIn);
    const count = wall.segments.length;
    if (!own) return;
    const along = new Float64Array(count);
    for (let floor = 0; floor < count; floor += 1) {
      along[floor] =
        c * (step[3 * floor] as number) + s * (step[3 * floor + 1] as number) + b * (step[3 * floor + 2] as number);
    }
    for (let row = 0; row < count; row += 1) {
      let force = 0;
      for (let column = 0; column < count; column += 1)
        force += (own[row * count + column] as number) * (along[column] as number);
      const at = row * walls + wallIndex;
      floorKip[at] = (floorKip[at] as number) + force;
    }
  });
}

function remainder(model: Model, whole: WholeHeight, load: Float64Array, floorKip: Float64Array): Float64Array {
  const rest = load.slice();
  const walls = model.walls.length;
  model.walls.forEach((wall, wallIndex) => {
    const direction = directionOf(model, wallIndex, whole.centerXIn, whole.centerYIn);
    for (let floor = 0; floor < wall.segments.length; floor += 1) {
      const force = floorKip[floor * walls + wallIndex] as number;
      for (let part = 0; part < 3; part += 1) {
        const at = 3 * floor + part;
        rest[at] = (rest[at] as number) - force * (direction[part] as number);
      }
    }
  });
  return rest;
}
