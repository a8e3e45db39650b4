import type { Model } from '../model/model.ts';

/** Walls that start above the base, and the level of the floor on which they stand. */
export interface TransferPoint {
  readonly wallIndex: number;
  readonly fromStory: number;
  /** level on which the wall arrives: the floor at the top of the story below */
  readonly level: string;
}

export function transferPoints(model: Model): TransferPoint[] {
  return model.walls.flatMap((wall, wallIndex) => {
    const below = model.stories[wall.fromStory - 1];
    return below ? [{ wallIndex, fromStory: wall.fromStory, level: below.level }] : [];
  });
}
