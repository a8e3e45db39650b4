import type { Bar } from './bars.ts';
import type { DesignContext } from './designContext.ts';
import { lowShearLimit, shearSteelNeeded } from './shearStrength.ts';
import type { ShearWall } from './shearStrength.ts';
import type { LoadGroup } from './storyLoads.ts';

/** What a section's shear asks of its distributed steel. */
export interface ShearDemand {
  /** every expansion at or below 0.5 phi alpha_c lambda sqrt(f'c) Acv */
  readonly low: boolean;
  /** the expansion farthest above that limit (or nearest to it) */
  readonly expansion: number | null;
  /** rho_t needed for strength, the largest over expansions */
  readonly horizontalForStrength: number;
  readonly heightOverLength: number;
}

/** Low-shear test of 11.6.1 and rho_t needed for strength over the groups of a section. Vu as analyzed. */
export function shearDemand(wall: ShearWall, groups: readonly LoadGroup[], context: DesignContext): ShearDemand {
  let low = true;
  let worst = -1;
  let expansion: number | null = null;
  let horizontalForStrength = 0;
  for (const group of groups) {
    const limitKip = lowShearLimit(wall, group.axialKip, context.rules);
    const over = limitKip > 0 ? group.shearKip / limitKip : group.shearKip > 0 ? Infinity : 0;
    if (over > 1 + 1e-9) low = false;
    if (over > worst || (over === worst && expansion !== null && group.shearExpansion < expansion)) {
      worst = over;
      expansion = group.shearExpansion;
    }
    horizontalForStrength = Math.max(
      horizontalForStrength,
      shearSteelNeeded(wall, group.shearKip, group.axialKip, context.rules),
    );
  }
  return { low, expansion, horizontalForStrength, heightOverLength: wall.wallHeightIn / wall.lengthIn };
}

/** Bars to No. 5 (No. 16) of 60 ksi and more take the smaller ratios of Table 11.6.1; 1e-6 covers a grade typed in other units. */
export function isSmallBar(bar: Bar, gradeKsi: number, context: DesignContext): boolean {
  return bar.number <= context.limits.smallBar && gradeKsi >= 60 - 1e-6;
}

/**
 * Least ratios of distributed steel: Table 11.6.1 in low shear, each direction by its own bar; else 11.6.2 with rho_t provided in
 * the bracket and rho_t needed for strength as the upper bound.
 */
export function leastRatios(
  demand: ShearDemand,
  vertical: Bar,
  horizontal: Bar,
  horizontalProvided: number,
  context: DesignContext,
): { readonly vertical: number; readonly horizontal: number } {
  const { rules } = context;
  if (demand.low) {
    return {
      vertical: rules.lowShearSteel(isSmallBar(vertical, context.fyKsi, context)).vertical,
      horizontal: rules.lowShearSteel(isSmallBar(horizontal, context.fytKsi, context)).horizontal,
    };
  }
  return rules.highShearSteel(demand.heightOverLength, horizontalProvided, demand.horizontalForStrength);
}

/** Largest spacings (11.7.2.1, 11.7.3.1): 3 t and 18 in (450 mm), beyond low shear also lw/3 vertical and lw/5 horizontal. Inches. */
export function spacingLimits(
  low: boolean,
  lengthIn: number,
  thicknessIn: number,
  context: DesignContext,
): { readonly verticalIn: number; readonly horizontalIn: number } {
  const bothIn = Math.min(3 * thicknessIn, context.limits.spacingIn);
  if (low) return { verticalIn: bothIn, horizontalIn: bothIn };
  return { verticalIn: Math.min(bothIn, lengthIn / 3), horizontalIn: Math.min(bothIn, lengthIn / 5) };
}

/** Curtains needed (11.7.2.3): two above 10 in (250 mm). */
export function curtainsNeeded(thicknessIn: number, context: DesignContext): 1 | 2 {
  return thicknessIn > context.limits.oneCurtainThicknessIn * (1 + 1e-9) ? 2 : 1;
}
