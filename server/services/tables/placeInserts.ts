import type { CellValue } from '#shared/contracts/tables';

import type { RowRecord } from '../../db/repositories/TableRepository.ts';

import { positionStep } from './planReplacement.ts';

export interface NewRow {
  /** id of the row above; null for the top; an unknown id for the end */
  readonly after: string | null;
  readonly cells: Readonly<Record<string, CellValue>>;
}

interface Placed {
  readonly insert: readonly RowRecord[];
  /** stored rows that had to make room */
  readonly moved: readonly { readonly id: string; readonly position: number }[];
}

/** Positions of new rows between their neighbors; where the gap is used up, all rows are spread anew. */
export function placeInserts(
  stored: readonly RowRecord[],
  removed: readonly string[],
  rows: readonly NewRow[],
  newId: () => string,
): Placed {
  if (rows.length === 0) return { insert: [], moved: [] };
  const gone = new Set(removed);
  const followers = new Map<string | null, NewRow[]>();
  const known = new Set(stored.map((row) => row.id));
  const last = stored.at(-1)?.id ?? null;
  for (const row of rows) {
    const after = row.after === null || known.has(row.after) ? row.after : last;
    const same = followers.get(after);
    if (same === undefined) followers.set(after, [row]);
    else same.push(row);
  }
  const order: { stored?: RowRecord; added?: NewRow }[] = [];
  for (const added of followers.get(null) ?? []) order.push({ added });
  for (const row of stored) {
    if (!gone.has(row.id)) order.push({ stored: row });
    for (const added of followers.get(row.id) ?? []) order.push({ added });
  }
  const positions = spread(order.map((entry) => entry.stored?.position ?? null));
  const insert: RowRecord[] = [];
  const moved: { id: string; position: number }[] = [];
  order.forEach((entry, place) => {
    const position = positions[place] ?? 0;
    if (entry.added !== undefined) insert.push({ id: newId(), version: 1, position, cells: entry.added.cells });
    else if (entry.stored !== undefined && entry.stored.position !== position) {
      moved.push({ id: entry.stored.id, position });
    }
  });
  return { insert, moved };
}

/** Fills the nulls evenly between their neighbors; all anew where two would meet. */
function spread(given: readonly (number | null)[]): number[] {
  const positions: number[] = [];
  for (let place = 0; place < given.length;) {
    const here = given[place];
    if (here !== null && here !== undefined) {
      positions.push(here);
      place += 1;
      continue;
    }
    let end = place;
    while (end < given.length && given[end] === null) end += 1;
    const count = end - place;
    const low = positions.at(-1) ?? 0;
    const high = given[end] ?? low + positionStep * (count + 1);
    for (let nth = 1; nth <= count; nth += 1) positions.push(low + ((high - low) * nth) / (count + 1));
    place = end;
  }
  const rising = positions.every((position, place) => place === 0 || position - (positions[place - 1] ?? 0) > 1e-6);
  return rising ? positions : given.map((_, place) => (place + 1) * positionStep);
}
