import type { LevelRow } from '../../input.ts';

import { levelOrder } from './levelOrder.ts';

/** Levels by name with their place from the base up; what other tables refer to. */
export interface LevelIndex {
  /** false where the table has no rows or a name could not be read: references are then not held against it */
  readonly usable: boolean;
  /** false where a name stands twice: existence can be looked up, above and below can't */
  readonly ordered: boolean;
  /** from the base up */
  readonly names: readonly string[];
  readonly storyOf: ReadonlyMap<string, number>;
}

export function indexLevels(levels: readonly LevelRow[]): LevelIndex {
  const names = levelOrder(levels).map((index) => levels[index]?.level ?? '');
  const storyOf = new Map<string, number>();
  names.forEach((name, story) => {
    if (!storyOf.has(name)) storyOf.set(name, story);
  });
  const usable = levels.length > 0 && !names.includes('');
  return { usable, ordered: usable && storyOf.size === names.length, names, storyOf };
}
