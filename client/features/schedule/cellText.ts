import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import type { OverwritableCell, ScheduleCells } from '#shared/engineering/wall-design/designTypes';
import { printCurtains } from '#shared/format/curtainCallout';
import { printEnds } from '#shared/format/endsCallout';
import { printHorizontal } from '#shared/format/horizontalCallout';
import { formatBarLength } from '#shared/format/length';
import { printTies } from '#shared/format/tiesCallout';

/** Columns that a person edits; several of them may be parts of one cell of the contract. */
export const editedColumns = {
  vertical: 'vertical',
  horizontal: 'horizontal',
  endsLength: 'ends',
  endsBars: 'ends',
  ties: 'ties',
  lapWeb: 'laps',
  lapEnds: 'laps',
  lapHorizontal: 'laps',
} as const satisfies Readonly<Record<string, OverwritableCell>>;
export type EditedColumn = keyof typeof editedColumns;

export const isEditedColumn = (id: string): id is EditedColumn => Object.hasOwn(editedColumns, id);

type Cells = Pick<ScheduleCells, 'vertical' | 'horizontal' | 'ends' | 'ties' | 'laps'>;

const lap = (length: number | null, units: UnitSystem): string =>
  length === null ? '–' : formatBarLength(length, units);

/** A column of the schedule as printed and typed. */
export function columnText(column: EditedColumn, cells: Cells, units: UnitSystem): string {
  switch (column) {
    case 'vertical':
      return printCurtains(cells.vertical, units);
    case 'horizontal':
      return printHorizontal(cells.horizontal, units);
    case 'endsLength':
      return lap(cells.ends?.length ?? null, units);
    case 'endsBars':
      return printEnds(cells.ends, units);
    case 'ties':
      return cells.ends === null && cells.ties === null ? '–' : printTies(cells.ties, units);
    case 'lapWeb':
      return cells.laps.splice === 'no lap' ? 'no lap' : lap(cells.laps.web, units);
    case 'lapEnds':
      if (cells.laps.splice === 'no lap') return cells.ends === null ? '–' : 'no lap';
      return cells.laps.splice === 'coupler' ? 'coupler' : lap(cells.laps.ends, units);
    case 'lapHorizontal':
      return lap(cells.laps.horizontal, units);
  }
}

const leading: Readonly<Record<OverwritableCell, EditedColumn | null>> = {
  vertical: 'vertical',
  horizontal: 'horizontal',
  ends: 'endsBars',
  ties: 'ties',
  laps: 'lapWeb',
  notes: null,
};

/**
 * Whether a column shows the mark of its overwritten cell: where its own text differs from the automatic one; an overwrite that
 * equals the automatic choice is marked on the cell's leading column, so that it is never out of sight.
 */
export function showsOverwrite(column: EditedColumn, row: ScheduleResourceRow, units: UnitSystem): boolean {
  const cell = editedColumns[column];
  if (!row.overwritten.includes(cell)) return false;
  const differs = (other: EditedColumn): boolean =>
    columnText(other, row, units) !== columnText(other, row.automatic, units);
  if (differs(column)) return true;
  const siblings = (Object.keys(editedColumns) as EditedColumn[]).filter((other) => editedColumns[other] === cell);
  return leading[cell] === column && !siblings.some(differs);
}
