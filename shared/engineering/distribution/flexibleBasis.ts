import type { Model } from '../model/model.ts';

import type { LateralAction } from './lateralActions.ts';
import type { Fractions } from './tributaryFractions.ts';
import { tributaryFractions } from './tributaryFractions.ts';

const parallelSine = 0.008726535498373935;

export interface FlexibleShares {
  readonly totalKip: Float64Array;
  /** the force in x, and in y, that each wall takes for the level forces of that direction; balance is struck on these */
  readonly alongXKip: Float64Array;
  readonly alongYKip: Float64Array;
}

/** Why the basis can't be used: the wall, and what it lacks. */
export interface NoFlexible {
  readonly wall: string | null;
  readonly lack: string;
}

interface StoryParts {
  /** part of Fx and of Fy by wall, explicit shares and tributary parts together */
  readonly x: Fractions;
  readonly y: Fractions;
}

/**
 * Distribution under flexible diaphragms (engineering.md section 3.2): every level's force is shared out at that level among the walls of the
 * story below it, then summed down. V = part of Fx / c + part of Fy / s. A wall that starts above the base hands its force to the floor
 * on which it stands, where it is shared out again. Points, torques and accidental eccentricity are not used.
 */
export function flexibleBasis(
  model: Model,
  rigidities: Float64Array,
  actions: readonly LateralAction[],
): FlexibleShares | NoFlexible {
  const stories: StoryParts[] = [];
  const loaded = (direction: 'x' | 'y', story: number) =>
    actions.some((action) => ((direction === 'x' ? action.storyFxKip : action.storyFyKip)[story] ?? 0) !== 0);
  for (let story = 0; story < model.stories.length; story += 1) {
    const parts = storyParts(model, rigidities, story, { x: loaded('x', story), y: loaded('y', story) });
    if ('lack' in parts) return parts;
    stories.push(parts);
  }
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const totalKip = new Float64Array(actions.length * plane);
  const alongXKip = new Float64Array(actions.length * plane);
  const alongYKip = new Float64Array(actions.length * plane);
  actions.forEach((action, index) => {
    let arrivalX = 0;
    let arrivalY = 0;
    for (let story = model.stories.length - 1; story >= 0; story -= 1) {
      const fx = (action.levelFxKip[story] ?? 0) + arrivalX;
      const fy = (action.levelFyKip[story] ?? 0) + arrivalY;
      arrivalX = 0;
      arrivalY = 0;
      for (let wallIndex = 0; wallIndex < walls; wallIndex += 1) {
        const wall = model.walls[wallIndex];
        const segment = wall?.segments[story - wall.fromStory];
        if (!wall || !segment) continue;
        const at = index * plane + story * walls + wallIndex;
        const isTop = story === wall.toStory;
        const x = (stories[story]?.x.get(wallIndex) ?? 0) * fx + (isTop ? 0 : (alongXKip[at + walls] ?? 0));
        const y = (stories[story]?.y.get(wallIndex) ?? 0) * fy + (isTop ? 0 : (alongYKip[at + walls] ?? 0));
        alongXKip[at] = x;
        alongYKip[at] = y;
        totalKip[at] = (x === 0 ? 0 : x / segment.cos) + (y === 0 ? 0 : y / segment.sin);
        if (story === wall.fromStory && story > 0) {
          arrivalX += x;
          arrivalY += y;
        }
      }
    }
  });
  return { totalKip, alongXKip, alongYKip };
}

function storyParts(
  model: Model,
  rigidities: Float64Array,
  story: number,
  loaded: { readonly x: boolean; readonly y: boolean },
): StoryParts | NoFlexible {
  const explicit = { x: new Map<number, number>(), y: new Map<number, number>() };
  const free = new Set<number>();
  for (const [index, wall] of model.walls.entries()) {
    const segment = wall.segments[story - wall.fromStory];
    if (!segment) continue;
    const { shares, cos, sin } = segment;
    if (shares) {
      if ((shares.x > 0 && Math.abs(cos) <= parallelSine) || (shares.y > 0 && Math.abs(sin) <= parallelSine)) {
        return { wall: wall.name, lack: 'has a share of a force across it' };
      }
      explicit.x.set(index, shares.x);
      explicit.y.set(index, shares.y);
    } else {
      if (Math.abs(cos) > parallelSine && Math.abs(sin) > parallelSine) {
        return { wall: wall.name, lack: 'runs at an angle and has no share_x, share_y' };
      }
      free.add(index);
    }
  }
  const parts = { x: explicit.x, y: explicit.y };
  for (const direction of ['x', 'y'] as const) {
    const given = [...explicit[direction].values()].reduce((sum, share) => sum + share, 0);
    const rest = 1 - given;
    if (rest <= 1e-9) continue;
    const fractions = tributaryFractions(model, rigidities, story, direction, free);
    if (fractions === null) {
      if (!loaded[direction]) continue;
      return {
        wall: null,
        lack: `story ${model.stories[story]?.level ?? ''} has no wall along ${direction} without a share to take the rest of the force`,
      };
    }
    for (const [index, fraction] of fractions) parts[direction].set(index, rest * fraction);
  }
  return parts;
}
