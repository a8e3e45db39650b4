import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import { formatBarLength } from '#shared/format/length';
import { printLevelRange } from '#shared/format/levelRange';
import { formatNumber } from '#shared/format/number';
import { formatRatio } from '#shared/format/ratio';

import { RatioBar } from '../../components/drawing/RatioBar.tsx';
import type { GridColumn } from '../../components/grid/gridTypes.ts';
import { columnText, showsOverwrite, type EditedColumn } from './cellText.ts';
import { parseColumn, type BandElevations } from './parseColumn.ts';

type Column = GridColumn<ScheduleResourceRow>;

export interface ColumnSetting {
  readonly units: UnitSystem;
  readonly bandOf: (row: ScheduleResourceRow) => BandElevations;
}

/** Check and story that govern a row, in words: `shear L5`. */
export const sayGoverns = (row: Pick<ScheduleResourceRow, 'governs'>): string =>
  row.governs ? `${row.governs.check.replaceAll('-', ' ')} ${row.governs.level}` : 'no check';

const readOnlyText = 'an input of the wall; change it in Inputs, Walls';
const noParse: Column['parse'] = () => ({ ok: false, expected: 'no typing here' });

/** words that stand after or in place of a notation: set small in sans, so that a column of figures holds them */
const wordPattern = /(?:^|\s)(u-bar|in-core|coupler|no lap)$/;

/** Bar notation is read at arm's length: 15 px, 14 on narrower screens; what is none or does not apply stays quiet. */
function Notation({ text }: { text: string }): ReactElement {
  const quiet = text === 'none' || text === '–';
  const word = wordPattern.exec(text)?.[1];
  const notation = word === undefined ? text : text.slice(0, text.length - word.length).trimEnd();
  return (
    <span className={`text-body min-[1400px]:text-bar ${quiet ? 'text-graphite' : ''}`}>
      {notation}
      {word === undefined ? null : (
        <span className={`font-sans text-note tracking-normal ${notation === '' ? '' : 'ml-1'}`}>{word}</span>
      )}
    </span>
  );
}

function fixed(id: string, column: Pick<Column, 'header' | 'text' | 'width'> & Partial<Column>): Column {
  return { id, align: 'left', editable: false, parse: noParse, ...column };
}

function edited(
  id: EditedColumn,
  setting: ColumnSetting,
  column: Pick<Column, 'header' | 'width'> & Partial<Column>,
): Column {
  const { units, bandOf } = setting;
  const auto = (row: ScheduleResourceRow): string => `auto ${columnText(id, row.automatic, units)}`;
  const marked = (row: ScheduleResourceRow): boolean => showsOverwrite(id, row, units);
  return {
    id,
    align: 'left',
    mono: true,
    editable: true,
    text: (row) => columnText(id, row, units),
    render: (row) => <Notation text={columnText(id, row, units)} />,
    secondLine: (row) => (marked(row) ? auto(row) : null),
    state: (row) => ({ overwritten: marked(row) }),
    describe: (row) => (marked(row) ? `overwritten, ${auto(row)}` : null),
    parse: (text, row) => parseColumn(id, text, row, units, bandOf(row)),
    ...column,
  };
}

/** The wall schedule's columns; thickness and strength are inputs of the wall and say so. */
export function scheduleColumns(setting: ColumnSetting): readonly Column[] {
  const { units } = setting;
  const small = unitLabels.thickness[units];
  return [
    fixed('levels', {
      header: 'Levels',
      width: 102,
      text: (row) => printLevelRange(row.from, row.to),
      render: (row) => <span className="text-bar font-semibold text-ink">{printLevelRange(row.from, row.to)}</span>,
      secondLine: (row) => row.levels,
      describe: () => 'limits follow from the walls and the band length in Settings',
    }),
    fixed('thickness', {
      header: 't',
      unit: small,
      group: 'Wall, inputs',
      align: 'right',
      mono: true,
      width: 42,
      text: (row) => formatBarLength(row.thickness, units),
      render: (row) => <Notation text={formatBarLength(row.thickness, units)} />,
      describe: () => readOnlyText,
    }),
    fixed('fc', {
      header: 'f′c',
      unit: unitLabels.concreteStrength[units],
      group: 'Wall, inputs',
      align: 'right',
      mono: true,
      width: 64,
      text: (row) => formatNumber(row.fc, 0),
      render: (row) => <Notation text={formatNumber(row.fc, 0)} />,
      describe: () => readOnlyText,
    }),
    edited('vertical', setting, {
      header: 'Vertical',
      unit: `size @ ${small}`,
      group: 'Distributed steel',
      width: 100,
    }),
    edited('horizontal', setting, {
      header: 'Horizontal',
      unit: `size @ ${small}`,
      group: 'Distributed steel',
      width: 114,
    }),
    edited('endsLength', setting, {
      header: 'Length',
      unit: small,
      group: 'End zone, each end',
      align: 'right',
      width: 56,
    }),
    edited('endsBars', setting, { header: 'Bars', unit: '(no.) size', group: 'End zone, each end', width: 84 }),
    edited('ties', setting, { header: 'Ties', unit: `size @ ${small}, legs`, group: 'End zone, each end', width: 130 }),
    edited('lapWeb', setting, { header: 'Vert.', unit: small, group: 'Laps', align: 'right', width: 54 }),
    edited('lapEnds', setting, { header: 'Ends', unit: small, group: 'Laps', align: 'right', width: 56 }),
    edited('lapHorizontal', setting, { header: 'Hor.', unit: small, group: 'Laps', align: 'right', width: 52 }),
    fixed('ratio', {
      header: 'Worst ratio',
      unit: 'check, story',
      width: 138,
      text: (row) => (row.ratio === null ? '–' : formatRatio(row.ratio)),
      render: (row) => (
        <RatioBar ratio={row.ratio} over={!row.ok} open={row.state === 'not settled'} note={sayGoverns(row)} />
      ),
      state: (row) => ({ over: !row.ok }),
      describe: (row) => sayVerdict(row),
    }),
  ];
}

/** The verdict in words for the accessible description. */
export function sayVerdict(row: ScheduleResourceRow): string {
  const place = row.governs ? `${sayGoverns(row)}, ${row.governs.clause}` : 'no check governs';
  if (!row.ok) return `over a limit, ${place}`;
  return row.state === 'not settled' ? `not settled, ${place}` : `within the limits, ${place}`;
}
