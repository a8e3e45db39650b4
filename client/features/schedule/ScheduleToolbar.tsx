import type { ReactElement, ReactNode } from 'react';

import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import { printLevelRange } from '#shared/format/levelRange';

import { Button } from '../../components/ui/Button.tsx';
import { columnText, editedColumns, isEditedColumn } from './cellText.ts';

export interface ScheduleToolbarProps {
  /** row and column of the focused cell */
  row: ScheduleResourceRow | null;
  columnId: string | null;
  units: UnitSystem;
  canEdit: boolean;
  saving: boolean;
  /** the way to what there is to weigh */
  toWeigh: ReactNode;
  onTakeAuto: () => void;
  onEditNotes: () => void;
}

/** The focused cell beside its automatic choice, and the marks of the grid in words. */
export function ScheduleToolbar({
  row,
  columnId,
  units,
  canEdit,
  saving,
  toWeigh,
  onTakeAuto,
  onEditNotes,
}: ScheduleToolbarProps): ReactElement {
  const column = columnId !== null && isEditedColumn(columnId) ? columnId : null;
  const releasable = row !== null && column !== null && row.overwritten.includes(editedColumns[column]);
  return (
    <div className="gw-no-print flex min-h-[32px] flex-wrap items-center gap-x-3 gap-y-1 text-note text-graphite">
      {canEdit ? (
        <>
          <Button
            className="h-[24px] text-note"
            aria-disabled={!releasable}
            onClick={() => {
              if (releasable) onTakeAuto();
            }}
          >
            Take auto selection
          </Button>
          <Button
            className="h-[24px] text-note"
            aria-disabled={row === null}
            onClick={() => {
              if (row !== null) onEditNotes();
            }}
          >
            Edit notes
          </Button>
        </>
      ) : (
        <span>Your role reads the schedule; engineers edit it.</span>
      )}
      {releasable ? (
        <span className="text-ink">
          {row.wall}, {printLevelRange(row.from, row.to)}:{' '}
          <span className="mono">{columnText(column, row, units)}</span>, auto{' '}
          <span className="mono">{columnText(column, row.automatic, units)}</span>
        </span>
      ) : null}
      <span role="status">{saving ? 'saving' : ''}</span>
      <span className="ml-auto">{toWeigh}</span>
      <span className="flex items-center gap-2">
        <i className="inline-block h-[16px] w-[3px] bg-ochre" aria-hidden="true" />
        overwritten
      </span>
      <span className="flex items-center gap-2">
        <i
          className="inline-block h-[14px] w-[6px] shadow-[inset_0_0_0_1px_var(--oxide)]"
          style={{ background: 'var(--hatch)' }}
          aria-hidden="true"
        />
        over a limit
      </span>
    </div>
  );
}
