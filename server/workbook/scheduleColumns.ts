import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import type { OverwritableCell } from '#shared/engineering/wall-design/designTypes';
import { printCurtains } from '#shared/format/curtainCallout';
import { printEnds } from '#shared/format/endsCallout';
import { printLevelRange } from '#shared/format/levelRange';
import { printTies } from '#shared/format/tiesCallout';

import { resultUnits } from './resultUnits.ts';
import { dash, printDowels, printGoverns, printNotes, printTieRange } from './scheduleText.ts';

export interface ScheduleColumn {
  /** head of several columns, empty where a column stands alone */
  readonly group: string;
  readonly head: string;
  readonly unit: string;
  readonly width: number;
  readonly look: 'mark' | 'text' | 'quiet' | 'number' | 'notation';
  /** the cell of a row that a person may overwrite */
  readonly cell?: OverwritableCell;
  readonly value: (row: ScheduleResourceRow) => string | number;
}

/** Columns of the printed schedule, in the order in which a drafter reads a row. */
export function scheduleColumns(units: UnitSystem, noteKey: ReadonlyMap<string, number>): readonly ScheduleColumn[] {
  const unit = resultUnits[units];
  const bars = units === 'us' ? 'size @ in' : 'size @ mm';
  return [
    { group: '', head: 'Wall', unit: 'mark', width: 7, look: 'mark', value: (row) => row.wall },
    {
      group: '',
      head: 'Levels',
      unit: 'stories',
      width: 13,
      look: 'text',
      value: (row) => printLevelRange(row.from, row.to),
    },
    { group: '', head: 'Limits', unit: 'of the band', width: 21, look: 'quiet', value: (row) => row.levels },
    {
      group: 'Wall',
      head: 't',
      unit: unit.barLength,
      width: 6,
      look: 'number',
      value: (row) => row.thickness,
    },
    {
      group: 'Wall',
      head: 'f′c',
      unit: unit.concreteStrength,
      width: 8,
      look: 'number',
      value: (row) => row.fc,
    },
    {
      group: 'Distributed steel',
      head: 'Vertical',
      unit: bars,
      width: 13,
      look: 'notation',
      cell: 'vertical',
      value: (row) => printCurtains(row.vertical, units),
    },
    {
      group: 'Distributed steel',
      head: 'Horizontal',
      unit: bars,
      width: 13,
      look: 'notation',
      cell: 'horizontal',
      value: (row) => printCurtains(row.horizontal, units),
    },
    {
      group: 'Distributed steel',
      head: 'Horiz. at ends',
      unit: 'anchorage',
      width: 9,
      look: 'text',
      cell: 'horizontal',
      value: (row) => row.horizontal.end,
    },
    {
      group: 'End zone, each end',
      head: 'Length',
      unit: unit.barLength,
      width: 8,
      look: 'number',
      cell: 'ends',
      value: (row) => row.ends?.length ?? 'none',
    },
    {
      group: 'End zone, each end',
      head: 'Bars',
      unit: units === 'us' ? '(no.) size' : 'no. - size',
      width: 9,
      look: 'notation',
      cell: 'ends',
      value: (row) => printEnds(row.ends, units),
    },
    {
      group: 'End zone, each end',
      head: 'Ties',
      unit: `${bars}, legs`,
      width: 16,
      look: 'notation',
      cell: 'ties',
      value: (row) => printTies(row.ties, units),
    },
    {
      group: 'End zone, each end',
      head: 'Ties from – to',
      unit: `elevation, ${unit.planLength}`,
      width: 13,
      look: 'text',
      cell: 'ties',
      value: (row) => printTieRange(row.ties, units),
    },
    {
      group: 'Laps',
      head: 'Vert.',
      unit: unit.barLength,
      width: 7,
      look: 'number',
      cell: 'laps',
      value: (row) => row.laps.web ?? dash,
    },
    {
      group: 'Laps',
      head: 'Ends',
      unit: unit.barLength,
      width: 7,
      look: 'number',
      cell: 'laps',
      value: (row) => row.laps.ends ?? dash,
    },
    {
      group: 'Laps',
      head: 'Horiz.',
      unit: unit.barLength,
      width: 8,
      look: 'number',
      cell: 'laps',
      value: (row) => row.laps.horizontal ?? dash,
    },
    {
      group: 'Laps',
      head: 'Ends by',
      unit: 'splice',
      width: 9,
      look: 'text',
      cell: 'laps',
      value: (row) => (row.ends === null ? dash : row.laps.splice),
    },
    {
      group: 'At the limits',
      head: 'Past limit',
      unit: unit.barLength,
      width: 8,
      look: 'number',
      value: (row) => row.extendAbove ?? dash,
    },
    {
      group: 'At the limits',
      head: 'Dowels',
      unit: `${bars}, embedment ${unit.barLength}`,
      width: 17,
      look: 'notation',
      value: (row) => printDowels(row.dowels, units),
    },
    { group: 'At the limits', head: 'Joint', unit: 'surface', width: 15, look: 'text', value: (row) => row.joint },
    {
      group: '',
      head: 'Notes',
      unit: 'numbers: below the schedule',
      width: 28,
      look: 'quiet',
      cell: 'notes',
      value: (row) => printNotes(row, noteKey, units),
    },
    {
      group: 'Checks',
      head: 'Worst ratio',
      unit: 'limit 1',
      width: 8,
      look: 'number',
      value: (row) => row.ratio ?? 'none',
    },
    {
      group: 'Checks',
      head: 'Governs',
      unit: 'check, level, clause; combination',
      width: 40,
      look: 'quiet',
      value: printGoverns,
    },
    { group: 'Checks', head: 'State', unit: '', width: 10, look: 'text', value: (row) => row.state },
  ];
}
