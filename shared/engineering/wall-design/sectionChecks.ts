import type { DesignContext } from './designContext.ts';
import {
  arrangementChecks,
  fitCheck,
  horizontalRatio,
  spliceCheck,
  steelRatioChecks,
  tiesCheck,
} from './detailChecks.ts';
import type { PlainCheck } from './plainCheck.ts';
import type { Reinforcement, StrengthAt } from './reinforcement.ts';
import { shearDemand } from './steelNeeded.ts';
import type { LoadGroup } from './storyLoads.ts';
import { axialCheck, flexureCheck, jointCheck, shearChecks, shearWallOf } from './strengthChecks.ts';
import type { SectionInPlace } from './strengthChecks.ts';

/**
 * Every check of an ordinary wall on one story section in one basis, each with its worst expansion. `strength` is that of the bars as
 * they may count in compression, `untied` that of the same bars without ties; `steelIn2` all vertical steel through it. A check that can't be run is left out.
 */
export function sectionChecks(
  section: SectionInPlace,
  groups: readonly LoadGroup[],
  reinforcement: Reinforcement,
  strength: StrengthAt,
  untied: StrengthAt,
  steelIn2: number,
  context: DesignContext,
): PlainCheck[] {
  const demand = shearDemand(shearWallOf(section, context), groups, context);
  const rhoT = horizontalRatio(reinforcement.horizontal, section.thicknessIn);
  const checks = [
    flexureCheck(groups, strength, context),
    ...shearChecks(section, groups, rhoT, context),
    ...steelRatioChecks(section, demand, reinforcement, context),
    ...arrangementChecks(section, demand, reinforcement, context),
    axialCheck(section, groups, context),
    tiesCheck(section, groups, reinforcement, untied, context),
    jointCheck(section, groups, steelIn2, context),
    fitCheck(section, reinforcement, context),
    spliceCheck(section, reinforcement, context),
  ];
  return checks.filter((check) => check !== null);
}
