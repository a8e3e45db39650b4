import type { DesignContext } from '../wall-design/designContext.ts';
import type { LapCell, ScheduleCells } from '../wall-design/designTypes.ts';

/** What a drawing note may need to know of a row. */
export interface NoteFacts {
  readonly cells: Omit<ScheduleCells, 'notes'>;
  /** row at the wall's base */
  readonly atBase: boolean;
  /** hooked embedment of web and end dowels, in or mm */
  readonly embedment: { readonly web: number; readonly ends: number | null };
  readonly extendAbove: number | null;
}

function spliceNote(laps: LapCell): string {
  if (laps.splice === 'coupler') {
    return 'Couple vertical bars too large to lap with mechanical splices; lap the others class B above each floor.';
  }
  if (laps.splice === 'no lap') return 'No laps of vertical bars in this row.';
  return 'Lap vertical bars class B above each floor.';
}

/** Drawing notes of a row, in the words of the trade, without numbers that other columns carry. */
export function rowNotes(facts: NoteFacts, context: DesignContext): string[] {
  const { cells, atBase, embedment, extendAbove } = facts;
  const unit = context.units === 'us' ? 'in' : 'mm';
  const notes: string[] = [];
  notes.push(
    cells.ends
      ? 'End zone at both ends, bars on both faces; web bars between.'
      : 'No end zone: web bars run to the wall ends.',
  );
  if (cells.ends && !cells.ties) notes.push('End-zone bars need no ties (11.7.4.1).');
  if (cells.horizontal.end === 'hook') notes.push('Hook horizontal bars around the end vertical bars at both ends.');
  if (cells.horizontal.end === 'u-bar') notes.push('Close horizontal bars with U-bars at both ends, lapped.');
  notes.push(spliceNote(cells.laps));
  if (extendAbove !== null) {
    notes.push(`Run bars that stop here ${String(extendAbove)} ${unit} past the top of the row.`);
  }
  if (atBase) {
    const ends = embedment.ends === null ? '' : `, end-zone dowels ${String(embedment.ends)} ${unit}`;
    notes.push(
      `Dowels match the vertical bars, hooked, web dowels embedded ${String(embedment.web)} ${unit}${ends}; ` +
        'footing concrete taken as that of the wall.',
    );
  }
  return notes;
}
