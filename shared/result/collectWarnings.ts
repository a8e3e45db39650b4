import type { BuildingInput, Warning } from '../engineering/input.ts';
import type { Analysis, WallOutcome } from '../engineering/stages.ts';
import { materialNotices } from '../engineering/wall-design/materialNotices.ts';
import { assemblyWarnings } from '../engineering/warnings/assemblyWarnings.ts';
import { assumptionWarnings } from '../engineering/warnings/assumptionWarnings.ts';
import { basisWarnings } from '../engineering/warnings/basisWarnings.ts';
import { crackedStateWarnings } from '../engineering/warnings/crackedStateWarnings.ts';
import { driftWarnings } from '../engineering/warnings/driftWarnings.ts';
import { flexibleWarnings } from '../engineering/warnings/flexibleWarnings.ts';
import {
  baseShearWarnings,
  combinationWarnings,
  criteriaWarnings,
  storyShearWarnings,
} from '../engineering/warnings/inputWarnings.ts';
import { liveWarnings } from '../engineering/warnings/liveWarnings.ts';
import { methodWarnings } from '../engineering/warnings/methodWarnings.ts';
import { planWarnings } from '../engineering/warnings/planWarnings.ts';
import { plausibilityWarnings } from '../engineering/warnings/plausibilityWarnings.ts';
import { storyWarnings } from '../engineering/warnings/storyWarnings.ts';
import { stressWarnings } from '../engineering/warnings/stressWarnings.ts';
import { wallShapeWarnings } from '../engineering/warnings/wallShapeWarnings.ts';

import type { CombinationSet } from './readCombinations.ts';

/** Everything that an engineer has to judge: what was typed, the plan, the method, drifts, materials, plausibility, then notices. */
export function collectWarnings(
  building: BuildingInput,
  analysis: Analysis,
  walls: readonly WallOutcome[],
  set: CombinationSet,
  notices: readonly Warning[],
): Warning[] {
  const { model } = analysis;
  return [
    ...criteriaWarnings(building, analysis),
    ...planWarnings(building, analysis),
    ...wallShapeWarnings(analysis),
    ...assemblyWarnings(analysis),
    ...storyWarnings(analysis),
    ...combinationWarnings(analysis, set.combinations, set.zeroLoads),
    ...storyShearWarnings(building),
    ...baseShearWarnings(building, analysis),
    ...liveWarnings(building, analysis),
    ...analysis.warnings,
    ...methodWarnings(building, analysis),
    ...flexibleWarnings(analysis),
    ...basisWarnings(analysis),
    ...driftWarnings(analysis, building.settings.loads),
    ...crackedStateWarnings(analysis, walls),
    ...materialNotices(
      model.settings,
      model.walls.flatMap((wall) => wall.segments.map(({ fcPsi }) => fcPsi)),
    ),
    ...plausibilityWarnings(analysis, walls),
    ...stressWarnings(analysis, walls),
    ...assumptionWarnings(analysis),
    ...notices,
  ];
}
