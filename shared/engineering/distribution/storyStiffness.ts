import type { Model } from '../model/model.ts';

/** sin(0.5 degree): walls closer than this in direction are parallel (engineering.md section 1). */
const parallelSine = 0.008726535498373935;
/** Walls whose lines pass within 1 in of one point resist no torsion (engineering.md section 1, "one line"). */
const onePointIn = 1;

/** Stiffness of one story about its own center of rigidity, kip/in and kip-in; per wall the arm to the center, in. */
export interface StoryStiffness {
  readonly kxx: number;
  readonly kxy: number;
  readonly kyy: number;
  readonly determinant: number;
  readonly centerXIn: number;
  readonly centerYIn: number;
  readonly torsional: number;
  /** `[wall]`: x s - y c of the wall's centroid from the center of rigidity; 0 where the wall does not stand */
  readonly armIn: Float64Array;
}

export type StiffnessOutcome =
  { readonly ok: true; readonly stiffness: StoryStiffness } | { readonly ok: false; readonly lack: string };

/**
 * Assembles a story: Kxx = sum k c^2, Kxy = sum k c s, Kyy = sum k s^2. The center of rigidity is the point through which a
 * force turns nothing: (-yr, xr) = (Kxt, Kyt) K^-1 with Kxt = sum k c b, Kyt = sum k s b, b = x s - y c. Sums are taken about
 * the walls' own middle, so that a far origin costs no digits. A story that can't resist is answered with what it lacks.
 */
export function storyStiffness(model: Model, rigidities: Float64Array, story: number): StiffnessOutcome {
  const { walls } = model;
  const standing = walls.flatMap((wall, index) => {
    const segment = wall.segments[story - wall.fromStory];
    return segment ? [{ index, segment, k: rigidities[story * walls.length + index] ?? 0 }] : [];
  });
  const first = standing[0];
  if (!first) return { ok: false, lack: 'no wall stands in it' };
  const parallel = standing.every(
    ({ segment: s }) => Math.abs(s.cos * first.segment.sin - s.sin * first.segment.cos) <= parallelSine,
  );
  if (parallel) return { ok: false, lack: lackOfParallel(first.segment.cos, first.segment.sin) };

  const middleX = standing.reduce((sum, { segment }) => sum + segment.centroidXIn, 0) / standing.length;
  const middleY = standing.reduce((sum, { segment }) => sum + segment.centroidYIn, 0) / standing.length;
  let kxx = 0;
  let kxy = 0;
  let kyy = 0;
  let kxt = 0;
  let kyt = 0;
  for (const { segment, k } of standing) {
    const b = (segment.centroidXIn - middleX) * segment.sin - (segment.centroidYIn - middleY) * segment.cos;
    kxx += k * segment.cos * segment.cos;
    kxy += k * segment.cos * segment.sin;
    kyy += k * segment.sin * segment.sin;
    kxt += k * segment.cos * b;
    kyt += k * segment.sin * b;
  }
  const determinant = kxx * kyy - kxy * kxy;
  const centerXIn = middleX + (kxx * kyt - kxy * kxt) / determinant;
  const centerYIn = middleY - (kyy * kxt - kxy * kyt) / determinant;
  const armIn = new Float64Array(walls.length);
  let torsional = 0;
  let largestArm = 0;
  for (const { index, segment, k } of standing) {
    const arm = (segment.centroidXIn - centerXIn) * segment.sin - (segment.centroidYIn - centerYIn) * segment.cos;
    armIn[index] = arm;
    torsional += k * arm * arm;
    largestArm = Math.max(largestArm, Math.abs(arm));
  }
  if (largestArm <= onePointIn) {
    return { ok: false, lack: 'all its walls pass through one point, so that nothing resists torsion' };
  }
  return { ok: true, stiffness: { kxx, kxy, kyy, determinant, centerXIn, centerYIn, torsional, armIn } };
}

function lackOfParallel(cos: number, sin: number): string {
  if (Math.abs(sin) <= parallelSine)
    return 'no wall in y: all its walls are parallel to x, so that nothing resists a force in y';
  if (Math.abs(cos) <= parallelSine)
    return 'no wall in x: all its walls are parallel to y, so that nothing resists a force in x';
  return 'all its walls are parallel, so that nothing resists a force across them';
}
