import { endRatio, laidWebRatio, webRatio } from './barLayers.ts';
import { barFit } from './barFit.ts';
import type { DesignContext } from './designContext.ts';
import { tieSpacingLimit } from './endTies.ts';
import type { PlainCheck } from './plainCheck.ts';
import { plainCheck, worse } from './plainCheck.ts';
import type { LappedBars } from './rowLaps.ts';
import { lapNeeded } from './rowLaps.ts';
import type { HorizontalBars, Reinforcement, StrengthAt } from './reinforcement.ts';
import type { ShearDemand } from './steelNeeded.ts';
import { curtainsNeeded, leastRatios, spacingLimits } from './steelNeeded.ts';
import type { LoadGroup } from './storyLoads.ts';
import { flexureCheck } from './strengthChecks.ts';
import type { SectionInPlace } from './strengthChecks.ts';

/** Steel over concrete of the horizontal bars. */
export function horizontalRatio(horizontal: HorizontalBars, thicknessIn: number): number {
  return webRatio(horizontal.curtains, horizontal.bar, horizontal.spacingIn, thicknessIn);
}

/** rho_t and rho_l of the web against 11.6.1 or 11.6.2: required against provided. */
export function steelRatioChecks(
  section: SectionInPlace,
  demand: ShearDemand,
  { bars, horizontal }: Pick<Reinforcement, 'bars' | 'horizontal'>,
  context: DesignContext,
): PlainCheck[] {
  const { thicknessIn } = section;
  const rhoT = horizontalRatio(horizontal, thicknessIn);
  const rhoL = webRatio(bars.curtains, bars.web, bars.webSpacingIn, thicknessIn);
  const least = leastRatios(demand, bars.web, horizontal.bar, rhoT, context);
  const clause = demand.low ? 'low-shear' : 'high-shear';
  const expansion = demand.low ? null : demand.expansion;
  return [
    plainCheck(context, 'horizontal-steel', clause, 'steelRatio', least.horizontal, rhoT, expansion),
    plainCheck(context, 'vertical-steel', clause, 'steelRatio', least.vertical, rhoL, expansion),
  ];
}

/** Spacing of vertical and horizontal bars, the worse of the two; number of curtains, the smaller of the two; thickness. */
export function arrangementChecks(
  section: SectionInPlace,
  demand: ShearDemand,
  { bars, horizontal }: Pick<Reinforcement, 'bars' | 'horizontal'>,
  context: DesignContext,
): PlainCheck[] {
  const { lengthIn, thicknessIn } = section;
  const limit = spacingLimits(demand.low, lengthIn, thicknessIn, context);
  const space = (clause: 'spacing-vertical' | 'spacing-horizontal', spacingIn: number, limitIn: number): PlainCheck =>
    plainCheck(context, 'spacing', clause, 'barLength', spacingIn, limitIn, null);
  const curtains = Math.min(bars.curtains, horizontal.curtains);
  return [
    worse(
      space('spacing-vertical', bars.webSpacingIn, limit.verticalIn),
      space('spacing-horizontal', horizontal.spacingIn, limit.horizontalIn),
    ),
    plainCheck(context, 'curtains', 'curtains', 'count', curtainsNeeded(thicknessIn, context), curtains, null),
    thicknessCheck(thicknessIn, context),
  ];
}

/** Least thickness of Table 11.3.1.1 that holds for every wall, 4 in (100 mm); the value informs. */
export function thicknessCheck(thicknessIn: number, context: DesignContext): PlainCheck {
  return plainCheck(context, 'thickness', 'thickness', 'barLength', context.limits.leastThicknessIn, thicknessIn, null);
}

/**
 * Ties around vertical bars (11.7.4.1), in one of three forms. Ties scheduled: their spacing against 25.7.2.1. None, and no zone
 * with more steel than 0.01 of its concrete, bars as laid: that ratio. None, and a zone above it: flexure must do with all bars at
 * zero stress in compression, which is what `untied` gives.
 */
export function tiesCheck(
  section: SectionInPlace,
  groups: readonly LoadGroup[],
  { bars, ties }: Pick<Reinforcement, 'bars' | 'ties'>,
  untied: StrengthAt,
  context: DesignContext,
): PlainCheck | null {
  if (ties && bars.ends) {
    const limitIn = tieSpacingLimit(bars.ends, ties.bar, section.thicknessIn);
    return plainCheck(context, 'ties', 'tie-spacing', 'barLength', ties.spacingIn, limitIn, null);
  }
  const ratio = Math.max(
    laidWebRatio(bars, section.lengthIn, section.thicknessIn),
    endRatio(bars.ends, section.thicknessIn),
  );
  if (ratio <= context.rules.tiesAboveRatio) {
    return plainCheck(context, 'ties', 'ties', 'steelRatio', ratio, context.rules.tiesAboveRatio, null);
  }
  const flexure = flexureCheck(groups, untied, context);
  return flexure && { ...flexure, check: 'ties', clause: context.rules.clauses.ties };
}

/** Clear distances between vertical bars with laps doubled (25.2.3): needed against there. */
export function fitCheck(
  section: SectionInPlace,
  { bars, horizontal, ties }: Pick<Reinforcement, 'bars' | 'horizontal' | 'ties'>,
  context: DesignContext,
): PlainCheck {
  const outerIn = Math.max(horizontal.bar.diameterIn, ties ? ties.bar.diameterIn : 0);
  const fit = barFit(bars, section.thicknessIn, context.coverIn, outerIn, context.limits);
  return plainCheck(context, 'fit', 'fit', 'barLength', fit.neededIn, fit.clearIn, null);
}

/** Laps provided against class B (25.5.2.1), the worst of web, ends and horizontal. A missing length is answered by couplers or a lap-free row only. */
export function spliceCheck(
  section: SectionInPlace,
  { bars, horizontal, laps }: Pick<Reinforcement, 'bars' | 'horizontal' | 'laps'>,
  context: DesignContext,
): PlainCheck | null {
  let worst: PlainCheck | null = null;
  const judge = (which: LappedBars, providedIn: number | null): void => {
    if (providedIn === null && (laps.splice !== 'lap' || which === 'horizontal')) return;
    const neededIn = lapNeeded(which, bars, horizontal, section.fcPsi, context);
    worst = worse(worst, plainCheck(context, 'splice', 'splice', 'barLength', neededIn, providedIn, null));
  };
  judge('web', laps.webIn);
  if (bars.ends) judge('ends', laps.endsIn);
  judge('horizontal', laps.horizontalIn);
  return worst;
}
