import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';

import { columnText, type EditedColumn } from './cellText.ts';

const searched: readonly EditedColumn[] = ['vertical', 'horizontal', 'endsBars', 'ties'];

const plain = (text: string): string => text.toLowerCase().replace(/\s+/g, '');

/** Rows whose wall begins with the text, or that show it in a bar notation; without regard to case and spaces. */
export function findRows(
  rows: readonly ScheduleResourceRow[],
  text: string,
  units: UnitSystem,
): readonly ScheduleResourceRow[] {
  const wanted = plain(text);
  if (wanted === '') return rows;
  return rows.filter(
    (row) =>
      plain(row.wall).startsWith(wanted) ||
      searched.some((column) => plain(columnText(column, row, units)).includes(wanted)),
  );
}
