import { useCallback, useMemo, useRef, useState } from 'react';

import { gridReducer, initialGridState, type GridAction, type GridShape, type GridState } from './gridReducer.ts';

export interface GridMachine {
  readonly state: GridState;
  readonly shape: GridShape;
  readonly dispatch: (action: GridAction) => GridState;
  /** the state after every step so far, also those not yet drawn; for events only */
  readonly now: () => GridState;
}

/** The reducer with the grid's rows and columns at hand. Steps answer the new state at once, so that keys typed fast are not lost. */
export function useGridState(rowIds: readonly string[], columnIds: readonly string[]): GridMachine {
  const [state, setState] = useState<GridState>(initialGridState);
  const shape = useMemo<GridShape>(() => ({ rowIds, columnIds }), [rowIds, columnIds]);
  const latest = useRef<GridState>(initialGridState);
  const dispatch = useCallback(
    (action: GridAction): GridState => {
      latest.current = gridReducer(latest.current, action, shape);
      setState(latest.current);
      return latest.current;
    },
    [shape],
  );
  const now = useCallback(() => latest.current, []);
  return { state, shape, dispatch, now };
}
