import type { LateralAction } from '../distribution/lateralActions.ts';
import type { Model } from '../model/model.ts';
import { gravityCases } from '../model/model.ts';
import type { GravityTakedown } from '../takedown/gravityTakedown.ts';
import type { TransferPoint } from '../takedown/transferred.ts';

export type BalanceLineName = 'force x' | 'force y' | 'torque' | 'overturning x' | 'overturning y' | 'vertical';

/** Applied against resisted, kip or kip-in, at the bottom of one story. */
export interface BalanceLine {
  readonly line: BalanceLineName;
  readonly applied: number;
  readonly resisted: number;
  /** |resisted - applied| over the larger of the action and the sum of magnitudes, not below 0.1 % of the base value */
  readonly residual: number;
}

export interface BalanceEntry {
  readonly case: string;
  readonly variant: '0' | '+' | '-';
  readonly story: number;
  readonly lines: readonly BalanceLine[];
}

interface Sum {
  total: number;
  magnitude: number;
}

const newSum = (): Sum => ({ total: 0, magnitude: 0 });

function addTo(sum: Sum, value: number) {
  sum.total += value;
  sum.magnitude += Math.abs(value);
}

function lineOf(line: BalanceLineName, applied: number, resisted: Sum, baseValue: number): BalanceLine {
  const difference = Math.abs(resisted.total - applied);
  const measure = Math.max(Math.abs(applied), resisted.magnitude, 0.001 * Math.abs(baseValue));
  return { line, applied, resisted: resisted.total, residual: measure === 0 ? 0 : difference / measure };
}

/**
 * The balance of one lateral action: force in x and y, torque about the origin and overturning about both axes at the bottom of
 * every story. Applied values come from the level forces themselves, resisted ones from the final wall forces; what a wall that
 * starts above the base brings down as moment stays in the sum.
 */
export function lateralBalance(
  model: Model,
  action: LateralAction,
  actionIndex: number,
  shearKip: Float64Array,
  momentKipIn: Float64Array,
  transfers: readonly TransferPoint[],
): BalanceEntry[] {
  const { stories, walls } = model;
  const plane = stories.length * walls.length;
  const applied = stories.map((_, story) => appliedLateral(model, action, story));
  return stories.map((_, story) => {
    const sums = { x: newSum(), y: newSum(), torque: newSum(), overX: newSum(), overY: newSum() };
    walls.forEach((wall, wallIndex) => {
      const segment = wall.segments[story - wall.fromStory];
      if (!segment) return;
      const at = actionIndex * plane + story * walls.length + wallIndex;
      const shear = shearKip[at] ?? 0;
      const moment = momentKipIn[at] ?? 0;
      addTo(sums.x, shear * segment.cos);
      addTo(sums.y, shear * segment.sin);
      addTo(sums.torque, shear * (segment.centroidXIn * segment.sin - segment.centroidYIn * segment.cos));
      addTo(sums.overX, moment * segment.cos);
      addTo(sums.overY, moment * segment.sin);
    });
    for (const { wallIndex, fromStory } of transfers) {
      const segment = walls[wallIndex]?.segments[0];
      if (!segment || fromStory <= story) continue;
      const moment = momentKipIn[actionIndex * plane + fromStory * walls.length + wallIndex] ?? 0;
      addTo(sums.overX, moment * segment.cos);
      addTo(sums.overY, moment * segment.sin);
    }
    const here = applied[story] ?? zeroLateral;
    const base = applied[0] ?? zeroLateral;
    return {
      case: action.case,
      variant: action.variant,
      story,
      lines: [
        lineOf('force x', here.fx, sums.x, base.fx),
        lineOf('force y', here.fy, sums.y, base.fy),
        lineOf('torque', here.torque, sums.torque, base.torque),
        lineOf('overturning x', here.overX, sums.overX, base.overX),
        lineOf('overturning y', here.overY, sums.overY, base.overY),
      ],
    };
  });
}

const zeroLateral = { fx: 0, fy: 0, torque: 0, overX: 0, overY: 0 };

/** Level forces above the bottom of a story, taken from the case itself. */
function appliedLateral(model: Model, action: LateralAction, story: number) {
  const loadCase = model.cases[action.caseIndex];
  const bottom = model.stories[story]?.bottomElevationIn ?? 0;
  const sum = { ...zeroLateral };
  const sense = action.variant === '0' ? 0 : action.variant === '+' ? 1 : -1;
  for (let level = story; level < model.stories.length; level += 1) {
    const floor = model.stories[level];
    if (!floor || !loadCase) continue;
    const fx = loadCase.fxKip[level] ?? 0;
    const fy = loadCase.fyKip[level] ?? 0;
    const accidental = sense * model.settings.accidental * (floor.extentXIn * fy - floor.extentYIn * fx);
    sum.fx += fx;
    sum.fy += fy;
    sum.torque += (loadCase.torqueKipIn[level] ?? 0) + accidental;
    sum.overX += fx * (floor.elevationIn - bottom);
    sum.overY += fy * (floor.elevationIn - bottom);
  }
  return sum;
}

/**
 * Vertical load of each gravity case at the bottom of every story: what was brought in at and above (self-weight with it)
 * against the axial loads of the walls that stand there and of those that arrived above.
 */
export function gravityBalance(
  model: Model,
  gravity: GravityTakedown,
  transfers: readonly TransferPoint[],
): BalanceEntry[] {
  const { stories, walls } = model;
  return gravityCases.flatMap((name) => {
    const broughtIn = stories.map((_, story) => {
      let sum = 0;
      for (let wall = 0; wall < walls.length; wall += 1) {
        const at = story * walls.length + wall;
        sum += model.gravity.axialKip[name][at] ?? 0;
        if (name === 'D') sum += gravity.selfWeightKip[at] ?? 0;
      }
      return sum;
    });
    const appliedAt = (from: number) => broughtIn.slice(from).reduce((sum, value) => sum + value, 0);
    return stories.map((_, story): BalanceEntry => {
      const resisted = newSum();
      walls.forEach((wall, wallIndex) => {
        if (story < wall.fromStory || story > wall.toStory) return;
        addTo(resisted, gravity.axialKip[name][story * walls.length + wallIndex] ?? 0);
      });
      for (const { wallIndex, fromStory } of transfers) {
        if (fromStory <= story) continue;
        addTo(resisted, gravity.axialKip[name][fromStory * walls.length + wallIndex] ?? 0);
      }
      const line = lineOf('vertical', appliedAt(story), resisted, appliedAt(0));
      return { case: name, variant: '0', story, lines: [line] };
    });
  });
}
