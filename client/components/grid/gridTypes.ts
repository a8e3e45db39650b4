import type { ReactNode } from 'react';

import type { PendingRows } from './pendingCells.ts';

export type Parsed = { readonly ok: true; readonly value: unknown } | { readonly ok: false; readonly expected: string };

export interface GridColumn<Row> {
  readonly id: string;
  readonly header: string;
  readonly unit?: string;
  /** columns of one group stand beside each other under one line with this text */
  readonly group?: string;
  readonly align: 'left' | 'right';
  /** bar notation and typed text */
  readonly mono?: boolean;
  /** px */
  readonly width: number;
  readonly editable: boolean | ((row: Row) => boolean);
  readonly text: (row: Row) => string;
  /** what stands in the field when editing starts; without it `text` */
  readonly editText?: (row: Row) => string;
  readonly secondLine?: (row: Row) => string | null;
  readonly state?: (row: Row) => { readonly overwritten?: boolean; readonly over?: boolean };
  /** the state in words, for the accessible description */
  readonly describe?: (row: Row) => string | null;
  /** medium weight: the row's own name */
  readonly firm?: boolean;
  /** graphite: worked out, or not given */
  readonly quiet?: (row: Row) => boolean;
  readonly parse: (text: string, row: Row) => Parsed;
  readonly choices?: readonly string[];
  readonly render?: (row: Row) => ReactNode;
}

export interface GridEdit {
  readonly rowId: string;
  readonly columnId: string;
  readonly value: unknown;
  readonly text: string;
}

export interface DataGridProps<Row> {
  /** accessible name */
  readonly name: string;
  readonly columns: readonly GridColumn<Row>[];
  readonly rows: readonly Row[];
  readonly rowId: (row: Row) => string;
  /** rows of one group stand beside each other */
  readonly groupOf?: (row: Row) => string;
  readonly renderGroupHead?: (group: string) => ReactNode;
  readonly renderGroupFoot?: (group: string) => ReactNode;
  /** px */
  readonly rowHeight: number;
  readonly rowState?: (row: Row) => { readonly over?: boolean };
  /** cells that wait for the server, by row and column */
  readonly pending?: PendingRows;
  readonly onCommit: (edits: readonly GridEdit[]) => void;
  /** Delete on a cell that is not being edited */
  readonly onClear?: (rowId: string, columnId: string) => void;
  readonly onUndo?: () => void;
  /** rows pasted beyond the last row, or without any row; without it only existing cells are filled */
  readonly onPasteRows?: (
    cells: readonly (readonly string[])[],
    at: { readonly rowId: string | null; readonly columnId: string },
  ) => void;
  /** the line beneath the row while a cell is edited */
  readonly reading?: (row: Row, columnId: string, draft: string) => ReactNode;
  readonly onFocusCell?: (rowId: string, columnId: string) => void;
  /** row that the page has chosen elsewhere, for example in the stack: it is shown chosen and scrolled into view */
  readonly focusRowId?: string | null;
  readonly readOnly?: boolean;
}
