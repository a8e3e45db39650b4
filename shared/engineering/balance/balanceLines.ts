import type { Model } from '../model/model.ts';
import { gravityCases } from '../model/model.ts';
import type { GravityTakedown } from '../takedown/gravityTakedown.ts';
import type { TransferPoint } from '../takedown/transferred.ts';

export type BalanceLineName =
  | 'force x'
  | 'force y'
  | 'torque'
  | 'overturning x'
  | 'overturning y'
  | 'vertical'
  | 'transfers x'
  | 'transfers y'
  | 'torque left open'
  | 'sideways x'
  | 'sideways y';

/** Applied against resisted, kip or kip-in, at the bottom of one story. Lines that only inform have the residual 0. */
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

export interface Sum {
  total: number;
  magnitude: number;
}

export const newSum = (): Sum => ({ total: 0, magnitude: 0 });

export function addTo(sum: Sum, value: number): void {
  sum.total += value;
  sum.magnitude += Math.abs(value);
}

export function lineOf(line: BalanceLineName, applied: number, resisted: Sum, baseValue: number): BalanceLine {
  const difference = Math.abs(resisted.total - applied);
  const measure = Math.max(Math.abs(applied), resisted.magnitude, 0.001 * Math.abs(baseValue));
  return { line, applied, resisted: resisted.total, residual: measure === 0 ? 0 : difference / measure };
}

/** A line that is printed beside the balance: what was assigned, what stays open by an engineer's decision, what points sideways. */
export const informing = (line: BalanceLineName, value: number): BalanceLine => ({
  line,
  applied: value,
  resisted: value,
  residual: 0,
});

/**
 * Vertical load of each gravity case at the bottom of every story: what was brought in at and above (self-weight with it)
 * against the axial loads of the walls that stand there and of those that arrived above. L is applied as reduced: what the reduction
 * took off each wall is taken off what was brought in.
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
      let off = 0;
      const count = (at: number): void => {
        addTo(resisted, gravity.axialKip[name][at] ?? 0);
        if (name === 'L') off += gravity.reducedOffKip[at] ?? 0;
      };
      walls.forEach((wall, wallIndex) => {
        if (story >= wall.fromStory && story <= wall.toStory) count(story * walls.length + wallIndex);
      });
      for (const { wallIndex, fromStory } of transfers) {
        if (fromStory > story) count(fromStory * walls.length + wallIndex);
      }
      const line = lineOf('vertical', appliedAt(story) - off, resisted, appliedAt(0));
      return { case: name, variant: '0', story, lines: [line] };
    });
  });
}
