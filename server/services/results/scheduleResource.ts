import type { OrphanedOverwrite, ScheduleResourceRow } from '#shared/contracts/schedule';

import type { Computed } from '../../compute/Runner.ts';
import type { ScheduleRecord } from '../../db/repositories/ScheduleRepository.ts';

/** Rows of the result joined with their stored records: `records[i]` belongs to `schedule[i]`, what is left has no stories. */
export function scheduleRows({ schedule, rows }: Computed, records: readonly ScheduleRecord[]): ScheduleResourceRow[] {
  return schedule.map((row, place): ScheduleResourceRow => {
    const record = records[place];
    const design = rows[place];
    if (record === undefined || design === undefined) throw new Error('schedule rows and their records do not match');
    return {
      ...row,
      id: record.id,
      version: record.version,
      overwritten: design.overwritten,
      automatic: design.automatic,
      reason: record.reason,
    };
  });
}

export function orphanedOverwrites(computed: Computed, records: readonly ScheduleRecord[]): OrphanedOverwrite[] {
  return records.slice(computed.schedule.length).map(({ id, version, wall, fromLevel, toLevel, own, reason }) => ({
    id,
    version,
    wall,
    from: fromLevel,
    to: toLevel,
    own,
    reason,
  }));
}
