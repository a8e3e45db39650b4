import type { GravityCase, Model } from '../model/model.ts';
import { gravityCases } from '../model/model.ts';
import { poundsPerKip } from '../units.ts';

import { centroidShiftIn } from './centroidShift.ts';
import { liveReductionFactor } from './liveReduction.ts';

const cubicInchesPerCubicFoot = 1728;

/** Summed over levels at and above, at the bottom of each story; `[story * walls + wall]`, kip and kip-in. */
export interface GravityTakedown {
  readonly axialKip: Readonly<Record<GravityCase, Float64Array>>;
  readonly momentKipIn: Readonly<Record<GravityCase, Float64Array>>;
  /** part of L that keeps a factor of at least 1.0 in the standard's combinations */
  readonly fullLive: { readonly axialKip: Float64Array; readonly momentKipIn: Float64Array };
  /** factor on the reducible live load, `[story * walls + wall]`; 1 where nothing is reduced */
  readonly liveFactor: Float64Array;
  /** live load that the reduction took off, summed at and above, kip; not in `axialKip.L` */
  readonly reducedOffKip: Float64Array;
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
    sumDown(model, gravity.axialKip[name], gravity.momentKipIn[name], axialKip[name], momentKipIn[name]);
  }
  addSelfWeight(model, selfWeightKip, axialKip.D, momentKipIn.D);
  const column = () => new Float64Array(size);
  const fullLive = { axialKip: column(), momentKipIn: column() };
  sumDown(model, gravity.full.axialKip, gravity.full.momentKipIn, fullLive.axialKip, fullLive.momentKipIn);
  const liveFactor = column().fill(1);
  const reducedOffKip = column();
  if (model.settings.liveReduction) reduceLive(model, axialKip.L, momentKipIn.L, liveFactor, reducedOffKip);
  return { axialKip, momentKipIn, fullLive, liveFactor, reducedOffKip, selfWeightKip };
}

/** Sums of loads at and above; moments of their eccentricity and of the axial from above where the centroid moves. */
function sumDown(
  model: Model,
  levelAxial: Float64Array,
  levelMoment: Float64Array,
  axialKip: Float64Array,
  momentKipIn: Float64Array,
): void {
  const walls = model.walls.length;
  model.walls.forEach((wall, wallIndex) => {
    let axial = 0;
    let moment = 0;
    for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
      const at = story * walls + wallIndex;
      moment += axial * centroidShiftIn(wall, story) + (levelMoment[at] ?? 0);
      axial += levelAxial[at] ?? 0;
      axialKip[at] = axial;
      momentKipIn[at] = moment;
    }
  });
}

/** Self-weight of the stories, each hanging at its own centroid. */
function addSelfWeight(model: Model, weights: Float64Array, axialKip: Float64Array, momentKipIn: Float64Array): void {
  const walls = model.walls.length;
  model.walls.forEach((wall, wallIndex) => {
    let axial = 0;
    let moment = 0;
    for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
      const at = story * walls + wallIndex;
      moment += axial * centroidShiftIn(wall, story);
      axial += weights[at] ?? 0;
      axialKip[at] = (axialKip[at] ?? 0) + axial;
      momentKipIn[at] = (momentKipIn[at] ?? 0) + moment;
    }
  });
}

/** Takes the reduction of 4.7.2 off the reducible part of L, by the area and the floors summed down to each story. */
function reduceLive(
  model: Model,
  axialKip: Float64Array,
  momentKipIn: Float64Array,
  liveFactor: Float64Array,
  reducedOffKip: Float64Array,
): void {
  const walls = model.walls.length;
  const { reducible } = model.gravity;
  const sumAxial = new Float64Array(axialKip.length);
  const sumMoment = new Float64Array(axialKip.length);
  sumDown(model, reducible.axialKip, reducible.momentKipIn, sumAxial, sumMoment);
  model.walls.forEach((wall, wallIndex) => {
    let areaIn2 = 0;
    let floors = 0;
    for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
      const at = story * walls + wallIndex;
      areaIn2 += reducible.areaIn2[at] ?? 0;
      floors += reducible.floors[at] ?? 0;
      const factor = liveReductionFactor(areaIn2, floors, model.settings.kll);
      liveFactor[at] = factor;
      reducedOffKip[at] = (1 - factor) * (sumAxial[at] ?? 0);
      axialKip[at] = (axialKip[at] ?? 0) - (reducedOffKip[at] ?? 0);
      momentKipIn[at] = (momentKipIn[at] ?? 0) - (1 - factor) * (sumMoment[at] ?? 0);
    }
  });
}
