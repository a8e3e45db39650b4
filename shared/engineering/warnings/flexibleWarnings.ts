import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

import { sayLength, sayPercent } from './sayAmount.ts';
import { heldStories, levelOf, sayRun, storyRuns } from './storyRuns.ts';

/** engineering.md section 3.2: x, y and mz are not used in `flexible`; 1 % of the extent is the middle still. */
const middlePart = 0.01;

/** `flexible-off-middle`: forces that `flexible` moves to the middle of the extent, and torques that it leaves out. */
export function flexibleWarnings({ model }: Pick<Analysis, 'model'>): Warning[] {
  const { stories, settings } = model;
  if (!settings.basis.includes('flexible')) return [];
  const alone = !settings.basis.some((basis) => basis === 'rigid' || basis === 'compatible');
  return model.cases.flatMap((loadCase) => {
    const runs = storyRuns(stories.length, (story) => {
      const level = stories[story];
      if (!level) return null;
      const fx = loadCase.fxKip[story] ?? 0;
      const fy = loadCase.fyKip[story] ?? 0;
      const mz = loadCase.mzKipIn[story] ?? 0;
      const xMiddle = level.edgeXIn + level.extentXIn / 2;
      const yMiddle = level.edgeYIn + level.extentYIn / 2;
      const offKipIn = (loadCase.torqueKipIn[story] ?? 0) - mz - (xMiddle * fy - yMiddle * fx);
      const size = Math.max(Math.abs(fx), Math.abs(fy));
      const extentIn = Math.abs(fy) > Math.abs(fx) ? level.extentXIn : level.extentYIn;
      const offIn = size > 0 ? Math.abs(offKipIn) / size : 0;
      const off = extentIn > 0 ? offIn / extentIn : 0;
      return off > middlePart || mz !== 0 ? { offIn, off, turned: mz !== 0 } : null;
    });
    return runs.map((run): Warning => {
      const worst = run.facts.reduce((a, b) => (b.off > a.off ? b : a));
      const turned = run.facts.some((fact) => fact.turned);
      const said = [
        ...(worst.off > middlePart
          ? [
              `act up to ${sayLength(worst.offIn, settings.units)}, ${sayPercent(worst.off)} of the extent, off its middle`,
            ]
          : []),
        ...(turned ? ['carry a torque mz'] : []),
      ];
      return {
        code: 'flexible-off-middle',
        level: levelOf(stories, run),
        message: `Forces of ${loadCase.name} at ${sayRun(stories, run)} ${said.join(' and ')}; the flexible basis spreads them over the extent and leaves the torque out, so that walls on the near side take less than they should.`,
        ...(alone ? { holds: { walls: null, from: stories[0]?.level ?? '', to: heldStories(stories, run).to } } : {}),
      };
    });
  });
}
