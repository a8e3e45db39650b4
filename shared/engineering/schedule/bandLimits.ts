import type { PinnedBand, WallStory } from '../wall-design/designTypes.ts';

/** Stories of one wall that share a schedule row, as indexes into the wall's own stories from its base. */
export interface Band {
  readonly from: number;
  readonly to: number;
  /** the engineer's own cells for these stories */
  readonly pinned: PinnedBand | null;
}

/** For each story the pinned band that holds it: the first in the list. Pinned bands with a story that the wall no longer has are left out. */
function pinsByStory(
  wall: string,
  stories: readonly WallStory[],
  pinned: readonly PinnedBand[],
): (PinnedBand | null)[] {
  const pins: (PinnedBand | null)[] = stories.map(() => null);
  const indexOf = new Map(stories.map((story, index) => [story.level, index]));
  for (const pin of pinned) {
    const from = indexOf.get(pin.fromLevel);
    const to = indexOf.get(pin.toLevel);
    if (pin.wall !== wall || from === undefined || to === undefined || from > to) continue;
    for (let story = from; story <= to; story += 1) pins[story] ??= pin;
  }
  return pins;
}

/**
 * Bands of a wall from its base up. A limit stands where thickness, length or f'c change, at both ends of stories that carry an
 * engineer's own cells, and outside of those every `bandStories` counted from the wall's base, so that an edit moves no limit but its own.
 */
export function bandLimits(
  wall: string,
  stories: readonly WallStory[],
  bandStories: number,
  pinned: readonly PinnedBand[],
): Band[] {
  const pins = pinsByStory(wall, stories, pinned);
  const bands: Band[] = [];
  let from = 0;
  for (let next = 1; next <= stories.length; next += 1) {
    const below = stories[next - 1] as WallStory;
    const above = stories[next];
    const pin = pins[from] ?? null;
    const limit =
      above === undefined ||
      above.thicknessIn !== below.thicknessIn ||
      above.lengthIn !== below.lengthIn ||
      above.fcPsi !== below.fcPsi ||
      (pins[next] ?? null) !== pin ||
      (pin === null && next % bandStories === 0);
    if (!limit) continue;
    bands.push({ from, to: next - 1, pinned: pin });
    from = next;
  }
  return bands;
}
