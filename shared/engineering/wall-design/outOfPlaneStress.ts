import type { CodeRules } from '../codes/codeRules.ts';

/**
 * Out-of-plane aid: the strip at the more compressed end as a wall under axial load (11.5.3.1), per unit length
 * pu = Pu/lw + 6 Mu/lw^2 against phi 0.55 f'c t [1 - (k lc/(32 t))^2], phi 0.65, k 1. Both are given over t, in psi. Valid for an
 * out-of-plane eccentricity up to t/6; capacity null beyond it and where k lc/(32 t) >= 1. Not a slenderness check (11.4, 11.8).
 */
export function outOfPlaneStress(
  wall: {
    readonly lengthIn: number;
    readonly thicknessIn: number;
    readonly fcPsi: number;
    readonly storyHeightIn: number;
    readonly eccentricityIn: number;
  },
  axialKip: number,
  momentKipIn: number,
  rules: CodeRules,
): { readonly demandPsi: number; readonly capacityPsi: number | null } {
  const { lengthIn, thicknessIn } = wall;
  const endKipPerIn = axialKip / lengthIn + (6 * Math.abs(momentKipIn)) / (lengthIn * lengthIn);
  const slenderness = wall.storyHeightIn / (32 * thicknessIn);
  const capacityPsi = rules.phiCompression * 0.55 * wall.fcPsi * (1 - slenderness * slenderness);
  const valid = wall.eccentricityIn <= thicknessIn / 6 && capacityPsi > 0;
  return { demandPsi: (endKipPerIn * 1000) / thicknessIn, capacityPsi: valid ? capacityPsi : null };
}
