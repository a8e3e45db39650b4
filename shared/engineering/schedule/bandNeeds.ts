import type { DesignContext } from '../wall-design/designContext.ts';
import { jointCompression, jointSteelNeeded } from '../wall-design/jointStrength.ts';
import type { ShearDemand } from '../wall-design/steelNeeded.ts';
import { shearDemand } from '../wall-design/steelNeeded.ts';
import type { LoadGroup } from '../wall-design/storyLoads.ts';
import { jointDeadFactor, jointOf, shearWallOf } from '../wall-design/strengthChecks.ts';
import type { SectionInPlace } from '../wall-design/strengthChecks.ts';

/** An axial force and the largest |M| that comes with it anywhere in a band. */
export interface AxialMoment {
  readonly axialKip: number;
  readonly momentKipIn: number;
}

/** What the reinforcement of a band must answer, over its stories and every basis. */
export interface BandNeeds {
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  /** story heights, for quantities */
  readonly heightsIn: readonly number[];
  readonly pairs: readonly AxialMoment[];
  /** one demand for all stories: low only where every story is; the largest rho_t for strength */
  readonly shear: ShearDemand;
  /** vertical steel that the joints ask for, in2 */
  readonly jointSteelIn2: number;
}

/** One story section with its loads in every basis. */
export interface LoadedSection {
  readonly section: SectionInPlace;
  readonly groups: readonly (readonly LoadGroup[])[];
}

/** Gathers the needs of a band's sections, which share length, thickness and f'c. */
export function bandNeeds(sections: readonly LoadedSection[], context: DesignContext): BandNeeds {
  const first = sections[0];
  if (!first) throw new Error('a band without stories');
  const moments = new Map<number, number>();
  let low = true;
  let horizontalForStrength = 0;
  let jointSteelIn2 = 0;
  let heightOverLength = 0;
  for (const { section, groups } of sections) {
    const joint = jointOf(section, context);
    for (const basis of groups) {
      const demand = shearDemand(shearWallOf(section, context), basis, context);
      low = low && demand.low;
      horizontalForStrength = Math.max(horizontalForStrength, demand.horizontalForStrength);
      heightOverLength = demand.heightOverLength;
      for (const group of basis) {
        moments.set(group.axialKip, Math.max(moments.get(group.axialKip) ?? 0, group.momentKipIn));
        if (!joint || !section.joint) continue;
        const helpKip = jointCompression(section.joint.deadKip, jointDeadFactor(group, context), group.axialKip);
        jointSteelIn2 = Math.max(
          jointSteelIn2,
          jointSteelNeeded(joint, group.shearKip, helpKip, group.axialKip, context.rules),
        );
      }
    }
  }
  return {
    lengthIn: first.section.lengthIn,
    thicknessIn: first.section.thicknessIn,
    fcPsi: first.section.fcPsi,
    heightsIn: sections.map(({ section }) => section.storyHeightIn),
    pairs: [...moments].map(([axialKip, momentKipIn]) => ({ axialKip, momentKipIn })),
    shear: { low, expansion: null, horizontalForStrength, heightOverLength },
    jointSteelIn2,
  };
}
