import { useCallback, useEffect, useId, useMemo, useRef, useState, type CSSProperties } from 'react';

import { CellEditor } from './CellEditor.tsx';
import { fromClipboard, toClipboard } from './clipboardRows.ts';
import { GridHeader } from './GridHeader.tsx';
import { keyOnCell } from './gridKeys.ts';
import { gridLines } from './gridLines.ts';
import { chosenRange, locate, type GridAction } from './gridReducer.ts';
import { GridRow } from './GridRow.tsx';
import type { DataGridProps, GridEdit } from './gridTypes.ts';
import { editTextOf, isEditable, pastedEdits } from './pastedEdits.ts';
import { ReadingLine } from './ReadingLine.tsx';
import { useGridState } from './useGridState.ts';
import { useGridWindow } from './useGridWindow.ts';

/**
 * The one grid of the application: ARIA grid with one tab stop, arrows, typing or Enter to edit, Escape to leave, rows to and from
 * spreadsheets. It keeps no data: edits go out through `onCommit`, and rows come back in.
 */
export function DataGrid<Row extends object>({
  name,
  columns,
  rows,
  rowId,
  groupOf,
  renderGroupHead,
  renderGroupFoot,
  rowHeight,
  rowState,
  pending,
  onCommit,
  onClear,
  onUndo,
  onPasteRows,
  reading,
  onFocusCell,
  focusRowId = null,
  readOnly = false,
}: DataGridProps<Row>) {
  const rowIds = useMemo(() => rows.map(rowId), [rows, rowId]);
  const columnIds = useMemo(() => columns.map((column) => column.id), [columns]);
  const { state, shape, dispatch, now } = useGridState(rowIds, columnIds);
  const [active, setActive] = useState(false);
  const [notice, setNotice] = useState<string | null>(null);
  const scroller = useRef<HTMLDivElement>(null);
  const wantsFocus = useRef(false);
  const readingId = useId();

  const lines = useMemo(
    () =>
      gridLines(rows, rowId, groupOf, { heads: renderGroupHead !== undefined, feet: renderGroupFoot !== undefined }),
    [rows, rowId, groupOf, renderGroupHead, renderGroupFoot],
  );
  const place = locate(state, shape);
  const pageRow = focusRowId === null ? -1 : rowIds.indexOf(focusRowId);
  // while nobody is in the grid, the tab stop stands in the row that the page has chosen
  const stop = !active && pageRow >= 0 ? { row: pageRow, column: place.column } : place;
  const range = chosenRange(state, shape);
  const ranged = state.anchor !== null;
  const lineOf = useCallback(
    (row: number) => lines.findIndex((line) => line.kind === 'row' && line.rowIndex === row),
    [lines],
  );
  const view = useGridWindow({ lines, rowHeight, scroller, keptLine: active ? lineOf(stop.row) : -1 });
  const { scrollTo } = view;

  // the focus follows the state once the cell is drawn
  useEffect(() => {
    if (!wantsFocus.current || state.editing !== null) return;
    const cell = scroller.current?.querySelector<HTMLElement>(`[data-row="${stop.row}"][data-column="${stop.column}"]`);
    if (cell === null || cell === undefined) return;
    wantsFocus.current = false;
    cell.focus();
  });

  // a story chosen in the stack is brought into view
  useEffect(() => {
    if (pageRow < 0 || active) return;
    scrollTo(lineOf(pageRow));
    scroller.current
      ?.querySelector<HTMLElement>(`[data-row="${pageRow}"][data-column="0"]`)
      ?.scrollIntoView({ block: 'nearest' });
  }, [pageRow, active, scrollTo, lineOf]);

  const step = (action: GridAction) => {
    const before = now();
    const after = dispatch(action);
    if (after.editing === null) {
      wantsFocus.current = true;
      if (view.drawn !== null) scrollTo(lineOf(locate(after, shape).row));
    }
    if (after.rowId !== null && after.columnId !== null) {
      if (after.rowId !== before.rowId || after.columnId !== before.columnId)
        onFocusCell?.(after.rowId, after.columnId);
    }
  };

  const cellAt = (row: number, column: number) => {
    const oneRow = rows[row];
    const oneColumn = columns[column];
    if (oneRow === undefined || oneColumn === undefined) return null;
    return { row: oneRow, column: oneColumn, editable: !readOnly && isEditable(oneColumn, oneRow) };
  };

  const begin = (draft?: string) => {
    const cell = cellAt(stop.row, stop.column);
    if (cell === null || !cell.editable) return;
    setNotice(null);
    dispatch({ type: 'to', row: stop.row, column: stop.column });
    dispatch({ type: 'edit', draft: draft ?? editTextOf(cell.column, cell.row) });
  };

  /** takes the draft if it parses; answers whether it did */
  const take = (): boolean => {
    const { editing } = now();
    const cell = cellAt(place.row, place.column);
    if (editing === null || cell === null) return true;
    const text = editing.draft.trim();
    if (text === editTextOf(cell.column, cell.row)) return true;
    const parsed = cell.column.parse(text, cell.row);
    if (!parsed.ok) return false;
    onCommit([{ rowId: rowId(cell.row), columnId: cell.column.id, value: parsed.value, text }]);
    return true;
  };

  const fillDown = () => {
    const edits: GridEdit[] = [];
    for (let column = range.fromColumn; column <= range.toColumn; column += 1) {
      const source = cellAt(range.fromRow, column);
      if (source === null) continue;
      const text = editTextOf(source.column, source.row);
      for (let row = range.fromRow + 1; row <= range.toRow; row += 1) {
        const target = cellAt(row, column);
        if (target === null || !target.editable || editTextOf(target.column, target.row) === text) continue;
        const parsed = target.column.parse(text, target.row);
        if (parsed.ok) edits.push({ rowId: rowId(target.row), columnId: target.column.id, value: parsed.value, text });
      }
    }
    if (edits.length > 0) onCommit(edits);
  };

  const paste = (text: string) => {
    const cells = fromClipboard(text);
    if (readOnly || cells.length === 0) return;
    setNotice(null);
    const start = rows[stop.row];
    if (onPasteRows !== undefined && stop.row + cells.length > rows.length) {
      onPasteRows(cells, { rowId: start === undefined ? null : rowId(start), columnId: columnIds[stop.column] ?? '' });
      return;
    }
    const pasted = pastedEdits(cells, { rows, columns, rowId, row: stop.row, column: stop.column });
    if (!pasted.ok) setNotice(pasted.message);
    else if (pasted.edits.length > 0) onCommit(pasted.edits);
  };

  const copied = (): string => {
    const from = ranged
      ? range
      : { fromRow: stop.row, toRow: stop.row, fromColumn: stop.column, toColumn: stop.column };
    const texts = rows
      .slice(from.fromRow, from.toRow + 1)
      .map((row) => columns.slice(from.fromColumn, from.toColumn + 1).map((column) => editTextOf(column, row)));
    return toClipboard(texts);
  };

  const onKey = (event: React.KeyboardEvent) => {
    const press = { key: event.key, ctrl: event.ctrlKey || event.metaKey, shift: event.shiftKey, alt: event.altKey };
    const intent = keyOnCell(press);
    if (intent === null) return;
    const extend = 'extend' in intent && intent.extend;
    switch (intent.kind) {
      case 'move':
        step({ type: 'to', row: stop.row + intent.rows, column: stop.column + intent.columns, extend });
        break;
      case 'row-edge':
        step({ type: 'to', row: stop.row, column: intent.end ? columns.length - 1 : 0, extend });
        break;
      case 'grid-edge':
        step({
          type: 'to',
          row: intent.end ? rows.length - 1 : 0,
          column: intent.end ? columns.length - 1 : 0,
          extend,
        });
        break;
      case 'choose-all':
        step({ type: 'all' });
        break;
      case 'collapse':
        dispatch({ type: 'collapse' });
        setNotice(null);
        break;
      case 'edit':
        begin();
        break;
      case 'type':
        begin(intent.text);
        break;
      case 'clear': {
        const cell = cellAt(stop.row, stop.column);
        if (cell?.editable === true) onClear?.(rowId(cell.row), cell.column.id);
        break;
      }
      case 'fill-down':
        fillDown();
        break;
      case 'undo':
        onUndo?.();
        break;
      default:
        return;
    }
    event.preventDefault();
  };

  const headRows = 1;
  const template = columns.map((column) => `minmax(${column.width}px, ${column.width}fr)`).join(' ');
  const minimum = columns.reduce((sum, column) => sum + column.width, 0);
  const style: CSSProperties & Record<'--gw-columns' | '--gw-width', string> = {
    '--gw-columns': template,
    '--gw-width': `${minimum}px`,
  };
  const drawn = view.drawn ?? lines.map((_, index) => ({ index, gap: 0 }));

  return (
    <>
      <div
        ref={scroller}
        role="grid"
        aria-label={name}
        aria-rowcount={lines.length + headRows}
        aria-colcount={columns.length}
        aria-readonly={readOnly}
        aria-multiselectable
        className={`gw-grid ${readOnly ? 'gw-grid-read' : ''}`}
        style={style}
        onFocus={(event) => {
          setActive(true);
          const row = Number(event.target.dataset.row ?? NaN);
          const column = Number(event.target.dataset.column ?? NaN);
          if (row >= 0 && column >= 0 && (row !== place.row || column !== place.column)) {
            dispatch({ type: 'to', row, column });
          }
        }}
        onBlur={(event) => {
          if (!event.currentTarget.contains(event.relatedTarget)) setActive(false);
        }}
        onKeyDown={onKey}
        onMouseDown={(event) => {
          const cell = event.target instanceof Element ? event.target.closest<HTMLElement>('[data-row]') : null;
          if (cell === null || event.target instanceof HTMLInputElement) return;
          const row = Number(cell.dataset.row);
          const column = Number(cell.dataset.column);
          // the field under the pointer keeps its draft if it parses, as with Tab
          take();
          step({ type: 'to', row, column, extend: event.shiftKey });
          if (event.shiftKey) event.preventDefault();
        }}
        onDoubleClick={(event) => {
          if (event.target instanceof Element && event.target.closest('[data-row]') !== null) begin();
        }}
        onCopy={(event) => {
          event.clipboardData.setData('text/plain', copied());
          event.preventDefault();
        }}
        onPaste={(event) => {
          paste(event.clipboardData.getData('text/plain'));
          event.preventDefault();
        }}
      >
        <GridHeader columns={columns} />
        <div role="rowgroup">
          {drawn.map(({ index, gap }) => {
            const line = lines[index];
            if (line === undefined) return null;
            const space = gap > 0 ? <div role="presentation" style={{ height: gap }} /> : null;
            const ariaRowIndex = index + headRows + 1;
            if (line.kind !== 'row') {
              const part = line.kind === 'head' ? renderGroupHead : renderGroupFoot;
              return (
                <div key={line.key} role="presentation" ref={view.measure} data-index={index}>
                  {space}
                  <div role="row" aria-rowindex={ariaRowIndex} className={`gw-grid-${line.kind}line`}>
                    <div role={line.kind === 'head' ? 'rowheader' : 'gridcell'} aria-colspan={columns.length}>
                      {part?.(line.group)}
                    </div>
                  </div>
                </div>
              );
            }
            const row = rows[line.rowIndex];
            if (row === undefined) return null;
            const here = line.rowIndex === stop.row;
            const column = columns[place.column];
            const editing = here && state.rowId === line.key ? state.editing : null;
            const parsed = editing === null || column === undefined ? null : column.parse(editing.draft.trim(), row);
            const expected = parsed === null || parsed.ok ? null : parsed.expected;
            const first = columns[0];
            const inRange = ranged && line.rowIndex >= range.fromRow && line.rowIndex <= range.toRow;
            return (
              <div key={line.key} role="presentation">
                {space}
                <GridRow
                  row={row}
                  rowIndex={line.rowIndex}
                  ariaRowIndex={ariaRowIndex}
                  columns={columns}
                  height={rowHeight}
                  chosen={active ? here : line.rowIndex === pageRow}
                  over={rowState?.(row).over === true}
                  readOnly={readOnly}
                  focusColumn={here ? stop.column : -1}
                  rangeFrom={inRange ? range.fromColumn : 0}
                  rangeTo={inRange ? range.toColumn : -1}
                  pending={pending?.get(line.key)}
                  editor={
                    editing === null || column === undefined ? null : (
                      <CellEditor
                        label={`${column.header}, ${first === undefined ? '' : first.text(row)}`}
                        draft={editing.draft}
                        valid={expected === null}
                        align={column.align}
                        {...(column.choices === undefined ? {} : { choices: column.choices })}
                        describedBy={readingId}
                        onDraft={(draft) => dispatch({ type: 'draft', draft })}
                        onCommit={(down, right) => {
                          if (take()) step({ type: 'committed', rows: down, columns: right });
                          else dispatch({ type: 'refuse' });
                        }}
                        onLeave={() => step({ type: 'leave' })}
                        onBlur={() => {
                          take();
                          dispatch({ type: 'leave' });
                        }}
                      />
                    )
                  }
                />
                {editing === null || column === undefined ? null : (
                  <ReadingLine
                    id={readingId}
                    columnCount={columns.length}
                    column={place.column}
                    expected={expected}
                    refused={editing.refused}
                    {...(column.choices === undefined ? {} : { choices: column.choices })}
                    draft={editing.draft}
                  >
                    {expected === null ? reading?.(row, column.id, editing.draft) : null}
                  </ReadingLine>
                )}
              </div>
            );
          })}
          {view.after > 0 ? <div role="presentation" style={{ height: view.after }} /> : null}
        </div>
      </div>
      {notice === null ? null : (
        <p className="gw-problem mt-2 font-medium" role="alert">
          {notice}
        </p>
      )}
    </>
  );
}
