import { useId, useState, type ReactElement } from 'react';

import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { printLevelRange } from '#shared/format/levelRange';

import { Button } from '../../components/ui/Button.tsx';
import { readNotes } from './readNotes.ts';

export interface NotesEditorProps {
  row: ScheduleResourceRow;
  onKeep: (notes: readonly string[]) => void;
  onTakeAuto: () => void;
  onLeave: () => void;
}

/** Drawing notes of one row, a line each; what is kept stands on the drawing in place of the automatic ones. */
export function NotesEditor({ row, onKeep, onTakeAuto, onLeave }: NotesEditorProps): ReactElement {
  const id = useId();
  const [draft, setDraft] = useState(row.notes.join('\n'));
  const read = readNotes(draft);
  const overwritten = row.overwritten.includes('notes');
  return (
    <section
      aria-label="Notes of the row"
      className="mb-2 border-y border-ink py-3"
      onKeyDown={(event) => {
        if (event.key === 'Escape') onLeave();
      }}
    >
      <label className="gw-label" htmlFor={id}>
        Notes, {row.wall}, {printLevelRange(row.from, row.to)} <small>one a line</small>
      </label>
      <textarea
        id={id}
        autoFocus
        rows={Math.max(3, draft.split('\n').length)}
        className="gw-input h-auto! mt-1 max-w-[110ch] py-2 leading-[20px]"
        aria-invalid={!read.ok}
        aria-describedby={`${id}-reading`}
        value={draft}
        onChange={(event) => setDraft(event.target.value)}
      />
      <p id={`${id}-reading`} className={`mt-1 text-note ${read.ok ? 'text-graphite' : 'gw-problem text-oxide'}`}>
        {read.ok
          ? `${read.value.length} ${read.value.length === 1 ? 'note' : 'notes'}${overwritten ? `; auto: ${row.automatic.notes.join(' ')}` : ''}`
          : `expected ${read.expected}`}
      </p>
      <div className="mt-2 flex gap-2">
        <Button
          aria-disabled={!read.ok}
          onClick={() => {
            if (read.ok) onKeep(read.value);
          }}
        >
          Keep these notes
        </Button>
        {overwritten ? <Button onClick={onTakeAuto}>Take automatic notes</Button> : null}
        <Button look="text" onClick={onLeave}>
          Leave
        </Button>
      </div>
    </section>
  );
}
