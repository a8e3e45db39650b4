import { overwritableCells, type OwnCells } from '#shared/engineering/wall-design/designTypes';

import type { ScheduleState } from '../../change-log/delta.ts';

/** Own cells for the change log: {value} or null, since a cell may be overwritten with null (no end zone). */
export function scheduleState(own: OwnCells, reason: string | null): ScheduleState {
  return {
    own: Object.fromEntries(overwritableCells.map((cell) => [cell, cell in own ? { value: own[cell] } : null])),
    reason,
  };
}

/** And back. */
export function ownOfState(state: ScheduleState): OwnCells {
  return Object.fromEntries(
    Object.entries(state.own).flatMap(([cell, kept]) => (kept === null ? [] : [[cell, kept.value]])),
  ) as OwnCells;
}
