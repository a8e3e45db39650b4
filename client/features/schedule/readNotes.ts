import { schedulePatchSchema } from '#shared/contracts/schedule';
import { refuse, type Parsed } from '#shared/format/parsed';

/** Notes as typed, one a line; blank lines are none. The limits are those of the contract. */
export function readNotes(text: string): Parsed<readonly string[]> {
  const notes = text
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '');
  const read = schedulePatchSchema.shape.notes.safeParse(notes);
  return read.success ? { ok: true, value: notes } : refuse('at most 20 notes of up to 300 characters');
}
