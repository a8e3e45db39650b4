import type { Amplification, LateralAction, Variant } from '../distribution/lateralActions.ts';
import type { WholeHeight, WholeHeightSolution } from '../distribution/wholeHeight.ts';
import type { Model } from '../model/model.ts';

import { displacementAt, edgeDisplacements, edgeRatio } from './edgeDisplacements.ts';

/** Elastic drift of one story under one case and variant, as ratios of the story height. */
export interface StoryDrift {
  readonly case: string;
  readonly kind: LateralAction['kind'];
  readonly direction: 'x' | 'y';
  readonly variant: Variant;
  readonly story: number;
  /** at the upper level's own point, both floors there */
  readonly x: number;
  readonly y: number;
  /** larger of the two edges across the case's direction, in that direction */
  readonly edge: number;
  readonly torsionRatio: number | null;
  readonly ax: number | null;
  /** stability coefficient; null where floor gravity is not given or the story has no shear */
  readonly theta: number | null;
}

/**
 * Drifts of every listed action. `unamplified` are the solutions with Ax = 1, from which torsion ratio and Ax come; `solutions` those with
 * Ax where it is asked for (the same otherwise). theta = Px Delta Ie/(Vx hsx Cd) = Px x elastic drift ratio / Vx (ASCE/SEI 7 12.8.7), Px
 * the floor gravity at and above, the edge where the torsion ratio is above 1.2.
 */
export function storyDrifts(
  model: Model,
  whole: WholeHeight,
  actions: readonly LateralAction[],
  solutions: readonly WholeHeightSolution[],
  unamplified: readonly WholeHeightSolution[],
  factors: Amplification,
): StoryDrift[] {
  const gravityAbove = floorGravityAbove(model);
  return actions.flatMap((action, index) => {
    const solution = solutions[index];
    const plain = unamplified[index];
    const { variant } = action;
    if (!solution || !plain || variant === 'torsion') return [];
    return model.stories.map((level, story): StoryDrift => {
      const upper = displacementAt(whole, solution, story, level.xIn, level.yIn);
      const lower = displacementAt(whole, solution, story - 1, level.xIn, level.yIn);
      const edges = edgeDrifts(model, whole, solution, story, action.direction);
      const accidental = action.kind === 'seismic' && variant !== '0';
      const torsionRatio = accidental ? edgeRatio(edgeDrifts(model, whole, plain, story, action.direction), 10) : null;
      const x = (upper.x - lower.x) / level.heightIn;
      const y = (upper.y - lower.y) / level.heightIn;
      const edge = Math.max(Math.abs(edges[0]), Math.abs(edges[1]));
      const shear = Math.abs((action.direction === 'x' ? action.storyFxKip : action.storyFyKip)[story] ?? 0);
      const gravity = gravityAbove[story] ?? null;
      const drift = (torsionRatio ?? 0) > 1.2 ? edge : Math.abs(action.direction === 'x' ? x : y);
      return {
        case: action.case,
        kind: action.kind,
        direction: action.direction,
        variant,
        story,
        x,
        y,
        edge,
        torsionRatio,
        ax: accidental ? (factors.get(action.caseIndex)?.[story] ?? 1) : null,
        theta: action.kind === 'seismic' && gravity !== null && shear > 0 ? (gravity * drift) / shear : null,
      };
    });
  });
}

/** Story drift ratios at the two edges of the upper floor. */
function edgeDrifts(
  model: Model,
  whole: WholeHeight,
  solution: WholeHeightSolution,
  story: number,
  direction: 'x' | 'y',
): readonly [number, number] {
  const upper = edgeDisplacements(model, whole, solution, story, story, direction);
  const lower = edgeDisplacements(model, whole, solution, story - 1, story, direction);
  const height = model.stories[story]?.heightIn ?? 1;
  return [(upper[0] - lower[0]) / height, (upper[1] - lower[1]) / height];
}

/** Floor gravity at and above each story, kip; null where a floor above does not give it. */
function floorGravityAbove(model: Model): (number | null)[] {
  let sum: number | null = 0;
  const sums: (number | null)[] = [];
  for (let story = model.stories.length - 1; story >= 0; story -= 1) {
    const gravity: number | null = model.stories[story]?.gravityKip ?? null;
    sum = sum === null || gravity === null ? null : sum + gravity;
    sums[story] = sum;
  }
  return sums;
}
