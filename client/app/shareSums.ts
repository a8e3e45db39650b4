import type { ResultBalance, ResultDocument, Variant } from '#shared/contracts/result';
import type { Basis, WallRow } from '#shared/engineering/input';

import { bandAt } from './bandAt.ts';

export interface ShareSum {
  readonly basis: Basis;
  readonly variant: Variant;
  readonly level: string;
  readonly direction: 'x' | 'y';
  /** of the shares as listed, along the direction */
  readonly sum: number;
  /** what the balance says that the walls resist there, transfers taken out */
  readonly resisted: number;
  /** difference over the larger of what is resisted and the sum of magnitudes, not below 0.1 % of the base value */
  readonly residual: number;
}

interface Sum {
  total: number;
  magnitude: number;
}

const keyOf = (one: { basis: Basis; variant: Variant; level: string }): string =>
  `${one.basis}\n${one.variant}\n${one.level}`;

/**
 * Adds the shares of a case up once more, from the rows as they are listed and the walls as they stand in plan, and holds the sums
 * against the balance: a share that was changed on the way is found here, whatever the balance says of itself. Empty where a
 * wall of the result stands in no row.
 */
export function shareSums(
  document: Pick<ResultDocument, 'balance' | 'distribution' | 'levels'>,
  rows: readonly WallRow[],
  caseName: string,
): readonly ShareSum[] {
  const directions = new Map<string, { cos: number; sin: number } | null>();
  const directionOf = (wall: string, level: string): { cos: number; sin: number } | null => {
    const key = `${wall}\n${level}`;
    const known = directions.get(key);
    if (known !== undefined) return known;
    const found = directionIn(bandAt(document.levels, rows, wall, level));
    directions.set(key, found);
    return found;
  };
  const sums = new Map<string, { x: Sum; y: Sum }>();
  for (const one of document.distribution) {
    if (one.case !== caseName) continue;
    const direction = directionOf(one.wall, one.level);
    if (direction === null) return [];
    const key = keyOf(one);
    const story = sums.get(key) ?? { x: { total: 0, magnitude: 0 }, y: { total: 0, magnitude: 0 } };
    add(story.x, one.total * direction.cos);
    add(story.y, one.total * direction.sin);
    sums.set(key, story);
  }
  const balances = document.balance.filter((one) => one.case === caseName);
  const base = { x: largest(balances, 'force x'), y: largest(balances, 'force y') };
  return balances.flatMap((one) => {
    const story = sums.get(keyOf(one));
    if (!story) return [];
    return (['x', 'y'] as const).flatMap((direction): ShareSum[] => {
      const own = lineOf(one, `force ${direction}`);
      if (own === null) return [];
      const resisted = own - (lineOf(one, `transfers ${direction}`) ?? 0) + (lineOf(one, `sideways ${direction}`) ?? 0);
      const { total, magnitude } = story[direction];
      const measure = Math.max(Math.abs(resisted), magnitude, 0.001 * base[direction]);
      const residual = measure === 0 ? 0 : Math.abs(total - resisted) / measure;
      return [{ basis: one.basis, variant: one.variant, level: one.level, direction, sum: total, resisted, residual }];
    });
  });
}

function directionIn(row: WallRow | undefined): { cos: number; sin: number } | null {
  if (!row) return null;
  const [dx, dy] = [row.x2 - row.x1, row.y2 - row.y1];
  const length = Math.sqrt(dx * dx + dy * dy);
  return length > 0 ? { cos: dx / length, sin: dy / length } : null;
}

function add(sum: Sum, value: number): void {
  sum.total += value;
  sum.magnitude += Math.abs(value);
}

function lineOf(balance: ResultBalance, name: ResultBalance['lines'][number]['line']): number | null {
  return balance.lines.find(({ line }) => line === name)?.resisted ?? null;
}

const largest = (balances: readonly ResultBalance[], name: 'force x' | 'force y'): number =>
  balances.reduce((most, one) => Math.max(most, Math.abs(lineOf(one, name) ?? 0)), 0);
