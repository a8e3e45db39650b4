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
  const from = wall?.fromStory ?? 0;
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const axialKip = new Float64Array(expansions.length * count);
  const momentKipIn = new Float64Array(expansions.length * count);
  const shearKip = new Float64Array(expansions.length * count);
  const { axialKip: axial, momentKipIn: moment, fullLive: full } = gravity;
  expansions.forEach(({ factors, fullL, lateral }, expansion) => {
    for (let story = 0; story < count; story += 1) {
      const source = (from + story) * walls + wallIndex;
      const target = expansion * count + story;
      let p =
        factors.D * (axial.D[source] ?? 0) +
        factors.L * (axial.L[source] ?? 0) +
        factors.Lr * (axial.Lr[source] ?? 0) +
        factors.S * (axial.S[source] ?? 0) +
        (fullL - factors.L) * (full.axialKip[source] ?? 0);
      let m =
        factors.D * (moment.D[source] ?? 0) +
        factors.L * (moment.L[source] ?? 0) +
        factors.Lr * (moment.Lr[source] ?? 0) +
        factors.S * (moment.S[source] ?? 0) +
        (fullL - factors.L) * (full.momentKipIn[source] ?? 0);
      let v = 0;
      for (const part of lateral) {
        m += part.factor * (basis.momentKipIn[part.action * plane + source] ?? 0);
        v += part.factor * (basis.shearKip[part.action * plane + source] ?? 0);
        if (basis.axialKip) p += part.factor * (basis.axialKip[part.action * plane + source] ?? 0);
      }
      axialKip[target] = p;
      momentKipIn[target] = m;
      shearKip[target] = v;
    }
  });
  return { basis: basis.basis, expansions, axialKip, momentKipIn, shearKip };
}
