import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { printLevelRange } from '#shared/format/levelRange';

import { reasonsOf } from '../../components/warnings/heldRows.ts';

export interface WallNote {
  readonly text: string;
  /** rows that carry it, null where all do */
  readonly where: string | null;
  /** written by a person in one of its rows */
  readonly own: boolean;
}

const withoutStop = (note: string): string => note.replace(/\.$/, '');

type Places = Map<string, ScheduleResourceRow[]>;

function gather(
  rows: readonly ScheduleResourceRow[],
  textsOf: (row: ScheduleResourceRow) => readonly string[],
): Places {
  const places: Places = new Map();
  for (const row of rows) {
    for (const text of new Set(textsOf(row).map(withoutStop))) places.set(text, [...(places.get(text) ?? []), row]);
  }
  return places;
}

const sayWhere = (own: readonly ScheduleResourceRow[], all: readonly ScheduleResourceRow[]): string | null =>
  own.length === all.length ? null : own.map((row) => printLevelRange(row.from, row.to)).join(', ');

/** Notes of a wall's rows, each once, with the rows that it belongs to. */
export function wallNotes(rows: readonly ScheduleResourceRow[]): readonly WallNote[] {
  return [...gather(rows, (row) => row.notes)].map(([text, own]) => ({
    text,
    own: own.some((row) => row.overwritten.includes('notes') && !row.automatic.notes.map(withoutStop).includes(text)),
    where: sayWhere(own, rows),
  }));
}

/** Why rows of a wall are not settled, each reason once, with the rows that it belongs to. */
export function wallReasons(
  rows: readonly ScheduleResourceRow[],
  document: Pick<ResultDocument, 'warnings' | 'levels'>,
): readonly Omit<WallNote, 'own'>[] {
  return [...gather(rows, (row) => reasonsOf(row, document))].map(([text, own]) => ({
    text,
    where: sayWhere(own, rows),
  }));
}
