import type { LateralAction } from '../distribution/lateralActions.ts';
import type { Model } from '../model/model.ts';
import type { TransferEffects } from '../takedown/transferEffects.ts';
import type { TransferPoint } from '../takedown/transferred.ts';

import type { BalanceEntry, BalanceLine } from './balanceLines.ts';
import { addTo, informing, lineOf, newSum } from './balanceLines.ts';

/** What the balance reads of a basis: final wall forces, in `flexible` the parts along each axis, and the torque that own shares leave open. */
export interface BalancedBasis {
  readonly shearKip: Float64Array;
  readonly momentKipIn: Float64Array;
  readonly along: { readonly xKip: Float64Array; readonly yKip: Float64Array } | null;
  readonly openTorqueKipIn: Float64Array | null;
}

/**
 * The balance of one lateral action: force in x and y, torque about the origin and overturning about both axes at the bottom of every story.
 * Applied values come from the level forces themselves, with assigned transfers; resisted ones from the final wall forces; what a wall that
 * starts above the base brings down as moment stays in the sum. In `flexible` each direction is balanced by itself, floors carry no torque,
 * and the sideways part of skew walls is printed. Torque that an engineer's shares leave open stands on its own line.
 */
export function lateralBalance(
  model: Model,
  action: LateralAction,
  actionIndex: number,
  basis: BalancedBasis,
  effects: TransferEffects | null,
  transfers: readonly TransferPoint[],
): BalanceEntry[] {
  const applied = model.stories.map((_, story) => appliedLateral(model, action, story));
  const assigned = model.stories.map((_, story) => assignedAt(model, actionIndex, story, effects));
  const moments = basis.along ? alongMoments(model, actionIndex, basis.along) : null;
  return model.stories.map((_, story) => {
    const lines = storyLines({ model, actionIndex, story, basis, moments, effects, transfers, applied, assigned });
    return { case: action.case, variant: action.variant === 'torsion' ? '0' : action.variant, story, lines };
  });
}

interface Loads {
  readonly fx: number;
  readonly fy: number;
  readonly torque: number;
  readonly overX: number;
  readonly overY: number;
  readonly vertical: number;
}

const noLoads: Loads = { fx: 0, fy: 0, torque: 0, overX: 0, overY: 0, vertical: 0 };

function storyLines(question: {
  readonly model: Model;
  readonly actionIndex: number;
  readonly story: number;
  readonly basis: BalancedBasis;
  readonly moments: { readonly x: Float64Array; readonly y: Float64Array } | null;
  readonly effects: TransferEffects | null;
  readonly transfers: readonly TransferPoint[];
  readonly applied: readonly Loads[];
  readonly assigned: readonly Loads[];
}): BalanceLine[] {
  const { model, actionIndex, story, basis, moments, effects, transfers, applied, assigned } = question;
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const sums = { x: newSum(), y: newSum(), torque: newSum(), overX: newSum(), overY: newSum(), vertical: newSum() };
  let sidewaysX = 0;
  let sidewaysY = 0;
  model.walls.forEach((wall, wallIndex) => {
    const segment = wall.segments[story - wall.fromStory];
    if (!segment) return;
    const at = actionIndex * plane + story * walls + wallIndex;
    const { cos, sin } = segment;
    const shear = basis.shearKip[at] ?? 0;
    const moment = basis.momentKipIn[at] ?? 0;
    const own = effects
      ? { shear: effects.shearKip[at] ?? 0, moment: effects.momentKipIn[at] ?? 0 }
      : { shear: 0, moment: 0 };
    if (basis.along && moments) {
      const x = basis.along.xKip[at] ?? 0;
      const y = basis.along.yKip[at] ?? 0;
      addTo(sums.x, x + own.shear * cos);
      addTo(sums.y, y + own.shear * sin);
      addTo(sums.overX, (moments.x[at - actionIndex * plane] ?? 0) + own.moment * cos);
      addTo(sums.overY, (moments.y[at - actionIndex * plane] ?? 0) + own.moment * sin);
      sidewaysX += (shear - own.shear) * cos - x;
      sidewaysY += (shear - own.shear) * sin - y;
    } else {
      addTo(sums.x, shear * cos);
      addTo(sums.y, shear * sin);
      addTo(sums.torque, shear * (segment.centroidXIn * sin - segment.centroidYIn * cos));
      addTo(sums.overX, moment * cos);
      addTo(sums.overY, moment * sin);
    }
    if (effects) addTo(sums.vertical, effects.axialKip[at] ?? 0);
  });
  for (const { wallIndex, fromStory } of transfers) {
    const segment = model.walls[wallIndex]?.segments[0];
    if (!segment || fromStory <= story) continue;
    const index = fromStory * walls + wallIndex;
    const at = actionIndex * plane + index;
    if (moments) {
      addTo(sums.overX, (moments.x[index] ?? 0) + (effects?.momentKipIn[at] ?? 0) * segment.cos);
      addTo(sums.overY, (moments.y[index] ?? 0) + (effects?.momentKipIn[at] ?? 0) * segment.sin);
    } else {
      addTo(sums.overX, (basis.momentKipIn[at] ?? 0) * segment.cos);
      addTo(sums.overY, (basis.momentKipIn[at] ?? 0) * segment.sin);
    }
    if (effects) addTo(sums.vertical, effects.axialKip[at] ?? 0);
  }
  const here = applied[story] ?? noLoads;
  const base = applied[0] ?? noLoads;
  const more = assigned[story] ?? noLoads;
  const open = basis.along ? 0 : (basis.openTorqueKipIn?.[actionIndex * model.stories.length + story] ?? 0);
  // of the whole action, so that a direction without force is not measured by its own rounding
  const baseForce = Math.sqrt(base.fx * base.fx + base.fy * base.fy);
  const baseOver = Math.sqrt(base.overX * base.overX + base.overY * base.overY);
  const lines = [
    lineOf('force x', here.fx + more.fx, sums.x, baseForce),
    lineOf('force y', here.fy + more.fy, sums.y, baseForce),
    ...(basis.along ? [] : [lineOf('torque', here.torque + more.torque + open, sums.torque, base.torque)]),
    lineOf('overturning x', here.overX + more.overX, sums.overX, baseOver),
    lineOf('overturning y', here.overY + more.overY, sums.overY, baseOver),
  ];
  if (effects) {
    lines.push(lineOf('vertical', more.vertical, sums.vertical, more.vertical));
    lines.push(informing('transfers x', more.fx), informing('transfers y', more.fy));
  }
  if (open !== 0) lines.push(informing('torque left open', open));
  if (Math.abs(sidewaysX) > 1e-9 * Math.abs(base.fx + base.fy)) lines.push(informing('sideways x', sidewaysX));
  if (Math.abs(sidewaysY) > 1e-9 * Math.abs(base.fx + base.fy)) lines.push(informing('sideways y', sidewaysY));
  return lines;
}

/** Level forces above the bottom of a story. */
function appliedLateral(model: Model, action: LateralAction, story: number): Loads {
  const bottom = model.stories[story]?.bottomElevationIn ?? 0;
  const sum = { ...noLoads };
  for (let level = story; level < model.stories.length; level += 1) {
    const floor = model.stories[level];
    if (!floor) continue;
    const fx = action.levelFxKip[level] ?? 0;
    const fy = action.levelFyKip[level] ?? 0;
    sum.fx += fx;
    sum.fy += fy;
    sum.torque += action.levelTorqueKipIn[level] ?? 0;
    sum.overX += fx * (floor.elevationIn - bottom);
    sum.overY += fy * (floor.elevationIn - bottom);
  }
  return sum;
}

/** What transfers add at the bottom of a story: shear of that story, moment and axial of it and above, transferred walls with them. */
function assignedAt(model: Model, actionIndex: number, story: number, effects: TransferEffects | null): Loads {
  if (!effects) return noLoads;
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const sum = { ...noLoads };
  model.walls.forEach((wall, wallIndex) => {
    const at = Math.max(story, wall.fromStory);
    const segment = wall.segments[at - wall.fromStory];
    if (!segment || story > wall.toStory) return;
    const index = actionIndex * plane + at * walls + wallIndex;
    const { cos, sin } = segment;
    if (at === story) {
      const shear = effects.shearKip[index] ?? 0;
      sum.fx += shear * cos;
      sum.fy += shear * sin;
      sum.torque += shear * (segment.centroidXIn * sin - segment.centroidYIn * cos);
    }
    sum.overX += (effects.momentKipIn[index] ?? 0) * cos;
    sum.overY += (effects.momentKipIn[index] ?? 0) * sin;
    sum.vertical += effects.axialKip[index] ?? 0;
  });
  return sum;
}

/** Overturning of the parts along each axis, `[story * walls + wall]`, summed down. */
function alongMoments(
  model: Model,
  actionIndex: number,
  along: { readonly xKip: Float64Array; readonly yKip: Float64Array },
): { readonly x: Float64Array; readonly y: Float64Array } {
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const x = new Float64Array(plane);
  const y = new Float64Array(plane);
  model.walls.forEach((wall, wallIndex) => {
    let sumX = 0;
    let sumY = 0;
    for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
      const at = story * walls + wallIndex;
      const height = model.stories[story]?.heightIn ?? 0;
      sumX += (along.xKip[actionIndex * plane + at] ?? 0) * height;
      sumY += (along.yKip[actionIndex * plane + at] ?? 0) * height;
      x[at] = sumX;
      y[at] = sumY;
    }
  });
  return { x, y };
}
