import type { SchedulePatch } from '#shared/contracts/schedule';

import type { ScheduleChange } from './scheduleChange.ts';

/** Whole cells, never text; arrays copied, since the contract's types are writable. */
export function toPatch({ own = {}, release }: ScheduleChange, version: number): SchedulePatch {
  const { notes, ...cells } = own;
  return {
    version,
    ...cells,
    ...(notes === undefined ? {} : { notes: [...notes] }),
    ...(release === undefined || release.length === 0 ? {} : { release: [...release] }),
  };
}
