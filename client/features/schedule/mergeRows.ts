import type { ScheduleResource, ScheduleResourceRow } from '#shared/contracts/schedule';

/** The schedule with rows put in the place of those with the same id; a row that is not there yet waits for the next fetch. */
export function mergeRows(before: ScheduleResource, rows: readonly ScheduleResourceRow[]): ScheduleResource {
  const byId = new Map(rows.map((row) => [row.id, row]));
  return { ...before, rows: before.rows.map((row) => byId.get(row.id) ?? row) };
}
