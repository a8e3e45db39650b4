import { transferAt } from './applyOverrides.mjs';
import { foot, pound, psi } from './siUnits.mjs';

/** Ec = 57,000 sqrt(f'c) psi or, with a typed unit weight, 33 w^1.5 sqrt(f'c). */
export function modulusOf(segment, settings) {
  const { unitWeight } = settings.stiffness;
  const root = Math.sqrt(segment.fc / psi);
  const weightPcf = typeof unitWeight !== 'number' ? null : unitWeight / (pound / foot ** 3);
  return (weightPcf === null ? 57000 * root : 33 * weightPcf ** 1.5 * root) * psi;
}

/** k of one segment, N/m: cantilever or fixed, flexure and shear. */
export function rigidityOf(segment, height, settings) {
  const { end } = settings.stiffness;
  const modulus = modulusOf(segment, settings);
  const inertia = (segment.flexure * segment.thickness * segment.length ** 3) / 12;
  const area = segment.shear * segment.thickness * segment.length;
  const bending = height ** 3 / ((end === 'fixed' ? 12 : 3) * modulus * inertia);
  return 1 / (bending + (1.2 * height) / (0.4 * modulus * area));
}

/** Variants of a case: seismic with eccentricity has three, everything else one. */
export const variantsOf = (load, settings) =>
  load.kind === 'seismic' && settings.accidental > 0 ? ['0', '+', '-'] : ['0'];

/** Force and torque of every level; accidental eccentricity by the level's own extent and its own Ax; `twist` alone for wind. */
export function levelActions(building, load, variant, ax) {
  const sign = { 0: 0, '+': 1, '-': -1 }[variant];
  return building.stories.map((story, i) => {
    const force = load.levels[i];
    const lever = story.extentx * force.fy - story.extenty * force.fx;
    if (variant === 'twist') return { x: 0, y: 0, torque: 0.15 * lever };
    const torque = force.torque + sign * building.settings.accidental * (ax?.[i] ?? 1) * lever;
    return { x: force.fx, y: force.fy, torque };
  });
}

/** Action of every story: sums over levels at and above, about the origin. */
export function sumDown(levels) {
  const actions = [];
  let sum = { x: 0, y: 0, torque: 0 };
  for (let i = levels.length - 1; i >= 0; i -= 1) {
    const { x, y, torque } = levels[i];
    sum = { x: sum.x + x, y: sum.y + y, torque: sum.torque + torque };
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

/** Shares of all stories, story by story. */
export function solveStories(building, actions) {
  return building.rigidity.flatMap((rigidity, story) =>
    shareStory(rigidity, actions[story]).map((share) => ({ story, ...share, total: share.direct + share.torsional })),
  );
}

/** Shear, moment and axial of every wall at every story bottom from its shares, and what stops above the base. */
export function takeDown(building, load, shares) {
  const lateral = [];
  const transferred = [];
  const at = new Map(shares.map((share) => [`${String(share.story)} ${share.wall}`, share]));
  for (const wall of building.walls.values()) {
    let moment = 0;
    let axial = 0;
    for (let i = wall.to; i >= wall.from; i -= 1) {
      const extra = load === null ? { shear: 0, axial: 0, moment: 0 } : transferAt(building, load, wall.name, i);
      const shear = at.get(`${String(i)} ${wall.name}`).total + extra.shear;
      const [here, above] = [wall.segments.get(i), wall.segments.get(i + 1)];
      if (above !== undefined) moment += axial * ((above.x - here.x) * here.c + (above.y - here.y) * here.s);
      axial += extra.axial;
      moment += shear * building.stories[i].height + extra.moment;
      lateral.push({ story: i, wall: wall.name, shear, moment, axial });
      if (i === wall.from && i > 0) transferred.push({ story: i - 1, wall: wall.name, axial, shear, moment });
    }
  }
  return { lateral, transferred };
}
