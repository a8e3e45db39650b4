import type { LateralAction } from '../distribution/lateralActions.ts';
import type { WholeHeight, WholeHeightSolution } from '../distribution/wholeHeight.ts';
import type { Model } from '../model/model.ts';

import { edgeDisplacements, edgeRatio } from './edgeDisplacements.ts';

/**
 * Ax = (d_max/(1.2 d_avg))^2 within 1 and 3 of every seismic case and level, from level displacements with Ax = 1, the larger of the two
 * variants (ASCE/SEI 7 12.8.4.3; one pass).
 */
export function amplification(
  model: Model,
  whole: WholeHeight,
  actions: readonly LateralAction[],
  solutions: readonly WholeHeightSolution[],
): Map<number, Float64Array> {
  const result = new Map<number, Float64Array>();
  actions.forEach((action, index) => {
    const solution = solutions[index];
    if (action.kind !== 'seismic' || !solution || (action.variant !== '+' && action.variant !== '-')) return;
    const factors = result.get(action.caseIndex) ?? new Float64Array(model.stories.length).fill(1);
    result.set(action.caseIndex, factors);
    for (let story = 0; story < factors.length; story += 1) {
      const ratio = edgeRatio(edgeDisplacements(model, whole, solution, story, story, action.direction), 10);
      const ax = ratio === null ? 1 : Math.min(3, Math.max(1, (ratio / 1.2) * (ratio / 1.2)));
      factors[story] = Math.max(factors[story] ?? 1, ax);
    }
  });
  return result;
}

/** Ax where it is asked for and no whole-height solution can be made: 3 everywhere. */
export function fullAmplification(model: Model): Map<number, Float64Array> {
  return new Map(model.cases.map((_, index) => [index, new Float64Array(model.stories.length).fill(3)]));
}
