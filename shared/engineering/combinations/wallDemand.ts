import type { Basis } from '../input.ts';
import type { Model } from '../model/model.ts';
import type { GravityTakedown } from '../takedown/gravityTakedown.ts';
import type { WallDemand, WallForces, WallStory } from '../wall-design/designTypes.ts';

import type { ExpandedCombination } from './expandCombinations.ts';

/** Lateral results of one basis, `[action][story][wall]`, kip and kip-in. */
export interface BasisForces {
  readonly basis: Basis;
  readonly shearKip: Float64Array;
  readonly momentKipIn: Float64Array;
  /** axial from assigned transfers; null where there is none */
  readonly axialKip: Float64Array | null;
  readonly expansions: readonly ExpandedCombination[];
}

/**
 * Factored axial, moment and shear of one wall as columns over (expansion, story of the wall), every basis. Signs are kept;
 * compression positive.
 */
export function wallDemand(
  model: Model,
  gravity: GravityTakedown,
  bases: readonly BasisForces[],
  gravitySetCount: number,
  wallIndex: number,
): WallDemand {
  const wall = model.walls[wallIndex];
  if (!wall) throw new RangeError(`no wall ${wallIndex}`);
  const stories = wall.segments.map((segment): WallStory => {
    const story = model.stories[segment.story];
    if (!story) throw new RangeError(`no story ${segment.story}`);
    return {
      story: segment.story,
      level: story.level,
      heightIn: story.heightIn,
      bottomElevationIn: story.bottomElevationIn,
      topElevationIn: story.elevationIn,
      lengthIn: segment.lengthIn,
      thicknessIn: segment.thicknessIn,
      fcPsi: segment.fcPsi,
    };
  });
  const at = (story: number) => story * model.walls.length + wallIndex;
  return {
    wall: wall.name,
    stories,
    heightIn: wall.heightIn,
    gravitySetCount,
    forces: bases.map((basis) => factoredForces(model, gravity, basis, wallIndex)),
    deadKip: Float64Array.from(stories, ({ story }) => gravity.axialKip.D[at(story)] ?? 0),
  };
}

function factoredForces(model: Model, gravity: GravityTakedown, basis: BasisForces, wallIndex: number): WallForces {
  const { expansions } = basis;
  const wall = model.walls[wallIndex];
  const count = wall?.segments.length ?? 0;
  const walls = model.walls.length;
  const first = (wall?.fromStory ?? 0) * walls + wallIndex;
  const axialKip = new Float64Array(expansions.length * count);
  const momentKipIn = new Float64Array(expansions.length * count);
  const shearKip = new Float64Array(expansions.length * count);
  const vertical = new Map<number, GravityForces>();
  const sideways = new Map<ExpandedCombination['lateral'], LateralForces>();
  expansions.forEach((expansion, index) => {
    const { gravitySet, lateral } = expansion;
    let down = vertical.get(gravitySet);
    if (!down) {
      down = gravityForces(gravity, expansion, first, walls, count);
      vertical.set(gravitySet, down);
    }
    let across = sideways.get(lateral);
    if (!across) {
      across = lateralForces(basis, lateral, model.stories.length * walls, first, walls, count);
      sideways.set(lateral, across);
    }
    const target = index * count;
    for (let story = 0; story < count; story += 1) {
      const axial = down.axialKip[story] as number;
      axialKip[target + story] = across.axialKip ? axial + (across.axialKip[story] as number) : axial;
      momentKipIn[target + story] = (down.momentKipIn[story] as number) + (across.momentKipIn[story] as number);
      shearKip[target + story] = across.shearKip[story] as number;
    }
  });
  return { basis: basis.basis, expansions, axialKip, momentKipIn, shearKip };
}

interface GravityForces {
  readonly axialKip: Float64Array;
  readonly momentKipIn: Float64Array;
}

interface LateralForces {
  /** null where no transfer brings axial */
  readonly axialKip: Float64Array | null;
  readonly momentKipIn: Float64Array;
  readonly shearKip: Float64Array;
}

/** Gravity of one set of factors in every story of a wall: once a set, since many expansions share it. */
function gravityForces(
  gravity: GravityTakedown,
  { factors, fullL }: ExpandedCombination,
  first: number,
  walls: number,
  count: number,
): GravityForces {
  const { axialKip: axial, momentKipIn: moment, fullLive: full } = gravity;
  const axialKip = new Float64Array(count);
  const momentKipIn = new Float64Array(count);
  for (let story = 0; story < count; story += 1) {
    const source = first + story * walls;
    axialKip[story] =
      factors.D * (axial.D[source] ?? 0) +
      factors.L * (axial.L[source] ?? 0) +
      factors.Lr * (axial.Lr[source] ?? 0) +
      factors.S * (axial.S[source] ?? 0) +
      (fullL - factors.L) * (full.axialKip[source] ?? 0);
    momentKipIn[story] =
      factors.D * (moment.D[source] ?? 0) +
      factors.L * (moment.L[source] ?? 0) +
      factors.Lr * (moment.Lr[source] ?? 0) +
      factors.S * (moment.S[source] ?? 0) +
      (fullL - factors.L) * (full.momentKipIn[source] ?? 0);
  }
  return { axialKip, momentKipIn };
}

/** Lateral actions of one list of parts in every story of a wall: once a list. */
function lateralForces(
  basis: BasisForces,
  lateral: ExpandedCombination['lateral'],
  plane: number,
  first: number,
  walls: number,
  count: number,
): LateralForces {
  const axialKip = basis.axialKip ? new Float64Array(count) : null;
  const momentKipIn = new Float64Array(count);
  const shearKip = new Float64Array(count);
  for (const { action, factor } of lateral) {
    for (let story = 0; story < count; story += 1) {
      const source = action * plane + first + story * walls;
      momentKipIn[story] = (momentKipIn[story] as number) + factor * (basis.momentKipIn[source] ?? 0);
      shearKip[story] = (shearKip[story] as number) + factor * (basis.shearKip[source] ?? 0);
      if (axialKip && basis.axialKip)
        axialKip[story] = (axialKip[story] as number) + factor * (basis.axialKip[source] ?? 0);
    }
  }
  return { axialKip, momentKipIn, shearKip };
}
