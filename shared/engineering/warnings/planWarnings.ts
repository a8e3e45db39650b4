import type { BuildingInput, Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

import { levelOf, sayRun, storyRuns } from './storyRuns.ts';

/** What the levels leave to be assumed, and diaphragms that contradict the bases. */
export function planWarnings(building: BuildingInput, { model }: Pick<Analysis, 'model'>): Warning[] {
  const { stories } = model;
  const warnings: Warning[] = [];
  for (const run of storyRuns(stories.length, (story) => (stories[story]?.extentAssumed ? story : null))) {
    warnings.push({
      code: 'plan-size-assumed',
      level: levelOf(stories, run),
      message: `The extent of ${sayRun(stories, run)} is taken from the wall ends: accidental eccentricity depends on it. Give extent_x and extent_y, and the level's point or edge.`,
    });
  }
  const entered = new Map(building.tables.levels.map(({ level, diaphragm }) => [level, diaphragm]));
  const { basis } = model.settings;
  const stiff = basis.filter((one) => one === 'rigid' || one === 'compatible');
  const contradicted = storyRuns(
    stories.length,
    (story) => {
      const diaphragm = entered.get(stories[story]?.level ?? '') ?? null;
      if (diaphragm === 'flexible' && !basis.includes('flexible')) return 'flexible';
      return diaphragm === 'rigid' && stiff.length === 0 ? 'rigid' : null;
    },
    (diaphragm) => diaphragm,
  );
  for (const run of contradicted) {
    const flexible = run.facts[0] === 'flexible';
    warnings.push({
      code: 'diaphragm-contradicts',
      level: levelOf(stories, run),
      message: `${sayRun(stories, run)} ${run.from === run.to ? 'is' : 'are'} entered with a ${flexible ? 'flexible' : 'rigid'} diaphragm, but shears are shared under ${flexible ? stiff.join(' and ') : 'flexible'} alone: add the basis ${flexible ? 'flexible' : 'rigid or compatible'}, or correct the level.`,
    });
  }
  return warnings;
}
