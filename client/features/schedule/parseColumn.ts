import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import type { OwnCells, TieCell } from '#shared/engineering/wall-design/designTypes';
import { parseCurtains } from '#shared/format/curtainCallout';
import { parseEnds } from '#shared/format/endsCallout';
import { parseHorizontal } from '#shared/format/horizontalCallout';
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

/** A length or `none`; `words` are what else the column reads, for the sentence that says what was expected. */
function readLength(
  text: string,
  units: UnitSystem,
  most: number,
  words: readonly string[] = [],
): Parsed<number | null> {
  const plain = text
    .trim()
    .replace(/\s*("|″|in\.?|mm)$/i, '')
    .toLowerCase();
  if (plain === 'none' || plain === '–' || plain === '-') return { ok: true, value: null };
  const length = parseNumber(plain);
  if (length === null || length <= 0 || length > most) {
    const limit = `a length up to ${most.toLocaleString('en-US')} ${units === 'us' ? 'in' : 'mm'}`;
    const others = ['none', ...words];
    return refuse(
      others.length === 1 ? `${limit}, or none` : `${limit}, ${others.join(', ')}`.replace(/, ([^,]*)$/, ' or $1'),
    );
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
      const read = parseHorizontal(text, units);
      return read.ok ? { ok: true, value: { horizontal: read.value } } : read;
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
      const read = readLength(text, units, units === 'us' ? 480 : 12_000);
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
    case 'lapHorizontal':
      return parseLap(column, text, row, units);
  }
}

/**
 * A lap length, `none`; `coupler` for end bars; `no lap` for the vertical bars of the row, web and ends alike. A length after any of
 * these laps the bars again, and what it says nothing of takes its automatic lap.
 */
function parseLap(
  column: 'lapWeb' | 'lapEnds' | 'lapHorizontal',
  text: string,
  row: RowCells,
  units: UnitSystem,
): Parsed<OwnCells> {
  const { laps, automatic } = row;
  if (column !== 'lapHorizontal' && /^no\s*laps?$/i.test(text.trim())) {
    return { ok: true, value: { laps: { ...laps, web: null, ends: null, splice: 'no lap' } } };
  }
  if (column === 'lapEnds' && /^couplers?$/i.test(text.trim())) {
    const web = laps.splice === 'no lap' ? automatic.laps.web : laps.web;
    return { ok: true, value: { laps: { ...laps, web, ends: null, splice: 'coupler' } } };
  }
  const words = { lapWeb: ['no lap'], lapEnds: ['no lap', 'coupler'], lapHorizontal: [] };
  const read = readLength(text, units, units === 'us' ? 240 : 6_000, words[column]);
  if (!read.ok) return read;
  const part = column === 'lapWeb' ? 'web' : column === 'lapEnds' ? 'ends' : 'horizontal';
  if (part === 'horizontal') return { ok: true, value: { laps: { ...laps, horizontal: read.value } } };
  const before = laps.splice === 'no lap' ? { ...laps, web: automatic.laps.web, ends: automatic.laps.ends } : laps;
  const splice = part === 'ends' || laps.splice === 'no lap' ? 'lap' : laps.splice;
  return { ok: true, value: { laps: { ...before, [part]: read.value, splice } } };
}
