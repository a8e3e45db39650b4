import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

type Cells = Readonly<Record<string, CellValue>>;

const keyColumns: Readonly<Record<EditableTable, readonly string[]>> = {
  levels: ['level'],
  walls: ['wall', 'from_level'],
  forces: ['level', 'case'],
  gravity: ['level', 'wall'],
  combinations: ['name'],
  overrides: ['kind', 'level', 'wall', 'case'],
};

/** What a row is called outside the database: rows of a new upload are matched to stored ones by it, so that ids survive. */
export function naturalKey(table: EditableTable, cells: Cells): string {
  if (table === 'combinations' && cells.name === null) return JSON.stringify(['expression', cells.expression]);
  return JSON.stringify(keyColumns[table].map((name) => cells[name] ?? null));
}
