import {
  defaultRangeExtractor,
  elementScroll,
  observeElementOffset,
  observeElementRect,
  Virtualizer,
  type VirtualItem,
} from '@tanstack/react-virtual';
import { useEffect, useLayoutEffect, useReducer, useState, type RefObject } from 'react';

import type { GridLine } from './gridLines.ts';
import { usePrinting } from './usePrinting.ts';

/** Below this many lines all of them are in the page. */
export const windowFrom = 200;

export interface DrawnLine {
  readonly index: number;
  /** px of lines left out between the line drawn before and this one */
  readonly gap: number;
}

export interface GridWindow {
  /** lines to draw; null: all */
  readonly drawn: readonly DrawnLine[] | null;
  /** px of lines left out after the last one drawn */
  readonly after: number;
  readonly scrollTo: (line: number) => void;
  readonly measure: (element: HTMLElement | null) => void;
}

export interface GridWindowOptions {
  readonly lines: readonly GridLine[];
  readonly rowHeight: number;
  readonly scroller: RefObject<HTMLDivElement | null>;
  /** stays drawn even when scrolled out, or the focus would be lost */
  readonly keptLine: number;
}

const everything: GridWindow = {
  drawn: null,
  after: 0,
  scrollTo: () => undefined,
  measure: () => undefined,
};

/** Draws only the lines in view once a grid is long; space stands for the lines that are left out. */
export function useGridWindow({ lines, rowHeight, scroller, keptLine }: GridWindowOptions): GridWindow {
  const [, redraw] = useReducer((count: number) => count + 1, 0);
  const printing = usePrinting();
  const active = lines.length > windowFrom && !printing;
  const options = {
    count: active ? lines.length : 0,
    enabled: active,
    getScrollElement: () => scroller.current,
    estimateSize: (index: number) => (lines[index]?.kind === 'row' ? rowHeight : 2 * rowHeight),
    getItemKey: (index: number) => lines[index]?.key ?? index,
    overscan: 12,
    rangeExtractor: (range: Parameters<typeof defaultRangeExtractor>[0]) => {
      const drawn = defaultRangeExtractor(range);
      return keptLine < 0 || drawn.includes(keptLine) ? drawn : [...drawn, keptLine].sort((a, b) => a - b);
    },
    scrollToFn: elementScroll,
    observeElementRect,
    observeElementOffset,
    onChange: () => redraw(),
  };
  const [virtualizer] = useState(() => new Virtualizer<HTMLDivElement, HTMLElement>(options));
  virtualizer.setOptions(options);
  useEffect(() => virtualizer._didMount(), [virtualizer]);
  useLayoutEffect(() => virtualizer._willUpdate());
  if (!active) return everything;
  const items: readonly VirtualItem[] = virtualizer.getVirtualItems();
  const last = items[items.length - 1];
  return {
    drawn: items.map((item, place) => ({ index: item.index, gap: item.start - (items[place - 1]?.end ?? 0) })),
    after: last === undefined ? 0 : virtualizer.getTotalSize() - last.end,
    scrollTo: (line) => virtualizer.scrollToIndex(line, { align: 'auto' }),
    measure: (element) => virtualizer.measureElement(element),
  };
}
