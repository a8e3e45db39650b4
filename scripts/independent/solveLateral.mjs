import { foot, pound, psi } from './siUnits.mjs';

/** k of one segment, N/m: cantilever or fixed, flexure and shear; Ec = 57,000 sqrt(f'c) psi or 33 w^1.5 sqrt(f'c). */
export function rigidityOf(segment, height, settings) {
  const { end, unitWeight } = settings.stiffness;
  const root = Math.sqrt(segment.fc / psi);
  const weightPcf = typeof unitWeight !== 'number' ? null : unitWeight / (pound / foot ** 3);
  const modulus = (weightPcf === null ? 57000 * root : 33 * weightPcf ** 1.5 * root) * psi;
  const inertia = (segment.flexure * segment.thickness * segment.length ** 3) / 12;
  const area = segment.shear * segment.thickness * segment.length;
  const bending = height ** 3 / ((end === 'fixed' ? 12 : 3) * modulus * inertia);
  return 1 / (bending + (1.2 * height) / (0.4 * modulus * area));
}

/** Variants of a case: seismic with eccentricity has three, everything else one. */
export const variantsOf = (load, settings) =>
  load.kind === 'seismic' && settings.accidental > 0 ? ['0', '+', '-'] : ['0'];

/** Action of every story: sums over levels at and above, about the origin. */
export function storyActions(building, load, variant) {
  const sign = { 0: 0, '+': 1, '-': -1 }[variant];
  let sum = { x: 0, y: 0, torque: 0 };
  const actions = [];
  for (let i = building.stories.length - 1; i >= 0; i -= 1) {
    const story = building.stories[i];
    const force = load.levels[i];
    const accidental = building.settings.accidental * (story.extentx * force.fy - story.extenty * force.fx);
    sum = { x: sum.x + force.fx, y: sum.y + force.fy, torque: sum.torque + force.torque + sign * accidental };
    actions[i] = sum;
  }
  return actions;
}

/** Center of rigidity, by the two translations of a plan that does not turn. */
export function storyRigidity(building, i) {
  const parts = [];
  for (const wall of building.walls.values()) {
    const segment = wall.segments.get(i);
    if (segment === undefined) continue;
    const k = rigidityOf(segment, building.stories[i].height, building.settings);
    parts.push({ wall: wall.name, segment, k });
  }
  let kxx = 0;
  let kyy = 0;
  let kxy = 0;
  for (const { k, segment } of parts) {
    kxx += k * segment.c * segment.c;
    kyy += k * segment.s * segment.s;
    kxy += k * segment.c * segment.s;
  }
  const determinant = kxx * kyy - kxy * kxy;
  const translate = (fx, fy) => ({ u: (kyy * fx - kxy * fy) / determinant, v: (kxx * fy - kxy * fx) / determinant });
  const torqueOf = ({ u, v }) =>
    parts.reduce((sum, { k, segment: { c, s, x, y } }) => sum + k * (c * u + s * v) * (x * s - y * c), 0);
  return { parts, translate, x: torqueOf(translate(0, 1)), y: -torqueOf(translate(1, 0)) };
}

/** Shares of one story under an action: direct through the center of rigidity, torsional by the polar sum about it. */
export function shareStory(rigidity, action) {
  const { parts, translate, x: xr, y: yr } = rigidity;
  const { u, v } = translate(action.x, action.y);
  const twist = action.torque - (xr * action.y - yr * action.x);
  const arm = ({ c, s, x, y }) => (x - xr) * s - (y - yr) * c;
  const polar = parts.reduce((sum, { k, segment }) => sum + k * arm(segment) ** 2, 0);
  return parts.map(({ wall, segment, k }) => ({
    wall,
    direct: k * (segment.c * u + segment.s * v),
    torsional: (twist * k * arm(segment)) / polar,
  }));
}

/** Everything lateral of one case and variant: shares, wall shear and moment at every story bottom, what stops above base. */
export function solveLateral(building, load, variant) {
  const actions = storyActions(building, load, variant);
  const shares = [];
  for (let i = 0; i < building.stories.length; i += 1) {
    for (const share of shareStory(building.rigidity[i], actions[i])) {
      shares.push({ story: i, ...share, total: share.direct + share.torsional });
    }
  }
  const lateral = [];
  const transferred = [];
  for (const wall of building.walls.values()) {
    let moment = 0;
    for (let i = wall.to; i >= wall.from; i -= 1) {
      const { total } = shares.find((share) => share.story === i && share.wall === wall.name);
      moment += total * building.stories[i].height;
      lateral.push({ story: i, wall: wall.name, shear: total, moment });
      if (i === wall.from && i > 0) transferred.push({ story: i - 1, wall: wall.name, axial: 0, shear: total, moment });
    }
  }
  return { actions, shares, lateral, transferred };
}
