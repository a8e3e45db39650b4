import type { WallDemand } from '../wall-design/designTypes.ts';

/** Largest of all expansions and bases in one story of a wall. */
export interface StoryExtremes {
  /** psi, tension positive: 6 |M|/(t lw^2) - P/(t lw) */
  readonly tensionPsi: number;
  /** psi: |V|/(t lw) */
  readonly shearPsi: number;
  /** psi: P/(t lw), compression positive */
  readonly axialPsi: number;
}

const psiPerKsi = 1000;

/** One pass over the columns of a wall; `[story of the wall]`. */
export function wallExtremes({ stories, forces }: WallDemand): StoryExtremes[] {
  const count = stories.length;
  return stories.map(({ lengthIn, thicknessIn }, story) => {
    const areaIn2 = lengthIn * thicknessIn;
    const modulusIn3 = (areaIn2 * lengthIn) / 6;
    let tension = Number.NEGATIVE_INFINITY;
    let shear = 0;
    let axial = Number.NEGATIVE_INFINITY;
    for (const { axialKip, momentKipIn, shearKip, expansions } of forces) {
      for (let expansion = 0; expansion < expansions.length; expansion += 1) {
        const at = expansion * count + story;
        const p = (axialKip[at] ?? 0) / areaIn2;
        tension = Math.max(tension, Math.abs(momentKipIn[at] ?? 0) / modulusIn3 - p);
        shear = Math.max(shear, Math.abs(shearKip[at] ?? 0));
        axial = Math.max(axial, p);
      }
    }
    return {
      tensionPsi: tension * psiPerKsi,
      shearPsi: (shear / areaIn2) * psiPerKsi,
      axialPsi: axial * psiPerKsi,
    };
  });
}
