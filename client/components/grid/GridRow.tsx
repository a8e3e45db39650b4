import { memo, type ReactNode } from 'react';

import { isEditable } from './pastedEdits.ts';
import type { GridColumn } from './gridTypes.ts';
import type { CellPending, PendingRow } from './pendingCells.ts';

export interface GridRowProps<Row> {
  readonly row: Row;
  readonly rowIndex: number;
  readonly ariaRowIndex: number;
  readonly columns: readonly GridColumn<Row>[];
  readonly height: number;
  readonly chosen: boolean;
  readonly over: boolean;
  readonly readOnly: boolean;
  /** column that holds the tab stop of the grid, -1 in every other row */
  readonly focusColumn: number;
  /** columns of the chosen range in this row; null: none, or the focused cell alone */
  readonly rangeFrom: number;
  readonly rangeTo: number;
  /** cells of this row that wait for the server, by column */
  readonly pending: PendingRow | undefined;
  /** the text field, in the cell at `focusColumn` */
  readonly editor: ReactNode;
}

function describe<Row>(column: GridColumn<Row>, row: Row, waits: CellPending | undefined): string | undefined {
  const words = [describeState(column, row), waits].filter((word) => word !== undefined);
  return words.length === 0 ? undefined : words.join(', ');
}

function describeState<Row>(column: GridColumn<Row>, row: Row): string | undefined {
  const own = column.describe?.(row) ?? null;
  if (own !== null) return own;
  const state = column.state?.(row);
  const words = [
    state?.overwritten === true ? 'overwritten' : '',
    state?.overwritten === true ? (column.secondLine?.(row) ?? '') : '',
    state?.over === true ? 'over a limit' : '',
  ].filter((word) => word !== '');
  return words.length === 0 ? undefined : words.join(', ');
}

function classesOf<Row>(column: GridColumn<Row>, row: Row, readOnly: boolean, inRange: boolean): string {
  const state = column.state?.(row);
  return [
    'gw-grid-cell',
    column.align === 'right' ? 'num' : '',
    column.mono === true ? 'mono' : '',
    isEditable(column, row) && !readOnly ? '' : 'gw-grid-fixed',
    state?.overwritten === true ? 'gw-grid-overwritten' : '',
    state?.over === true ? 'gw-grid-over' : '',
    column.firm === true ? 'font-medium' : '',
    column.quiet?.(row) === true ? 'text-graphite' : '',
    inRange ? 'gw-grid-ranged' : '',
  ]
    .filter((name) => name !== '')
    .join(' ');
}

function PlainGridRow<Row>({
  row,
  rowIndex,
  ariaRowIndex,
  columns,
  height,
  chosen,
  over,
  readOnly,
  focusColumn,
  rangeFrom,
  rangeTo,
  pending,
  editor,
}: GridRowProps<Row>) {
  return (
    <div
      role="row"
      aria-rowindex={ariaRowIndex}
      aria-selected={chosen}
      className={`gw-grid-row gw-grid-data ${chosen ? 'gw-grid-chosen' : ''} ${over ? 'gw-grid-row-over' : ''}`}
      style={{ minHeight: height }}
    >
      {columns.map((column, index) => {
        const focused = index === focusColumn;
        const editing = focused && editor !== null;
        const waits = pending?.get(column.id);
        const second = waits === 'not saved' ? waits : (column.secondLine?.(row) ?? null);
        return (
          <div
            key={column.id}
            role="gridcell"
            aria-colindex={index + 1}
            aria-readonly={readOnly || !isEditable(column, row) ? true : undefined}
            aria-description={describe(column, row, waits)}
            tabIndex={focused && !editing ? 0 : -1}
            data-row={rowIndex}
            data-column={index}
            className={`${classesOf(column, row, readOnly, index >= rangeFrom && index <= rangeTo)} ${waits === undefined ? '' : 'gw-grid-waits'}`}
          >
            {editing ? (
              editor
            ) : (
              <>
                <span className="gw-grid-text">{column.render?.(row) ?? column.text(row)}</span>
                {second === null ? null : <em>{second}</em>}
              </>
            )}
          </div>
        );
      })}
    </div>
  );
}

/** One row of cells; redrawn only when it or its place in the choice changes. */
export const GridRow = memo(PlainGridRow) as typeof PlainGridRow;
