import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import type { OverwritableCell } from '#shared/engineering/wall-design/designTypes';

import { columnText, editedColumns, type EditedColumn } from './cellText.ts';
import type { ScheduleChange } from './scheduleChange.ts';

/** A row as it stands with a change that the server has not answered yet: cells and marks, with the ratio of before. */
export function applyChange(row: ScheduleResourceRow, { own = {}, release = [] }: ScheduleChange): ScheduleResourceRow {
  const released = new Set<OverwritableCell>(release);
  const taken = Object.keys(own) as OverwritableCell[];
  const automatic = Object.fromEntries(release.map((cell) => [cell, row.automatic[cell]]));
  const kept = row.overwritten.filter((cell) => !released.has(cell) && !taken.includes(cell));
  return { ...row, ...automatic, ...own, overwritten: [...kept, ...taken] };
}

/** Columns whose text a change alters. */
export function changedColumns(
  row: ScheduleResourceRow,
  change: ScheduleChange,
  units: UnitSystem,
): readonly EditedColumn[] {
  const after = applyChange(row, change);
  return (Object.keys(editedColumns) as EditedColumn[]).filter(
    (column) => columnText(column, after, units) !== columnText(column, row, units),
  );
}
