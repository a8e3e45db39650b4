import type { Problem } from '../input.ts';
import type { Model } from '../model/model.ts';

import type { LateralAction } from './lateralActions.ts';
import type { StoryStiffness } from './storyStiffness.ts';
import { storyStiffness } from './storyStiffness.ts';

/** Wall shears of one basis: `[action * stories * walls + story * walls + wall]`, kip, with sign along the wall. */
export interface BasisShares {
  /** `rigid` only */
  readonly directKip: Float64Array | null;
  readonly torsionalKip: Float64Array | null;
  readonly totalKip: Float64Array;
}

/** Every story's stiffness, or a problem for each story that can't resist. */
export function storyStiffnesses(
  model: Model,
  rigidities: Float64Array,
): { readonly problems: readonly Problem[] } | { readonly stiffness: readonly StoryStiffness[] } {
  const problems: Problem[] = [];
  const stiffness: StoryStiffness[] = [];
  model.stories.forEach((story, index) => {
    const outcome = storyStiffness(model, rigidities, index);
    if (outcome.ok) stiffness.push(outcome.stiffness);
    else
      problems.push({
        table: 'walls',
        row: null,
        column: null,
        message: `Story ${story.level} can't be distributed: ${outcome.lack}.`,
      });
  });
  return problems.length > 0 ? { problems } : { stiffness };
}

/**
 * Distribution by relative rigidity in each story under a rigid diaphragm (engineering.md section 3.1). Direct share: the
 * story action moved to the center of rigidity, both translations solved, rotation zero. Torsional share: the torque about
 * that center, theta = T / sum k b^2. Together they solve K u = S exactly.
 */
export function rigidBasis(
  model: Model,
  rigidities: Float64Array,
  stiffness: readonly StoryStiffness[],
  actions: readonly LateralAction[],
): BasisShares {
  const plane = model.stories.length * model.walls.length;
  const directKip = new Float64Array(actions.length * plane);
  const torsionalKip = new Float64Array(actions.length * plane);
  const totalKip = new Float64Array(actions.length * plane);
  actions.forEach((action, actionIndex) => {
    stiffness.forEach((story, storyIndex) => {
      const fx = action.storyFxKip[storyIndex] ?? 0;
      const fy = action.storyFyKip[storyIndex] ?? 0;
      const torque = (action.storyTorqueKipIn[storyIndex] ?? 0) - (story.centerXIn * fy - story.centerYIn * fx);
      const ux = (story.kyy * fx - story.kxy * fy) / story.determinant;
      const uy = (story.kxx * fy - story.kxy * fx) / story.determinant;
      const rotation = torque / story.torsional;
      const start = actionIndex * plane + storyIndex * model.walls.length;
      model.walls.forEach((wall, wallIndex) => {
        const segment = wall.segments[storyIndex - wall.fromStory];
        if (!segment) return;
        const k = rigidities[storyIndex * model.walls.length + wallIndex] ?? 0;
        const direct = k * (segment.cos * ux + segment.sin * uy);
        const torsional = k * (story.armIn[wallIndex] ?? 0) * rotation;
        directKip[start + wallIndex] = direct;
        torsionalKip[start + wallIndex] = torsional;
        totalKip[start + wallIndex] = direct + torsional;
      });
    });
  });
  return { directKip, torsionalKip, totalKip };
}
