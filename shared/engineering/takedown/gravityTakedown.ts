import type { GravityCase, Model } from '../model/model.ts';
import { gravityCases } from '../model/model.ts';
import { poundsPerKip } from '../units.ts';

const cubicInchesPerCubicFoot = 1728;

/** Summed over levels at and above, at the bottom of each story; `[story * walls + wall]`, kip and kip-in. */
export interface GravityTakedown {
  readonly axialKip: Readonly<Record<GravityCase, Float64Array>>;
  readonly momentKipIn: Readonly<Record<GravityCase, Float64Array>>;
  /** self-weight of each story's wall alone, kip */
  readonly selfWeightKip: Float64Array;
}

/**
 * Self-weight of each wall in each story, kip: t l h w (1 - opening), once; zero where it is not asked for.
 */
export function selfWeights(model: Model): Float64Array {
  const { settings, stories, walls } = model;
  const weights = new Float64Array(stories.length * walls.length);
  if (!settings.selfWeight) return weights;
  walls.forEach((wall, wallIndex) => {
    for (const segment of wall.segments) {
      const height = stories[segment.story]?.heightIn ?? 0;
      const volumeIn3 = segment.thicknessIn * segment.lengthIn * height * (1 - segment.opening);
      weights[segment.story * walls.length + wallIndex] =
        (volumeIn3 / cubicInchesPerCubicFoot) * (settings.concreteWeightPcf / poundsPerKip);
    }
  });
  return weights;
}

/**
 * Gravity down each wall. Axial: sums at and above, self-weight in D. Moment: P e of every level, and where a band's centroid
 * moves by e = upper less lower along the wall, the axial from above times e (engineering.md sections 1 and 4).
 */
export function gravityTakedown(model: Model): GravityTakedown {
  const { stories, walls, gravity } = model;
  const size = stories.length * walls.length;
  const selfWeightKip = selfWeights(model);
  const columns = (): Record<GravityCase, Float64Array> => ({
    D: new Float64Array(size),
    L: new Float64Array(size),
    Lr: new Float64Array(size),
    S: new Float64Array(size),
  });
  const axialKip = columns();
  const momentKipIn = columns();
  for (const name of gravityCases) {
    walls.forEach((wall, wallIndex) => {
      let axial = 0;
      let moment = 0;
      for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
        const at = story * walls.length + wallIndex;
        const segment = wall.segments[story - wall.fromStory];
        const above = wall.segments[story + 1 - wall.fromStory];
        if (segment && above) {
          const shiftIn =
            (above.centroidXIn - segment.centroidXIn) * segment.cos +
            (above.centroidYIn - segment.centroidYIn) * segment.sin;
          moment += axial * shiftIn;
        }
        axial += gravity.axialKip[name][at] ?? 0;
        moment += gravity.momentKipIn[name][at] ?? 0;
        if (name === 'D') axial += selfWeightKip[at] ?? 0;
        axialKip[name][at] = axial;
        momentKipIn[name][at] = moment;
      }
    });
  }
  return { axialKip, momentKipIn, selfWeightKip };
}
