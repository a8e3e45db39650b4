import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import type { OwnCells, TieCell } from '#shared/engineering/wall-design/designTypes';
import { parseCurtains } from '#shared/format/curtainCallout';
import { parseEnds } from '#shared/format/endsCallout';
import { parseNumber } from '#shared/format/number';
import { refuse, type Parsed } from '#shared/format/parsed';
import { parseTies } from '#shared/format/tiesCallout';

import type { EditedColumn } from './cellText.ts';

/** What of a row a column's text is read against. */
export type RowCells = Pick<ScheduleResourceRow, 'vertical' | 'horizontal' | 'ends' | 'ties' | 'laps' | 'automatic'>;

/** Elevations of the foot and the head of the row's band, ft or m. */
export interface BandElevations {
  readonly from: number;
  readonly to: number;
}

const endZoneLength: Readonly<Record<UnitSystem, number>> = { us: 24, si: 600 };
const tieKind = (legsAcross: number): string => (legsAcross > 2 ? 'hoop and crossties' : 'hoop');

function readLength(text: string, units: UnitSystem, most: number, orNone: boolean): Parsed<number | null> {
  const plain = text
    .trim()
    .replace(/\s*("|″|in\.?|mm)$/i, '')
    .toLowerCase();
  if (orNone && (plain === 'none' || plain === '–' || plain === '-')) return { ok: true, value: null };
  const length = parseNumber(plain);
  const unit = units === 'us' ? 'in' : 'mm';
  if (length === null || length <= 0 || length > most) {
    return refuse(`a length up to ${most.toLocaleString('en-US')} ${unit}${orNone ? ', or none' : ''}`);
  }
  return { ok: true, value: length };
}

/**
 * Reads the text of one column into the whole cell that it belongs to, as the server takes it: bars of an end zone keep its length,
 * ties keep their extent, a lap keeps the other laps.
 */
export function parseColumn(
  column: EditedColumn,
  text: string,
  row: RowCells,
  units: UnitSystem,
  band: BandElevations,
): Parsed<OwnCells> {
  switch (column) {
    case 'vertical': {
      const read = parseCurtains(text, units);
      return read.ok ? { ok: true, value: { vertical: read.value } } : read;
    }
    case 'horizontal': {
      const read = parseCurtains(text, units);
      return read.ok ? { ok: true, value: { horizontal: { ...read.value, end: row.horizontal.end } } } : read;
    }
    case 'endsBars': {
      const read = parseEnds(text, units);
      if (!read.ok) return read;
      if (read.value === null) return { ok: true, value: { ends: null } };
      const length = row.ends?.length ?? row.automatic.ends?.length ?? endZoneLength[units];
      return { ok: true, value: { ends: { ...read.value, length } } };
    }
    case 'endsLength': {
      if (row.ends === null) return refuse('the bars first: an end zone has no length without them');
      const read = readLength(text, units, units === 'us' ? 480 : 12_000, true);
      if (!read.ok) return read;
      return { ok: true, value: { ends: read.value === null ? null : { ...row.ends, length: read.value } } };
    }
    case 'ties': {
      const read = parseTies(text.trim() === '–' ? 'none' : text, units);
      if (!read.ok) return read;
      if (read.value === null) return { ok: true, value: { ties: null } };
      const { fromElevation, toElevation } = row.ties ?? { fromElevation: band.from, toElevation: band.to };
      const ties: TieCell = { ...read.value, fromElevation, toElevation, kind: tieKind(read.value.legsAcross) };
      return { ok: true, value: { ties } };
    }
    case 'lapWeb':
    case 'lapEnds':
    case 'lapHorizontal': {
      if (column === 'lapEnds' && /^couplers?$/i.test(text.trim())) {
        return { ok: true, value: { laps: { ...row.laps, ends: null, splice: 'coupler' } } };
      }
      const read = readLength(text, units, units === 'us' ? 240 : 6_000, true);
      if (!read.ok) return read;
      const part = column === 'lapWeb' ? 'web' : column === 'lapEnds' ? 'ends' : 'horizontal';
      const splice = part === 'ends' ? 'lap' : row.laps.splice;
      return { ok: true, value: { laps: { ...row.laps, [part]: read.value, splice } } };
    }
  }
}
