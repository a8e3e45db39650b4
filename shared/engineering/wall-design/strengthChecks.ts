import type { DesignContext } from './designContext.ts';
import { jointCompression, jointStrength } from './jointStrength.ts';
import type { Joint } from './jointStrength.ts';
import { outOfPlaneStress } from './outOfPlaneStress.ts';
import type { PlainCheck } from './plainCheck.ts';
import { plainCheck, worse } from './plainCheck.ts';
import type { StrengthAt } from './reinforcement.ts';
import { shearStrength } from './shearStrength.ts';
import type { ShearWall } from './shearStrength.ts';
import type { LoadGroup } from './storyLoads.ts';

/** One story section as checks see it. */
export interface SectionInPlace {
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  /** lc of the out-of-plane aid */
  readonly storyHeightIn: number;
  /** hw */
  readonly wallHeightIn: number;
  /** the joint at the bottom of the story; null where it is not judged */
  readonly joint: null | { readonly fcPsi: number; readonly deadKip: number };
}

export function shearWallOf(section: SectionInPlace, context: DesignContext): ShearWall {
  const { lengthIn, thicknessIn, fcPsi, wallHeightIn } = section;
  return { lengthIn, thicknessIn, fcPsi, wallHeightIn, fytKsi: context.fytKsi, lambda: context.lambda };
}

/** |Mu| against phi Mn at that Pu (22.4): the pair with the largest |M|/phi Mn(P) decides. Null capacity outside the axial limits. */
export function flexureCheck(
  groups: readonly LoadGroup[],
  strength: StrengthAt,
  context: DesignContext,
): PlainCheck | null {
  let worst: PlainCheck | null = null;
  for (const group of groups) {
    const capacity = strength(group.axialKip)?.phiMnKipIn ?? null;
    worst = worse(
      worst,
      plainCheck(context, 'flexure', 'flexure', 'moment', group.momentKipIn, capacity, group.momentExpansion),
    );
  }
  return worst;
}

/** |Vu| against phi Vn (11.5.4.3) and against phi times the limit of 11.5.4.2, each by its own worst expansion. */
export function shearChecks(
  section: SectionInPlace,
  groups: readonly LoadGroup[],
  horizontalRatio: number,
  context: DesignContext,
): PlainCheck[] {
  const wall = shearWallOf(section, context);
  let shear: PlainCheck | null = null;
  let limit: PlainCheck | null = null;
  for (const group of groups) {
    const strength = shearStrength(wall, horizontalRatio, group.axialKip, context.rules);
    const { shearKip, shearExpansion } = group;
    shear = worse(shear, plainCheck(context, 'shear', 'shear', 'force', shearKip, strength.phiVnKip, shearExpansion));
    const phiLimitKip = context.rules.phiShear * strength.limitKip;
    limit = worse(
      limit,
      plainCheck(context, 'shear-limit', 'shear-limit', 'force', shearKip, phiLimitKip, shearExpansion),
    );
  }
  return shear && limit ? [shear, limit] : [];
}

/** Out-of-plane aid at the more compressed end (11.5.3), as stress. */
export function axialCheck(
  section: SectionInPlace,
  groups: readonly LoadGroup[],
  context: DesignContext,
): PlainCheck | null {
  const { lengthIn, thicknessIn, fcPsi, storyHeightIn } = section;
  const wall = { lengthIn, thicknessIn, fcPsi, storyHeightIn, eccentricityIn: context.oopEccentricityIn };
  let worst: PlainCheck | null = null;
  for (const group of groups) {
    const { demandPsi, capacityPsi } = outOfPlaneStress(wall, group.axialKip, group.momentKipIn, context.rules);
    const demand = Math.max(0, demandPsi);
    worst = worse(worst, plainCheck(context, 'axial', 'axial', 'stress', demand, capacityPsi, group.momentExpansion));
  }
  return worst;
}

/** The joint of a section for jointStrength. */
export function jointOf(section: SectionInPlace, context: DesignContext): Joint | null {
  if (!section.joint) return null;
  return {
    surface: context.joint,
    lambda: context.lambda,
    fcPsi: section.joint.fcPsi,
    fyKsi: context.fyKsi,
    areaIn2: section.lengthIn * section.thicknessIn,
  };
}

/** Factor on dead load that helps the joint: 0.9, with E 0.9 - 0.2 SDS. */
export function jointDeadFactor(group: LoadGroup, context: DesignContext): number {
  return group.seismic ? 0.9 - 0.2 * context.sds : 0.9;
}

/** |Vu| against shear friction of the joint at the bottom of the story (22.9.4). Ordinary walls: the demand is Vu as analyzed. */
export function jointCheck(
  section: SectionInPlace,
  groups: readonly LoadGroup[],
  steelIn2: number,
  context: DesignContext,
): PlainCheck | null {
  const joint = jointOf(section, context);
  if (!joint || !section.joint) return null;
  let worst: PlainCheck | null = null;
  for (const group of groups) {
    const helpKip = jointCompression(section.joint.deadKip, jointDeadFactor(group, context), group.axialKip);
    const { phiVnKip } = jointStrength(joint, steelIn2, helpKip, group.axialKip, context.rules);
    worst = worse(
      worst,
      plainCheck(context, 'joint', 'joint', 'force', group.shearKip, phiVnKip, group.shearExpansion),
    );
  }
  return worst;
}
