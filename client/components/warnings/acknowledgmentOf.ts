import type { AcknowledgmentRow } from '#shared/contracts/acknowledgments';
import type { Warning } from '#shared/engineering/input';

/** The last judgement on a warning: that of its code, level and wall. Null where nobody has judged it. */
export function acknowledgmentOf(warning: Warning, rows: readonly AcknowledgmentRow[]): AcknowledgmentRow | null {
  const own = rows.filter(
    ({ code, level, wall }) =>
      code === warning.code && level === (warning.level ?? null) && wall === (warning.wall ?? null),
  );
  return own.reduce<AcknowledgmentRow | null>((last, one) => (last === null || one.at >= last.at ? one : last), null);
}

/** Who and when: `R. Vane, Nov 30, 2026`. */
export function sayWho({ by, at }: AcknowledgmentRow): string {
  const then = new Date(at);
  const day = { month: 'short', day: 'numeric', year: 'numeric' } as const;
  return Number.isNaN(then.getTime()) ? by.name : `${by.name}, ${then.toLocaleDateString('en-US', day)}`;
}
