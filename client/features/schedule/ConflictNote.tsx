import type { ReactElement } from 'react';

import type { UnitSystem } from '#shared/engineering/input';
import { printLevelRange } from '#shared/format/levelRange';
import { formatRatio } from '#shared/format/ratio';

import { Button } from '../../components/ui/Button.tsx';
import { columnText, editedColumns, type EditedColumn } from './cellText.ts';
import type { ScheduleConflict } from './useScheduleEdits.ts';

export interface ConflictNoteProps {
  conflict: ScheduleConflict;
  units: UnitSystem;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

const names: Readonly<Record<EditedColumn, string>> = {
  vertical: 'Vertical',
  horizontal: 'Horizontal',
  endsLength: 'End zone length',
  endsBars: 'End zone bars',
  ties: 'Ties',
  lapWeb: 'Vertical lap',
  lapEnds: 'End bar lap',
  lapHorizontal: 'Horizontal lap',
};

/** Someone changed the row meanwhile: both values side by side, and nothing was lost. */
export function ConflictNote({ conflict, units, onKeepMine, onTakeTheirs }: ConflictNoteProps): ReactElement {
  const { stored, change } = conflict;
  const released = Object.fromEntries((change.release ?? []).map((cell) => [cell, stored.automatic[cell]]));
  const mine = { ...stored, ...released, ...change.own };
  const touched = (Object.keys(names) as EditedColumn[]).filter((column) => {
    const cell = editedColumns[column];
    const mentioned = change.own?.[cell] !== undefined || change.release?.includes(cell);
    return mentioned && columnText(column, mine, units) !== columnText(column, stored, units);
  });
  return (
    <section
      role="alert"
      aria-label="Conflict"
      className="my-3 flex flex-wrap items-start gap-6 border-y border-ink py-4"
    >
      <table className="gw-table w-auto">
        <thead>
          <tr>
            <th />
            <th>Yours</th>
            <th>Stored now</th>
          </tr>
        </thead>
        <tbody>
          {touched.map((column) => (
            <tr key={column}>
              <th scope="row" className="font-normal text-graphite">
                {names[column]}
              </th>
              <td className="mono">{columnText(column, mine, units)}</td>
              <td className="mono">{columnText(column, stored, units)}</td>
            </tr>
          ))}
          <tr>
            <th scope="row" className="font-normal text-graphite">
              Ratio stored
            </th>
            <td />
            <td className="num">{stored.ratio === null ? '–' : formatRatio(stored.ratio)}</td>
          </tr>
        </tbody>
      </table>
      <div className="max-w-[46ch]">
        <h2>This row was changed while you edited it</h2>
        <p className="mt-1">
          {stored.wall}, {printLevelRange(stored.from, stored.to)}. Nothing was overwritten. Choose which one stands.
        </p>
        <div className="mt-3 flex gap-2">
          <Button onClick={onKeepMine}>Keep mine</Button>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
        </div>
      </div>
    </section>
  );
}
