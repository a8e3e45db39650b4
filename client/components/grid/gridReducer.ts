/**
 * Where the focus stands in a grid, which range is chosen and what is being typed. Pure: rows and columns come in as lists of ids,
 * so that focus stays with its row when rows are added, removed or sorted above it.
 */
export interface GridShape {
  readonly rowIds: readonly string[];
  readonly columnIds: readonly string[];
}

export interface CellPlace {
  readonly row: number;
  readonly column: number;
}

export interface GridEditing {
  readonly draft: string;
  /** Enter was pressed on a draft that does not parse */
  readonly refused: boolean;
}

export interface GridState {
  readonly rowId: string | null;
  readonly columnId: string | null;
  /** last known place, for when the row is gone */
  readonly place: CellPlace;
  /** other corner of the chosen range; null: the focused cell alone */
  readonly anchor: CellPlace | null;
  readonly editing: GridEditing | null;
}

export type GridAction =
  | { readonly type: 'move'; readonly rows: number; readonly columns: number; readonly extend?: boolean }
  | { readonly type: 'to'; readonly row: number; readonly column: number; readonly extend?: boolean }
  | { readonly type: 'all' }
  | { readonly type: 'collapse' }
  | { readonly type: 'edit'; readonly draft: string }
  | { readonly type: 'draft'; readonly draft: string }
  | { readonly type: 'refuse' }
  | { readonly type: 'leave' }
  /** the draft was taken: leave and go on */
  | { readonly type: 'committed'; readonly rows: number; readonly columns: number };

export const initialGridState: GridState = {
  rowId: null,
  columnId: null,
  place: { row: 0, column: 0 },
  anchor: null,
  editing: null,
};

const within = (value: number, count: number): number => Math.max(0, Math.min(count - 1, value));

/** Where the focus stands now: with its row if that is still there, else at the place where it was. */
export function locate(state: GridState, shape: GridShape): CellPlace {
  const row = state.rowId === null ? -1 : shape.rowIds.indexOf(state.rowId);
  const column = state.columnId === null ? -1 : shape.columnIds.indexOf(state.columnId);
  return {
    row: row >= 0 ? row : within(state.place.row, shape.rowIds.length),
    column: column >= 0 ? column : within(state.place.column, shape.columnIds.length),
  };
}

export interface CellRange {
  readonly fromRow: number;
  readonly toRow: number;
  readonly fromColumn: number;
  readonly toColumn: number;
}

/** The chosen rectangle, at least the focused cell. */
export function chosenRange(state: GridState, shape: GridShape): CellRange {
  const { row, column } = locate(state, shape);
  const anchor = state.anchor ?? { row, column };
  const anchorRow = within(anchor.row, shape.rowIds.length);
  const anchorColumn = within(anchor.column, shape.columnIds.length);
  return {
    fromRow: Math.min(row, anchorRow),
    toRow: Math.max(row, anchorRow),
    fromColumn: Math.min(column, anchorColumn),
    toColumn: Math.max(column, anchorColumn),
  };
}

function at(state: GridState, shape: GridShape, place: CellPlace, extend: boolean): GridState {
  const target = {
    row: within(place.row, shape.rowIds.length),
    column: within(place.column, shape.columnIds.length),
  };
  return {
    rowId: shape.rowIds[target.row] ?? null,
    columnId: shape.columnIds[target.column] ?? null,
    place: target,
    anchor: extend ? (state.anchor ?? locate(state, shape)) : null,
    editing: null,
  };
}

export function gridReducer(state: GridState, action: GridAction, shape: GridShape): GridState {
  const here = locate(state, shape);
  switch (action.type) {
    case 'move':
      return at(
        state,
        shape,
        { row: here.row + action.rows, column: here.column + action.columns },
        action.extend === true,
      );
    case 'to':
      return at(state, shape, { row: action.row, column: action.column }, action.extend === true);
    case 'all': {
      const corner = at(state, shape, { row: 0, column: 0 }, false);
      return { ...corner, anchor: { row: shape.rowIds.length - 1, column: shape.columnIds.length - 1 } };
    }
    case 'collapse':
      return { ...state, anchor: null };
    case 'edit':
      return shape.rowIds.length === 0
        ? state
        : { ...at(state, shape, here, false), editing: { draft: action.draft, refused: false } };
    case 'draft':
      return state.editing === null ? state : { ...state, editing: { draft: action.draft, refused: false } };
    case 'refuse':
      return state.editing === null ? state : { ...state, editing: { ...state.editing, refused: true } };
    case 'leave':
      return { ...state, editing: null };
    case 'committed':
      return at(
        { ...state, editing: null },
        shape,
        { row: here.row + action.rows, column: here.column + action.columns },
        false,
      );
  }
}
