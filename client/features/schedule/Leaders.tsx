import { useEffect, useState, type ReactElement, type RefObject } from 'react';

import { heightScale } from '#shared/drawing/heightScale';
import type { ResultLevel } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';

import { leaderLines, type Leader } from './leaderLines.ts';

export interface LeadersProps {
  /** the box of the grid; leaders stand in the gutter at its left */
  host: RefObject<HTMLDivElement | null>;
  /** rows of the grid as shown */
  rows: readonly ScheduleResourceRow[];
  wall: string | null;
  chosenRowId: string | null;
  down: readonly ResultLevel[];
}

/** From each band limit in the stack to the rule between its rows, for the wall in view; they follow scroll and row height. */
export function Leaders({ host, rows, wall, chosenRowId, down }: LeadersProps): ReactElement {
  const [leaders, setLeaders] = useState<readonly Leader[]>([]);
  useEffect(() => {
    const box = host.current;
    if (!box) return undefined;
    let frame = 0;
    const measure = (): void => {
      frame = 0;
      const stack = document.querySelector('figure[aria-label="Stack"] svg');
      const head = box.querySelector('.gw-grid-head');
      if (!stack || !head) return;
      const own = box.getBoundingClientRect();
      const stackTop = stack.getBoundingClientRect().top - own.top;
      const scale = heightScale(down);
      const placed = rows.flatMap((row, index) => {
        const line = row.wall === wall ? box.querySelector(`[data-row="${index}"]`)?.parentElement : null;
        if (!line) return [];
        const { top, bottom } = line.getBoundingClientRect();
        const [from, to] = [
          down.find((level) => level.level === row.from),
          down.find((level) => level.level === row.to),
        ];
        if (!from || !to) return [];
        return [
          {
            chosen: row.id === chosenRowId,
            top: top - own.top,
            bottom: bottom - own.top,
            stackTop: stackTop + scale.yOf(to.elevation),
            stackBottom: stackTop + scale.yOf(from.elevation - from.height),
          },
        ];
      });
      const next = leaderLines(placed, head.getBoundingClientRect().bottom - own.top, own.height);
      setLeaders((before) => (JSON.stringify(before) === JSON.stringify(next) ? before : next));
    };
    const ask = (): void => {
      if (frame === 0) frame = requestAnimationFrame(measure);
    };
    ask();
    const observer = typeof ResizeObserver === 'undefined' ? null : new ResizeObserver(ask);
    box.querySelectorAll('[role=grid], [role=rowgroup]').forEach((part) => observer?.observe(part));
    window.addEventListener('scroll', ask, { capture: true, passive: true });
    window.addEventListener('resize', ask);
    return () => {
      cancelAnimationFrame(frame);
      observer?.disconnect();
      window.removeEventListener('scroll', ask, { capture: true });
      window.removeEventListener('resize', ask);
    };
  }, [host, rows, wall, chosenRowId, down]);
  return (
    <svg
      className="gw-leaders pointer-events-none absolute top-0 -left-[24px] overflow-visible"
      width={24}
      height={1}
      aria-hidden="true"
    >
      {leaders.map((leader) => (
        <path
          key={leader.d}
          d={leader.d}
          fill="none"
          stroke={leader.chosen ? 'var(--ink)' : 'var(--line)'}
          strokeWidth={leader.chosen ? 1.5 : 1}
        />
      ))}
    </svg>
  );
}
