import type { Model } from '../model/model.ts';

import type { LateralAction } from './lateralActions.ts';

/** Wall shears of a basis, and in `flexible` their parts along each axis, `[action * stories * walls + story * walls + wall]`, kip. */
export interface ChangingShears {
  readonly totalKip: Float64Array;
  readonly along: { readonly xKip: Float64Array; readonly yKip: Float64Array } | null;
}

interface Standing {
  readonly at: number;
  readonly wallIndex: number;
  readonly rigidity: number;
  readonly cos: number;
  readonly sin: number;
  readonly armIn: number;
}

/**
 * Puts an engineer's shares into the wall shears of a basis, in place: V = share x the story shear along the wall's own direction, of all
 * such walls of a story at once; the force that this adds or takes goes to the other walls by rigidity, without turning the floor
 * (engineering.md section 4). Gives the torque about the origin that no longer closes, `[action * stories + story]`, kip-in; null where
 * nobody set a share. Where the others can't take the force it stays open, and the balance breaks.
 */
export function applyShares(
  model: Model,
  rigidities: Float64Array,
  actions: readonly LateralAction[],
  shears: ChangingShears,
): Float64Array | null {
  const overrides = model.overrides.filter(({ kind }) => kind === 'share');
  if (overrides.length === 0) return null;
  const openTorqueKipIn = new Float64Array(actions.length * model.stories.length);
  for (const story of new Set(overrides.map((override) => override.story))) {
    const standing = wallsOf(model, rigidities, story);
    actions.forEach((action, index) => {
      const offset = index * model.stories.length * model.walls.length;
      const shareOf = new Map(
        overrides
          .filter((row) => row.story === story && (row.caseName === null || row.caseName === action.case))
          .map(({ wallIndex, share }) => [wallIndex, share]),
      );
      if (shareOf.size === 0) return;
      const fx = action.storyFxKip[story] ?? 0;
      const fy = action.storyFyKip[story] ?? 0;
      const rest = { fx: 0, fy: 0 };
      let torque = 0;
      const set = (wall: Standing, shear: number, before: number): void => {
        shears.totalKip[offset + wall.at] = shear;
        torque += (shear - before) * wall.armIn;
      };
      for (const wall of standing) {
        const share = shareOf.get(wall.wallIndex);
        if (share === undefined) continue;
        const before = shears.totalKip[offset + wall.at] ?? 0;
        const shear = share * (fx * wall.cos + fy * wall.sin);
        const { along } = shears;
        rest.fx += (along ? (along.xKip[offset + wall.at] ?? 0) : before * wall.cos) - shear * wall.cos;
        rest.fy += (along ? (along.yKip[offset + wall.at] ?? 0) : before * wall.sin) - shear * wall.sin;
        if (along) {
          along.xKip[offset + wall.at] = shear * wall.cos;
          along.yKip[offset + wall.at] = shear * wall.sin;
        }
        set(wall, shear, before);
      }
      const others = standing.filter(({ wallIndex }) => !shareOf.has(wallIndex));
      const motion = translation(others, rest.fx, rest.fy);
      for (const wall of others) {
        const before = shears.totalKip[offset + wall.at] ?? 0;
        const more = wall.rigidity * (wall.cos * motion.x + wall.sin * motion.y);
        if (shears.along) {
          shears.along.xKip[offset + wall.at] = (shears.along.xKip[offset + wall.at] ?? 0) + more * wall.cos;
          shears.along.yKip[offset + wall.at] = (shears.along.yKip[offset + wall.at] ?? 0) + more * wall.sin;
        }
        set(wall, before + more, before);
      }
      openTorqueKipIn[index * model.stories.length + story] = torque;
    });
  }
  return openTorqueKipIn;
}

function wallsOf(model: Model, rigidities: Float64Array, story: number): Standing[] {
  return model.walls.flatMap((wall, wallIndex) => {
    const segment = wall.segments[story - wall.fromStory];
    if (!segment) return [];
    const { cos, sin, centroidXIn, centroidYIn } = segment;
    const at = story * model.walls.length + wallIndex;
    return [{ at, wallIndex, rigidity: rigidities[at] ?? 0, cos, sin, armIn: centroidXIn * sin - centroidYIn * cos }];
  });
}

/** Movement of a floor that does not turn under a force; along the walls' one direction where all are parallel, none without walls. */
function translation(walls: readonly Standing[], fx: number, fy: number): { x: number; y: number } {
  let xx = 0;
  let yy = 0;
  let xy = 0;
  for (const { rigidity, cos, sin } of walls) {
    xx += rigidity * cos * cos;
    yy += rigidity * sin * sin;
    xy += rigidity * cos * sin;
  }
  const sum = xx + yy;
  const determinant = xx * yy - xy * xy;
  if (determinant > 1e-9 * sum * sum) {
    return { x: (yy * fx - xy * fy) / determinant, y: (xx * fy - xy * fx) / determinant };
  }
  const first = walls[0];
  if (!first) return { x: 0, y: 0 };
  const along = (fx * first.cos + fy * first.sin) / sum;
  return { x: along * first.cos, y: along * first.sin };
}
