import { useCallback, useMemo, useState } from 'react';

import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, TablePatch } from '#shared/contracts/tables';

import { sentenceOf } from '../../app/errorSentences.ts';
import { DataGrid } from '../../components/grid/DataGrid.tsx';
import type { GridEdit } from '../../components/grid/gridTypes.ts';
import { usePendingCells } from '../../components/grid/usePendingCells.ts';
import { Button } from '../../components/ui/Button.tsx';
import type { ApiError } from '../../data/ApiError.ts';
import { usePatchTable, useUndo } from '../../data/mutations.ts';
import { inputColumns, valueOf, type ColumnContext, type InputRow } from './inputColumns.ts';
import { newRow } from './newRow.ts';
import { pastedPatch } from './pastedPatch.ts';
import { rowNames, tabNames } from './tabNames.ts';

export interface TablePaneProps {
  readonly buildingId: string;
  readonly table: EditableTable;
  readonly context: ColumnContext;
  readonly canEdit: boolean;
  /** row that the page has chosen elsewhere */
  readonly focusRowId: string | null;
  readonly onFocusRow: (row: InputRow) => void;
  /** a line beneath the grid: totals of the table */
  readonly summary: string;
}

const rowHeight = 32;
const rowId = (row: InputRow) => row.id;

/** What the server says of a refused edit: its own words where it names a cell, else the sentence of the code. */
const wordsOf = (error: ApiError): string => error.problems[0]?.message ?? sentenceOf(error);

/** One input table: the grid, and the buttons that add and take out rows. */
export function TablePane({ buildingId, table, context, canEdit, focusRowId, onFocusRow, summary }: TablePaneProps) {
  const patchTable = usePatchTable(buildingId, table);
  const undo = useUndo(buildingId);
  const pending = usePendingCells();
  const [notice, setNotice] = useState<string | null>(null);
  const [focusedId, setFocusedId] = useState<string | null>(null);
  const [addedId, setAddedId] = useState<string | null>(null);
  const { rows } = context;
  const columns = useMemo(() => inputColumns(table, context), [table, context]);
  const byId = useMemo(() => new Map(rows.map((row) => [row.id, row])), [rows]);
  const focused = focusedId === null ? null : (byId.get(focusedId) ?? null);

  const send = (patch: Partial<TablePatch>) => {
    setNotice(null);
    const answered = pending.begin((patch.edits ?? []).map(({ id, column }) => ({ rowId: id, columnId: column })));
    // a promise of its own for every edit: a quick second one does not silence what the server says of the first
    void patchTable
      .mutateAsync(patch)
      .then(
        (answer) => {
          // the first new row is the chosen one, ready to be typed over
          const added = patch.inserts === undefined ? undefined : answer.rows.find((row) => !byId.has(row.id));
          if (added === undefined) return;
          setAddedId(added.id);
          setFocusedId(added.id);
        },
        (error: ApiError) => setNotice(`${wordsOf(error)} What is stored stays as it is.`),
      )
      .finally(answered);
  };
  const commit = (edits: readonly GridEdit[]) => {
    send({
      edits: edits.map((edit) => {
        const row = byId.get(edit.rowId);
        return {
          id: edit.rowId,
          column: edit.columnId,
          was: row === undefined ? null : valueOf(row, edit.columnId),
          to: edit.value as CellValue,
        };
      }),
    });
  };
  const clear = (id: string, columnId: string) => {
    const row = byId.get(id);
    const column = columns.find((one) => one.id === columnId);
    if (row === undefined || column === undefined || valueOf(row, columnId) === null) return;
    const parsed = column.parse('', row);
    if (!parsed.ok) {
      setNotice(`${column.header} can't be blank, expected ${parsed.expected}.`);
      return;
    }
    commit([{ rowId: id, columnId, value: null, text: '' }]);
  };
  const addRow = () => {
    const at = focused === null ? rows.length - 1 : rows.indexOf(focused);
    // levels read from the top down: a new one goes above the chosen one, other rows go below it
    const above = table === 'levels' ? rows[at - 1] : rows[at];
    const after = table === 'levels' && focused === null ? null : (above?.id ?? null);
    send({ inserts: [{ after, row: newRow(table, { ...context, beside: focused }) }] });
  };
  const deleteRow = () => {
    if (focused === null) return;
    const version = (focused as { readonly version: number }).version;
    send({ deletes: [{ id: focused.id, version }] });
  };
  const onFocusCell = useCallback(
    (id: string) => {
      setFocusedId(id);
      setAddedId(null);
      const row = byId.get(id);
      if (row !== undefined) onFocusRow(row);
    },
    [byId, onFocusRow],
  );
  const first = columns[0];
  const mark = focused === null || first === undefined ? null : first.text(focused);

  return (
    <div className="flex min-w-0 flex-col">
      <DataGrid
        key={table}
        name={tabNames[table]}
        columns={columns}
        rows={rows}
        rowId={rowId}
        rowHeight={rowHeight}
        readOnly={!canEdit}
        focusRowId={addedId ?? focusRowId}
        pending={pending.rows}
        onCommit={commit}
        onClear={clear}
        onUndo={() => {
          if (!canEdit) return;
          setNotice(null);
          undo.mutate(undefined, { onError: (error) => setNotice(sentenceOf(error)) });
        }}
        onPasteRows={(cells, at) => {
          const pasted = pastedPatch(cells, { table, columns, rows, at });
          if (pasted.ok) send(pasted.patch);
          else setNotice(pasted.message);
        }}
        onFocusCell={onFocusCell}
      />
      <div className="mt-2 flex min-h-[32px] flex-wrap items-center gap-2">
        {canEdit ? (
          <>
            <Button onClick={addRow}>{`Add ${table === 'overrides' ? 'an' : 'a'} ${rowNames[table].one}`}</Button>
            <Button onClick={deleteRow} disabled={focused === null}>
              {`Delete ${rowNames[table].one}${mark === null || table === 'forces' || table === 'gravity' || table === 'overrides' ? '' : ` ${mark}`}`}
            </Button>
          </>
        ) : (
          <span className="gw-tag text-graphite">read only for your role</span>
        )}
        <span className="note ml-auto">{summary}</span>
      </div>
      <div role="alert">{notice === null ? null : <p className="gw-problem mt-2 font-medium">{notice}</p>}</div>
    </div>
  );
}
