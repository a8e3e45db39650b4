import type { WholeHeight, WholeHeightSolution } from '../distribution/wholeHeight.ts';
import type { Model } from '../model/model.ts';

/** Displacement of a floor at a point, in; floor -1 is the base and stands still. */
export function displacementAt(
  whole: WholeHeight,
  solution: WholeHeightSolution,
  floor: number,
  xIn: number,
  yIn: number,
): { readonly x: number; readonly y: number } {
  if (floor < 0) return { x: 0, y: 0 };
  const rotation = solution.rotation[floor] ?? 0;
  return {
    x: (solution.uxIn[floor] ?? 0) - rotation * (yIn - whole.centerYIn),
    y: (solution.uyIn[floor] ?? 0) + rotation * (xIn - whole.centerXIn),
  };
}

/**
 * Displacements of a floor in a case's direction at the two plan edges across it, edges of level `edgesOf`, in: for a case in x at the
 * lower and upper edge of the extent in y.
 */
export function edgeDisplacements(
  model: Model,
  whole: WholeHeight,
  solution: WholeHeightSolution,
  floor: number,
  edgesOf: number,
  direction: 'x' | 'y',
): readonly [number, number] {
  const level = model.stories[edgesOf];
  if (!level) return [0, 0];
  if (direction === 'x') {
    return [
      displacementAt(whole, solution, floor, level.xIn, level.edgeYIn).x,
      displacementAt(whole, solution, floor, level.xIn, level.edgeYIn + level.extentYIn).x,
    ];
  }
  return [
    displacementAt(whole, solution, floor, level.edgeXIn, level.yIn).y,
    displacementAt(whole, solution, floor, level.edgeXIn + level.extentXIn, level.yIn).y,
  ];
}

/** Larger of two edge values over their average; d_avg = |d1 + d2|/2. Null where nothing moves, at most `most`. */
export function edgeRatio([first, second]: readonly [number, number], most: number): number | null {
  const largest = Math.max(Math.abs(first), Math.abs(second));
  if (largest === 0) return null;
  const average = Math.abs(first + second) / 2;
  return average * most <= largest ? most : largest / average;
}
