import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { printLevelRange } from '#shared/format/levelRange';

export interface WallNote {
  readonly text: string;
  /** rows that carry it, null where all do */
  readonly where: string | null;
  /** written by a person in one of its rows */
  readonly own: boolean;
}

const withoutStop = (note: string): string => note.replace(/\.$/, '');

/** Notes of a wall's rows, each once, with the rows that it belongs to. */
export function wallNotes(rows: readonly ScheduleResourceRow[]): readonly WallNote[] {
  const places = new Map<string, ScheduleResourceRow[]>();
  for (const row of rows) {
    const open = row.notDesigned.map((part) => `not designed: ${part}`);
    for (const note of new Set([...row.notes, ...open].map(withoutStop))) {
      places.set(note, [...(places.get(note) ?? []), row]);
    }
  }
  return [...places].map(([text, own]) => ({
    text,
    own: own.some((row) => row.overwritten.includes('notes') && !row.automatic.notes.map(withoutStop).includes(text)),
    where: own.length === rows.length ? null : own.map((row) => printLevelRange(row.from, row.to)).join(', '),
  }));
}
