import { nearestName } from '#shared/contracts/nearestName';
import { unitLabels } from '#shared/contracts/quantities';
import { tableColumns, type Column, type EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, StoredRow } from '#shared/contracts/tables';
import { readCell } from '#shared/csv/readCell';
import { gravityCases } from '#shared/engineering/model/model';

import type { GridColumn, Parsed } from '../../components/grid/gridTypes.ts';
import { cellEditText, cellText, columnDecimals } from './cellText.ts';
import { printedUnit } from './printedUnit.ts';

export type InputRow = StoredRow;

export interface ColumnContext {
  readonly units: 'us' | 'si';
  readonly rows: readonly InputRow[];
  readonly levels: readonly string[];
  readonly walls: readonly string[];
  readonly cases: readonly string[];
  /** elevations of the levels, worked out from the heights */
  readonly elevations: ReadonlyMap<string, number>;
}

export const valueOf = (row: object, column: string): CellValue => {
  const value = (row as Readonly<Record<string, CellValue | undefined>>)[column];
  return value ?? null;
};

/** Columns that refer to names of another table. */
const references: Readonly<Record<EditableTable, Readonly<Record<string, 'levels' | 'walls' | 'cases'>>>> = {
  levels: {},
  walls: { from_level: 'levels', to_level: 'levels' },
  forces: { level: 'levels' },
  gravity: { level: 'levels', wall: 'walls' },
  combinations: {},
  overrides: { level: 'levels', wall: 'walls', case: 'cases' },
};

const widths: Readonly<Record<string, number>> = {
  expression: 480,
  name: 220,
  level: 84,
  diaphragm: 96,
  live_class: 108,
  wall: 64,
  x1: 64,
  y1: 64,
  x2: 64,
  y2: 64,
  thickness: 78,
  from_level: 90,
  to_level: 76,
  fc: 64,
  share_x: 64,
  share_y: 64,
  opening: 68,
  flexure_factor: 72,
  shear_factor: 64,
  tributary_area: 116,
  eccentricity: 96,
  kind: 88,
  case: 72,
  reason: 320,
};

/** `height reads "x", expected a number above 0; write digits ...`: what follows `expected`, less advice that is for files. */
function expectedOf(message: string): string {
  const expected = message.split('expected ').slice(1).join('expected ') || message;
  return expected.includes('header') || expected.includes('fill the cell')
    ? (expected.split(';')[0] ?? expected)
    : expected;
}

/** A reference to a name that is not there, while the other table has rows. */
function checkReference(value: CellValue, known: readonly string[], what: string): Parsed {
  if (typeof value !== 'string' || known.length === 0 || known.includes(value)) return { ok: true, value };
  const near = nearestName(value, known);
  return { ok: false, expected: `one of the ${known.length} ${what}.${near === null ? '' : ` Nearest: ${near}`}` };
}

/** Names that may be referred to; a transfer may belong to a gravity case too. */
const namesOf = (reference: 'levels' | 'walls' | 'cases', context: ColumnContext): readonly string[] =>
  reference === 'cases' && context.cases.length > 0 ? [...context.cases, ...gravityCases] : context[reference];

function parseCell(table: EditableTable, column: Column, context: ColumnContext, text: string, row: InputRow): Parsed {
  const reading = readCell(column, text);
  if (!reading.ok) return { ok: false, expected: expectedOf(reading.message) };
  const reference = references[table][column.name];
  if (reference !== undefined) return checkReference(reading.value, namesOf(reference, context), reference);
  if (table === 'levels' && column.name === 'level') {
    const taken = context.rows.some((other) => other.id !== row.id && valueOf(other, 'level') === reading.value);
    if (taken) return { ok: false, expected: 'a name that no other level has' };
  }
  return { ok: true, value: reading.value };
}

function choicesOf(table: EditableTable, column: Column, context: ColumnContext): readonly string[] | undefined {
  const reference = references[table][column.name];
  if (column.choices !== undefined) return column.choices;
  if (reference === undefined || context[reference].length === 0) return undefined;
  return namesOf(reference, context);
}

/** The grid's columns for one input table: labels, units, limits and choices are the contract's. */
export function inputColumns(table: EditableTable, context: ColumnContext): readonly GridColumn<InputRow>[] {
  const columns: readonly Column[] = tableColumns[table];
  return columns.map((column) => {
    const decimals = columnDecimals(
      column,
      context.rows.map((row) => valueOf(row, column.name)),
      context.units,
    );
    const unit = column.quantity === undefined ? '' : printedUnit(unitLabels[column.quantity][context.units]);
    const choices = choicesOf(table, column, context);
    const worksOut = table === 'levels' && column.name === 'elevation';
    const workedOut = (row: InputRow): number | undefined =>
      worksOut && valueOf(row, 'elevation') === null
        ? context.elevations.get(String(valueOf(row, 'level')))
        : undefined;
    return {
      id: column.name,
      header: column.label,
      ...(unit === '' ? {} : { unit }),
      align: column.type === 'number' ? 'right' : 'left',
      mono: column.name === 'expression',
      width: widths[column.name] ?? 72,
      editable: true,
      text: (row) => {
        const elevation = workedOut(row);
        return elevation === undefined ? cellText(valueOf(row, column.name), decimals) : cellText(elevation, decimals);
      },
      editText: (row) => cellEditText(valueOf(row, column.name)),
      describe: (row) => (workedOut(row) === undefined ? null : 'worked out from the heights'),
      ...(column === columns[0] ? { firm: true } : {}),
      quiet: (row) => valueOf(row, column.name) === null,
      parse: (text, row) => parseCell(table, column, context, text, row),
      ...(choices === undefined ? {} : { choices }),
    };
  });
}
