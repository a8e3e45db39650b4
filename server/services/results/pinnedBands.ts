import type { Tables } from '#shared/engineering/input';
import { levelOrder } from '#shared/engineering/model/check-tables/levelOrder';
import type { PinnedBand } from '#shared/engineering/wall-design/designTypes';

import type { ScheduleRecord } from '../../db/repositories/ScheduleRepository.ts';

/** Levels a wall stands in, from the base up. */
export function wallStories(tables: Pick<Tables, 'levels' | 'walls'>): Map<string, string[]> {
  const order = levelOrder(tables.levels).map((index) => tables.levels[index]?.level ?? '');
  const place = new Map(order.map((level, index) => [level, index]));
  const spans = new Map<string, { from: number; to: number }>();
  for (const { wall, from_level, to_level } of tables.walls) {
    const from = place.get(from_level);
    const to = place.get(to_level);
    if (from === undefined || to === undefined) continue;
    const span = spans.get(wall) ?? { from, to };
    spans.set(wall, { from: Math.min(span.from, from), to: Math.max(span.to, to) });
  }
  return new Map([...spans].map(([wall, { from, to }]) => [wall, order.slice(from, to + 1)]));
}

/**
 * Overwritten rows as the engine wants them: those of their stories that still stand, from the lowest to the highest, so that a
 * level put between belongs to the band. A row whose stories are all gone is not among them.
 */
export function pinnedBands(
  records: readonly ScheduleRecord[],
  tables: Pick<Tables, 'levels' | 'walls'>,
): PinnedBand[] {
  const overwritten = records.filter((record) => Object.keys(record.own).length > 0);
  if (overwritten.length === 0) return [];
  const stories = wallStories(tables);
  return overwritten.flatMap(({ wall, stories: own, own: cells }) => {
    const standing = (stories.get(wall) ?? []).filter((level) => own.includes(level));
    const fromLevel = standing[0];
    const toLevel = standing.at(-1);
    return fromLevel === undefined || toLevel === undefined ? [] : [{ wall, fromLevel, toLevel, own: cells }];
  });
}
