import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import type { OverwritableCell } from '#shared/engineering/wall-design/designTypes';
import { printBar } from '#shared/format/barNumbers';
import { printCurtains } from '#shared/format/curtainCallout';
import { printEnds } from '#shared/format/endsCallout';
import { formatBarLength, formatPlanLength } from '#shared/format/length';
import { printTies } from '#shared/format/tiesCallout';

/** Does not apply. */
export const dash = '–';

type Dowels = ScheduleResourceRow['dowels'];
type Ties = ScheduleResourceRow['ties'];

/** `(8)#9, embed 28`, `#5@12, embed 18`. */
export function printDowels(dowels: Dowels, units: UnitSystem): string {
  if (dowels === null) return dash;
  const bars =
    dowels.count !== null
      ? printEnds({ bar: dowels.bar, count: dowels.count }, units)
      : dowels.spacing !== null
        ? `${printBar(dowels.bar, units)}@${formatBarLength(dowels.spacing, units)}`
        : printBar(dowels.bar, units);
  return `${bars}, embed ${formatBarLength(dowels.embedment, units)}`;
}

/** `0.0 – 21.0`: the elevations between which the ties stand. */
export function printTieRange(ties: Ties, units: UnitSystem): string {
  if (ties === null) return dash;
  return `${formatPlanLength(ties.fromElevation, units)} – ${formatPlanLength(ties.toElevation, units)}`;
}

/** What automatic choice says for an overwritten cell, in the notation of that cell. */
export function printAutomatic(row: ScheduleResourceRow, cell: OverwritableCell, units: UnitSystem): string {
  const { automatic } = row;
  if (cell === 'vertical' || cell === 'horizontal') return printCurtains(automatic[cell], units);
  if (cell === 'ties') return printTies(automatic.ties, units);
  if (cell === 'ends') {
    const { ends } = automatic;
    return ends === null ? 'none' : `${printEnds(ends, units)} over ${formatBarLength(ends.length, units)}`;
  }
  if (cell === 'laps') {
    const { web, ends, horizontal, splice } = automatic.laps;
    const laps = [web, ends, horizontal].map((lap) => (lap === null ? dash : formatBarLength(lap, units)));
    return `${laps.join(', ')}, ${splice}`;
  }
  return automatic.notes.length === 0 ? 'none' : automatic.notes.join('; ');
}

/**
 * Numbers of the notes that stand below the schedule, then what concerns this row alone: its own notes, what was not designed,
 * what a person overwrote and why; one a line.
 */
export function printNotes(row: ScheduleResourceRow, key: ReadonlyMap<string, number>, units: UnitSystem): string {
  const numbers = row.notes.flatMap((note) => key.get(note) ?? []);
  const lines = numbers.length === 0 ? [] : [numbers.join(', ')];
  lines.push(...row.notes.filter((note) => !key.has(note)));
  if (row.trim !== null) lines.push(`Trim: ${row.trim}`);
  if (row.notDesigned.length > 0) lines.push(`Not designed: ${row.notDesigned.join(', ')}`);
  for (const cell of row.overwritten) lines.push(`Overwritten: ${cell}, auto ${printAutomatic(row, cell, units)}`);
  if (row.reason !== null && row.reason !== '') lines.push(`Reason: ${row.reason}`);
  return lines.length === 0 ? dash : lines.join('\n');
}

/** Notes that more than one row carries, numbered in the order in which they first occur. */
export function numberNotes(rows: readonly ScheduleResourceRow[]): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  for (const note of rows.flatMap((row) => [...new Set(row.notes)])) counts.set(note, (counts.get(note) ?? 0) + 1);
  const shared = [...counts].filter(([, count]) => count > 1);
  return new Map(shared.map(([note], index) => [note, index + 1]));
}

/** `shear L5`, its clause and the combination below. */
export function printGoverns(row: ScheduleResourceRow): string {
  const { governs } = row;
  if (governs === null) return dash;
  const first = `${governs.check} ${governs.level}, ${governs.clause}`;
  return governs.combination === null ? first : `${first}\n${governs.combination}`;
}
