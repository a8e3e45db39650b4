import { useCallback, useEffect, useMemo, useRef, useState } from 'react';

import { pendingRows, type CellPlaceId, type PendingBatch, type PendingRows } from './pendingCells.ts';

/** ms without an answer after which a cell says `not saved` */
const patience = 2_000;

export interface PendingCells {
  readonly rows: PendingRows;
  /** marks cells as sent; what it answers is called when the server has answered, whatever it said */
  readonly begin: (cells: readonly CellPlaceId[]) => () => void;
}

/** Which cells wait for the server, for the marks of a grid. */
export function usePendingCells(): PendingCells {
  const [batches, setBatches] = useState<readonly PendingBatch[]>([]);
  const next = useRef(0);
  const timers = useRef(new Set<number>());
  useEffect(() => {
    const running = timers.current;
    return () => running.forEach((timer) => window.clearTimeout(timer));
  }, []);
  const begin = useCallback((cells: readonly CellPlaceId[]) => {
    const id = (next.current += 1);
    setBatches((before) => [...before, { id, cells, late: false }]);
    const timer = window.setTimeout(() => {
      timers.current.delete(timer);
      setBatches((before) => before.map((batch) => (batch.id === id ? { ...batch, late: true } : batch)));
    }, patience);
    timers.current.add(timer);
    return () => {
      window.clearTimeout(timer);
      timers.current.delete(timer);
      setBatches((before) => before.filter((batch) => batch.id !== id));
    };
  }, []);
  const rows = useMemo(() => pendingRows(batches), [batches]);
  return { rows, begin };
}
