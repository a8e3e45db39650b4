import type { Model } from '../model/model.ts';

/**
 * Wall moments at the bottom of every story: M = sum of V h downward, kip-in, same indices as the shears
 * (`[action][story][wall]`). Shares bring no axial load, so that a moved centroid adds nothing; transfers have their own columns.
 */
export function lateralMoments(model: Model, shearKip: Float64Array, actionCount: number): Float64Array {
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const moments = new Float64Array(shearKip.length);
  for (let action = 0; action < actionCount; action += 1) {
    for (let wall = 0; wall < walls; wall += 1) {
      let moment = 0;
      for (let story = model.stories.length - 1; story >= 0; story -= 1) {
        const at = action * plane + story * walls + wall;
        const line = model.walls[wall];
        if (!line || story < line.fromStory || story > line.toStory) continue;
        moment += (shearKip[at] ?? 0) * (model.stories[story]?.heightIn ?? 0);
        moments[at] = moment;
      }
    }
  }
  return moments;
}
