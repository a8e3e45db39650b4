import type { WallDemand, WallForces } from '../wall-design/designTypes.ts';

/**
 * Expansions that govern an extreme of one wall and story: axial largest and smallest, |moment| and |shear| largest. Ties go to
 * the first in list order. Answered in list order, without repeats.
 */
export function governingExpansions(demand: WallDemand, forces: WallForces, story: number): number[] {
  const count = demand.stories.length;
  const extremes = [0, 0, 0, 0];
  const best = [Number.NEGATIVE_INFINITY, Number.NEGATIVE_INFINITY, Number.NEGATIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (let expansion = 0; expansion < forces.expansions.length; expansion += 1) {
    const at = expansion * count + story;
    const axial = forces.axialKip[at] ?? 0;
    const values = [axial, -axial, Math.abs(forces.momentKipIn[at] ?? 0), Math.abs(forces.shearKip[at] ?? 0)];
    for (let effect = 0; effect < 4; effect += 1) {
      const value = values[effect] ?? 0;
      if (value > (best[effect] ?? 0)) {
        best[effect] = value;
        extremes[effect] = expansion;
      }
    }
  }
  return [...new Set(extremes)].sort((a, b) => a - b);
}
