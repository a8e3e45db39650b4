import { useCallback, useMemo, useRef, useState, type CSSProperties, type ReactElement } from 'react';

import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResource, ScheduleResourceRow } from '#shared/contracts/schedule';
import type { TableResource } from '#shared/contracts/tables';
import type { OwnCells } from '#shared/engineering/wall-design/designTypes';
import { printLevelRange } from '#shared/format/levelRange';
import { formatRatio } from '#shared/format/ratio';

import { sentenceOf } from '../../app/errorSentences.ts';
import { useCanEdit } from '../../app/useCanEdit.ts';
import { DataGrid } from '../../components/grid/DataGrid.tsx';
import type { GridEdit } from '../../components/grid/gridTypes.ts';
import { useUndo } from '../../data/mutations.ts';
import { useBuildingInput } from '../../engine/useBuildingInput.ts';
import { editedColumns, isEditedColumn } from './cellText.ts';
import { ConflictNote } from './ConflictNote.tsx';
import { Leaders } from './Leaders.tsx';
import { NotesEditor } from './NotesEditor.tsx';
import { OrphanNotes } from './OrphanNotes.tsx';
import type { BandElevations } from './parseColumn.ts';
import { scheduleColumns } from './scheduleColumns.tsx';
import { findRows } from './findRows.ts';
import { filterRows, type ScheduleFilter } from './scheduleFilter.ts';
import { ScheduleReading } from './ScheduleReading.tsx';
import { ScheduleToolbar } from './ScheduleToolbar.tsx';
import type { ScheduleChoice } from './useScheduleChoice.ts';
import { useScheduleEdits } from './useScheduleEdits.ts';
import { WeighLink } from './WeighLink.tsx';
import { WallFoot } from './WallFoot.tsx';
import { WallHead } from './WallHead.tsx';

export interface ScheduleSheetProps {
  id: string;
  document: ResultDocument;
  walls: TableResource<'walls'>;
  schedule: ScheduleResource;
  filter: ScheduleFilter;
  /** wall mark or bar text that rows have to show */
  find: string;
  choice: ScheduleChoice;
}

const rowId = (row: ScheduleResourceRow): string => row.id;
const wallOf = (row: ScheduleResourceRow): string => row.wall;

/** The grid takes what strip, head, toolbar and foot leave of the window. */
const gridHeight: CSSProperties & Record<'--gw-grid-height', string> = {
  '--gw-grid-height': 'calc(100vh - var(--strip) - var(--head) - var(--foot) - 56px)',
};

/** Edits of one commit by row: parts of one cell that were edited together become one whole cell. */
export function mergeEdits(edits: readonly GridEdit[]): ReadonlyMap<string, OwnCells> {
  const byRow = new Map<string, OwnCells>();
  for (const { rowId: id, value } of edits) byRow.set(id, { ...byRow.get(id), ...(value as OwnCells) });
  return byRow;
}

/** The grid of the schedule with what an edit reads as, its conflicts and the way back to the automatic choice. */
export function ScheduleSheet({
  id,
  document,
  walls,
  schedule,
  filter,
  find,
  choice,
}: ScheduleSheetProps): ReactElement {
  const { units } = document;
  const canEdit = useCanEdit();
  const edits = useScheduleEdits(id, units);
  const undo = useUndo(id);
  const input = useBuildingInput(id);
  const [cell, setCell] = useState<{ rowId: string; columnId: string } | null>(null);
  const [notesOf, setNotesOf] = useState<string | null>(null);
  const rows = useMemo(
    () => findRows(filterRows(schedule.rows, filter), find, units),
    [schedule.rows, filter, find, units],
  );
  const { down, levelsOf } = choice;
  const bandOf = useCallback(
    ({ from, to }: Pick<ScheduleResourceRow, 'from' | 'to'>): BandElevations => {
      const foot = down.find((level) => level.level === from);
      const head = down.find((level) => level.level === to);
      return { from: foot ? foot.elevation - foot.height : 0, to: head?.elevation ?? 0 };
    },
    [down],
  );
  const columns = useMemo(() => scheduleColumns({ units, bandOf }), [units, bandOf]);
  const host = useRef<HTMLDivElement>(null);
  const focused = cell === null ? null : (schedule.rows.find((row) => row.id === cell.rowId) ?? null);
  const noted = schedule.rows.find((row) => row.id === notesOf);
  const release = (row: string, columnId: string): void => {
    const stored = schedule.rows.find((one) => one.id === row);
    if (!isEditedColumn(columnId) || !stored?.overwritten.includes(editedColumns[columnId])) return;
    edits.send({ rowId: row, release: [editedColumns[columnId]] });
  };
  const error = edits.error ?? undo.error;
  return (
    <>
      <ScheduleToolbar
        row={focused}
        columnId={cell?.columnId ?? null}
        units={units}
        canEdit={canEdit}
        saving={edits.saving}
        toWeigh={<WeighLink buildingId={id} document={document} />}
        onTakeAuto={() => {
          if (cell) release(cell.rowId, cell.columnId);
        }}
        onEditNotes={() => setNotesOf(focused?.id ?? null)}
      />
      {noted ? (
        <NotesEditor
          key={noted.id}
          row={noted}
          onKeep={(notes) => {
            edits.send({ rowId: noted.id, own: { notes } });
            setNotesOf(null);
          }}
          onTakeAuto={() => {
            edits.send({ rowId: noted.id, release: ['notes'] });
            setNotesOf(null);
          }}
          onLeave={() => setNotesOf(null)}
        />
      ) : null}
      {error ? (
        <p role="alert" className="gw-problem mb-2 text-data">
          {sentenceOf(error)}
        </p>
      ) : null}
      {edits.alsoChanged.length > 0 ? (
        <p role="status" className="mb-2 text-data">
          Changed with this edit: {edits.alsoChanged.map(sayRow).join('; ')}.
        </p>
      ) : null}
      {edits.conflict ? (
        <ConflictNote
          conflict={edits.conflict}
          units={units}
          onKeepMine={edits.keepMine}
          onTakeTheirs={edits.takeTheirs}
        />
      ) : null}
      <OrphanNotes
        orphans={schedule.orphans}
        canEdit={canEdit}
        onRelease={(orphan, cells) => edits.send({ rowId: orphan, release: cells })}
      />
      {rows.length === 0 ? (
        <p className="border-t border-ink py-3 text-graphite" role="status">
          {find.trim() !== ''
            ? `No row has a wall or a bar that reads ${find.trim()}${filter === 'all' ? '' : ' among those shown'}. Esc in the field shows all rows.`
            : filter === 'over'
              ? 'No band is over a limit.'
              : 'No cell is overwritten.'}
        </p>
      ) : (
        <div ref={host} className="relative" style={gridHeight}>
          <Leaders host={host} rows={rows} wall={choice.wall} chosenRowId={choice.row?.id ?? null} down={down} />
          <DataGrid
            name="Wall schedule"
            columns={columns}
            rows={rows}
            rowId={rowId}
            groupOf={wallOf}
            renderGroupHead={(wall) => <WallHead wall={wall} rows={walls.rows} units={units} />}
            renderGroupFoot={(wall) => (
              <WallFoot
                rows={schedule.rows.filter((row) => row.wall === wall)}
                quantities={document.quantities.walls.find((one) => one.wall === wall)}
                units={units}
                document={document}
              />
            )}
            rowHeight={40}
            rowState={(row) => ({ over: !row.ok })}
            pending={edits.pending}
            onCommit={(committed) => {
              for (const [row, own] of mergeEdits(committed)) edits.send({ rowId: row, own });
            }}
            onClear={release}
            onUndo={() => undo.mutate()}
            reading={(row, columnId, draft) =>
              isEditedColumn(columnId) ? (
                <ScheduleReading
                  column={columnId}
                  draft={draft}
                  row={row}
                  rows={schedule.rows}
                  checks={document.checks}
                  levels={levelsOf(row).map((level) => level.level)}
                  units={units}
                  band={bandOf(row)}
                  input={input}
                />
              ) : null
            }
            onFocusCell={(row, columnId) => {
              setCell({ rowId: row, columnId });
              const next = schedule.rows.find((one) => one.id === row);
              if (next) choice.chooseRow(next);
            }}
            focusRowId={choice.row?.id ?? null}
            readOnly={!canEdit}
          />
        </div>
      )}
    </>
  );
}

const sayRow = (row: ScheduleResourceRow): string =>
  `${row.wall} ${printLevelRange(row.from, row.to)}, ${row.ratio === null ? '–' : formatRatio(row.ratio)}${row.ok ? '' : ' over'}`;
