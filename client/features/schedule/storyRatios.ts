import type { ResultCheck, ResultLevel } from '#shared/contracts/result';
import { governing } from '#shared/engineering/schedule/checkRow';
import type { Check } from '#shared/engineering/wall-design/designTypes';

export interface StoryRatio {
  readonly level: string;
  /** null: the wall does not stand here, or nothing resists (then `over`) */
  readonly ratio: number | null;
  readonly over: boolean;
  readonly stands: boolean;
}

/** Worst ratio of one wall story by story, graded as the rows of its schedule are. */
export function storyRatios(
  checks: readonly ResultCheck[],
  wall: string,
  down: readonly ResultLevel[],
): readonly StoryRatio[] {
  const byLevel = new Map<string, Check[]>();
  for (const check of checks) {
    if (check.wall !== wall || check.basis === 'envelope') continue;
    const { unit: _unit, basis, ...rest } = check;
    const list = byLevel.get(check.level) ?? [];
    byLevel.set(check.level, list);
    list.push({ ...rest, basis, quantity: 'none' });
  }
  return down.map(({ level }) => {
    const own = byLevel.get(level);
    if (!own) return { level, ratio: null, over: false, stands: false };
    const { ratio, ok } = governing(own);
    return { level, ratio, over: !ok, stands: true };
  });
}
