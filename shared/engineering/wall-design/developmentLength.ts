import type { CodeRules } from '../codes/codeRules.ts';

import type { Bar } from './bars.ts';
import type { DetailLimits } from './detailLimits.ts';
import { rootFcPsi } from './shearStrength.ts';

export interface AnchoredBar {
  readonly bar: Bar;
  readonly fyKsi: number;
  readonly fcPsi: number;
  readonly lambda: number;
  /** center of the bar to the nearest face */
  readonly coverToCenterIn: number;
  /** center to center of bars developed together */
  readonly spacingIn: number;
  /** horizontal bar with more than 12 in of fresh concrete below: psi_t 1.3 */
  readonly horizontal: boolean;
}

/**
 * Development length in tension in bar diameters by the general formula of 25.4.2.4 with Ktr 0:
 * ld/db = (3/40) fy/(lambda sqrt(f'c)) psi_t psi_e psi_s psi_g/(cb/db); psi_e 1 (uncoated), cb/db not above 2.5. fy in psi, cb in in.
 */
export function developmentDiameters(input: {
  readonly fyPsi: number;
  readonly fcPsi: number;
  readonly lambda: number;
  readonly coverOverDiameter: number;
  /** psi_t psi_e psi_s psi_g */
  readonly factors: number;
  readonly rules: CodeRules;
}): number {
  const root = rootFcPsi(input.fcPsi, input.rules);
  return (0.075 * input.fyPsi * input.factors) / (input.lambda * root) / Math.min(2.5, input.coverOverDiameter);
}

/** ld of 25.4.2.1 in inches, not below 12 in (300 mm): cb is the lesser of the cover to the center and half the spacing. */
export function developmentLength(anchored: AnchoredBar, rules: CodeRules, limits: DetailLimits): number {
  const { bar } = anchored;
  const cbIn = Math.min(anchored.coverToCenterIn, anchored.spacingIn / 2);
  const factors =
    (anchored.horizontal ? 1.3 : 1) *
    rules.development.sizeFactor(bar.diameterIn) *
    rules.development.gradeFactor(anchored.fyKsi);
  const diameters = developmentDiameters({
    fyPsi: anchored.fyKsi * 1000,
    fcPsi: anchored.fcPsi,
    lambda: anchored.lambda,
    coverOverDiameter: cbIn / bar.diameterIn,
    factors,
    rules,
  });
  return Math.max(limits.leastDevelopmentIn, diameters * bar.diameterIn);
}

/** Class B lap of 25.5.2.1: 1.3 ld, not below 12 in (300 mm); all bars lapped at one place. Inches. ld enters with its own least length, on the safe side. */
export function classBLap(anchored: AnchoredBar, rules: CodeRules, limits: DetailLimits): number {
  return Math.max(limits.leastDevelopmentIn, 1.3 * developmentLength(anchored, rules, limits));
}

/** Standard hook in tension, ldh of 25.4.3.1: the edition's formula, not below 8 db and 6 in (150 mm). Inches. */
export function hookLength(
  bar: Bar,
  fyKsi: number,
  fcPsi: number,
  lambda: number,
  rules: CodeRules,
  limits: DetailLimits,
): number {
  return Math.max(limits.sixIn, 8 * bar.diameterIn, rules.development.hookIn(bar.diameterIn, fyKsi, fcPsi, lambda));
}
