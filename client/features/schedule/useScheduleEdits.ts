import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef, useState } from 'react';

import type { ScheduleResource, ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';

import type { PendingRows } from '../../components/grid/pendingCells.ts';
import { usePendingCells } from '../../components/grid/usePendingCells.ts';
import { ApiError } from '../../data/ApiError.ts';
import { keys } from '../../data/keys.ts';
import { usePatchSchedule } from '../../data/mutations.ts';
import { applyChange, changedColumns } from './applyChange.ts';
import { mergeRows } from './mergeRows.ts';
import type { ScheduleChange } from './scheduleChange.ts';
import { toPatch } from './toPatch.ts';

/** Both values of a row that someone else changed meanwhile. */
export interface ScheduleConflict {
  readonly change: ScheduleChange;
  readonly stored: ScheduleResourceRow;
}

export interface ScheduleEdits {
  readonly send: (change: ScheduleChange) => void;
  readonly saving: boolean;
  /** cells that wait for the server */
  readonly pending: PendingRows;
  readonly conflict: ScheduleConflict | null;
  readonly keepMine: () => void;
  readonly takeTheirs: () => void;
  readonly error: ApiError | null;
  /** rows of the last answer whose verdict changed with the edit, beside the edited one */
  readonly alsoChanged: readonly ScheduleResourceRow[];
}

const isRow = (value: unknown): value is ScheduleResourceRow =>
  typeof value === 'object' && value !== null && 'id' in value && 'version' in value && 'vertical' in value;

/**
 * Sends edits one after the other, each with the version that the answer before it left, so that two quick edits of one person
 * never conflict with each other. A conflict with someone else stops there and shows both values.
 */
export function useScheduleEdits(id: string, units: UnitSystem): ScheduleEdits {
  const client = useQueryClient();
  const { mutateAsync } = usePatchSchedule(id);
  const queue = useRef<Promise<void>>(Promise.resolve());
  const [open, setOpen] = useState(0);
  const { rows: pending, begin } = usePendingCells();
  const [conflict, setConflict] = useState<ScheduleConflict | null>(null);
  const [error, setError] = useState<ApiError | null>(null);
  const [alsoChanged, setAlsoChanged] = useState<readonly ScheduleResourceRow[]>([]);
  const key = keys.schedule(id);

  const store = useCallback(
    (rows: readonly ScheduleResourceRow[]) =>
      client.setQueryData<ScheduleResource>(keys.schedule(id), (before) => before && mergeRows(before, rows)),
    [client, id],
  );

  const sendNow = useCallback(
    async (change: ScheduleChange, version: number, before: ScheduleResourceRow | undefined): Promise<void> => {
      try {
        const answer = await mutateAsync({ rowId: change.rowId, patch: toPatch(change, version) });
        store(answer.row === null ? answer.alsoChanged : [answer.row, ...answer.alsoChanged]);
        setAlsoChanged(answer.alsoChanged);
      } catch (failure) {
        const refusal = failure instanceof ApiError ? failure : new ApiError('internal', 0, 'The edit was not sent.');
        const { code, current } = refusal;
        if (code === 'version' && isRow(current)) setConflict({ change, stored: current });
        else setError(refusal);
        if (before) store([isRow(current) ? current : before]);
      }
    },
    [mutateAsync, store],
  );

  const enqueue = useCallback(
    (change: ScheduleChange, version: number | null) => {
      setOpen((count) => count + 1);
      const shown = client
        .getQueryData<ScheduleResource>(keys.schedule(id))
        ?.rows.find((row) => row.id === change.rowId);
      const columns = shown === undefined ? [] : changedColumns(shown, change, units);
      const answered = begin(columns.map((columnId) => ({ rowId: change.rowId, columnId })));
      setError(null);
      setAlsoChanged([]);
      queue.current = queue.current.then(async () => {
        const { rows = [], orphans = [] } = client.getQueryData<ScheduleResource>(keys.schedule(id)) ?? {};
        const stored = version ?? [...rows, ...orphans].find((row) => row.id === change.rowId)?.version;
        const before = rows.find((row) => row.id === change.rowId);
        // the cell shows the edit at once; its ratio follows with the answer
        if (before) store([applyChange(before, change)]);
        if (stored !== undefined) await sendNow(change, stored, before);
        setOpen((count) => count - 1);
        answered();
      });
    },
    [begin, client, id, units, sendNow, store],
  );

  return {
    send: (change) => enqueue(change, null),
    saving: open > 0,
    pending,
    conflict,
    keepMine: () => {
      if (conflict) enqueue(conflict.change, conflict.stored.version);
      setConflict(null);
    },
    takeTheirs: () => {
      if (conflict) store([conflict.stored]);
      setConflict(null);
      void client.invalidateQueries({ queryKey: key });
    },
    error,
    alsoChanged,
  };
}
