/** One row of the wall in view: its limits on the sheet and in the stack, px in the gutter's own system. */
export interface LeaderRow {
  readonly chosen: boolean;
  readonly top: number;
  readonly bottom: number;
  readonly stackTop: number;
  readonly stackBottom: number;
}

export interface Leader {
  readonly d: string;
  /** a limit of the chosen band */
  readonly chosen: boolean;
}

const line = (from: number, to: number): string => `M0 ${from.toFixed(1)}H4L20 ${to.toFixed(1)}H24`;

/**
 * One leader a limit: the head of every row and the foot of the last. Limits that have scrolled out of the grid's window, from
 * `visibleTop` to `visibleBottom`, have none.
 */
export function leaderLines(rows: readonly LeaderRow[], visibleTop: number, visibleBottom: number): readonly Leader[] {
  const leaders: { from: number; to: number; chosen: boolean }[] = [];
  rows.forEach((row, index) => {
    const above = rows[index - 1];
    leaders.push({ from: row.stackTop, to: row.top + 0.5, chosen: row.chosen || (above?.chosen ?? false) });
    const below = rows[index + 1];
    if (!below || Math.abs(below.stackTop - row.stackBottom) > 0.5) {
      leaders.push({ from: row.stackBottom, to: row.bottom - 0.5, chosen: row.chosen });
    }
  });
  return leaders
    .filter(({ to }) => to >= visibleTop - 1 && to <= visibleBottom)
    .map(({ from, to, chosen }) => ({ d: line(from, to), chosen }))
    .sort((a, b) => Number(a.chosen) - Number(b.chosen));
}
