import type { ScheduleResourceRow } from '#shared/contracts/schedule';

export const scheduleFilters = [
  { value: 'all', text: 'All walls' },
  { value: 'over', text: 'Over a limit' },
  { value: 'overwritten', text: 'Overwritten' },
] as const;
export type ScheduleFilter = (typeof scheduleFilters)[number]['value'];

export function filterRows(
  rows: readonly ScheduleResourceRow[],
  filter: ScheduleFilter,
): readonly ScheduleResourceRow[] {
  if (filter === 'over') return rows.filter((row) => !row.ok);
  if (filter === 'overwritten') return rows.filter((row) => row.overwritten.length > 0);
  return rows;
}

const count = (value: number, one: string, many: string): string => `${value} ${value === 1 ? one : many}`;

export interface ScheduleSummary {
  readonly size: string;
  readonly over: string | null;
  readonly rest: readonly string[];
}

/** `12 walls, 70 bands`, what is over, what is overwritten, what is not settled. */
export function summarize(rows: readonly ScheduleResourceRow[]): ScheduleSummary {
  const walls = new Set(rows.map((row) => row.wall)).size;
  const over = rows.filter((row) => !row.ok).length;
  const overwritten = rows.reduce((sum, row) => sum + row.overwritten.length, 0);
  const open = rows.filter((row) => row.ok && row.state === 'not settled').length;
  return {
    size: `${count(walls, 'wall', 'walls')}, ${count(rows.length, 'band', 'bands')}`,
    over: over === 0 ? null : `${over} over a limit`,
    rest: [
      ...(overwritten === 0 ? [] : [count(overwritten, 'cell overwritten', 'cells overwritten')]),
      ...(open === 0 ? [] : [`${open} not settled`]),
    ],
  };
}
