import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { OverwritableCell, OwnCells, PinnedBand } from '#shared/engineering/wall-design/designTypes';

const ownCells = (row: ScheduleResourceRow): OwnCells =>
  Object.fromEntries(row.overwritten.map((cell: OverwritableCell) => [cell, row[cell]]));

/** The bands that carry an engineer's own cells, as the engine takes them. */
export const pinnedBands = (rows: readonly ScheduleResourceRow[]): PinnedBand[] =>
  rows
    .filter((row) => row.overwritten.length > 0)
    .map((row) => ({ wall: row.wall, fromLevel: row.from, toLevel: row.to, own: ownCells(row) }));

/** The same with one row's cells put over it, as they would stand after an edit. */
export function pinnedWith(rows: readonly ScheduleResourceRow[], rowId: string, own: OwnCells): PinnedBand[] {
  const row = rows.find((one) => one.id === rowId);
  if (!row) return pinnedBands(rows);
  const others = pinnedBands(rows.filter((one) => one.id !== rowId));
  return [...others, { wall: row.wall, fromLevel: row.from, toLevel: row.to, own: { ...ownCells(row), ...own } }];
}
