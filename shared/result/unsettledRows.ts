import type { Warning } from '../engineering/input.ts';
import type { Story } from '../engineering/model/model.ts';
import type { WallOutcome } from '../engineering/stages.ts';

/** Whether a row of the schedule, by its wall and lowest story, waits for a warning that no engineer has settled. */
export function unsettledRows(
  stories: readonly Story[],
  walls: readonly Pick<WallOutcome, 'design'>[],
  warnings: readonly Warning[],
): (wall: string, fromStory: number) => boolean {
  const storyOf = new Map(stories.map((story, index) => [story.level, index]));
  const topOf = new Map<string, number>();
  for (const { design } of walls) {
    for (const { wall, from, to } of design.rows)
      topOf.set(JSON.stringify([wall, storyOf.get(from)]), storyOf.get(to) ?? 0);
  }
  const held = warnings.flatMap(({ holds, settled }) => {
    if (!holds || settled) return [];
    return [{ walls: holds.walls, from: storyOf.get(holds.from) ?? 0, to: storyOf.get(holds.to) ?? stories.length }];
  });
  return (wall, fromStory) => {
    const top = topOf.get(JSON.stringify([wall, fromStory])) ?? fromStory;
    return held.some(
      (one) => (one.walls === null || one.walls.includes(wall)) && fromStory <= one.to && top >= one.from,
    );
  };
}
