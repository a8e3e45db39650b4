import type { ReactElement } from 'react';

import type { UnitSystem, WallRow } from '#shared/engineering/input';
import { formatPlanLength, formatProseLength } from '#shared/format/length';

/** Name of a wall over its rows, where it stands and how long it is. */
export function WallHead({
  wall,
  rows,
  units,
}: {
  wall: string;
  rows: readonly WallRow[];
  units: UnitSystem;
}): ReactElement {
  const first = rows.find((row) => row.wall === wall);
  return (
    <div className="flex h-[44px] items-baseline gap-3 pt-[12px]">
      <b className="text-mark font-semibold">{wall}</b>
      {first ? <span className="text-body">{sayPlace(first, units)}</span> : null}
    </div>
  );
}

function sayPlace({ x1, y1, x2, y2 }: WallRow, units: UnitSystem): string {
  const print = (length: number): string => formatPlanLength(length, units);
  const length = formatProseLength(Math.sqrt((x2 - x1) * (x2 - x1) + (y2 - y1) * (y2 - y1)), units);
  if (x1 === x2) return `On x ${print(x1)}, y ${print(y1)} to ${print(y2)}; ${length} long`;
  if (y1 === y2) return `On y ${print(y1)}, x ${print(x1)} to ${print(x2)}; ${length} long`;
  return `From (${print(x1)}, ${print(y1)}) to (${print(x2)}, ${print(y2)}); ${length} long`;
}
