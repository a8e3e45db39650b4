import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

import { valueOf, type InputRow } from './inputColumns.ts';

type Cells = Readonly<Record<string, CellValue>>;

export interface NewRowContext {
  readonly rows: readonly InputRow[];
  /** row that has the focus: the new one stands beside it and takes after it */
  readonly beside: InputRow | null;
  readonly levels: readonly string[];
  readonly walls: readonly string[];
  readonly units: 'us' | 'si';
}

/** `L` and the first number that no row has yet. */
function freeName(prefix: string, first: number, taken: ReadonlySet<string>): string {
  let number = first;
  while (taken.has(`${prefix}${number}`)) number += 1;
  return `${prefix}${number}`;
}

/** A row that the server will take as it stands; the person then types over what differs. */
export function newRow(table: EditableTable, context: NewRowContext): Cells {
  const { rows, beside, levels, walls, units } = context;
  const like = beside ?? rows[rows.length - 1] ?? null;
  const text = (column: string, otherwise: string): string => {
    const value = like === null ? null : valueOf(like, column);
    return typeof value === 'string' && value !== '' ? value : otherwise;
  };
  const number = (column: string, otherwise: number): number => {
    const value = like === null ? null : valueOf(like, column);
    return typeof value === 'number' ? value : otherwise;
  };
  const names = (column: string) => new Set(rows.map((row) => String(valueOf(row, column))));
  switch (table) {
    case 'levels':
      return {
        level: freeName('L', rows.length + 2, names('level')),
        height: number('height', units === 'us' ? 12 : 3.6),
      };
    case 'walls':
      return {
        wall: freeName('W', names('wall').size + 1, names('wall')),
        x1: 0,
        y1: 0,
        x2: units === 'us' ? 20 : 6,
        y2: 0,
        thickness: number('thickness', units === 'us' ? 12 : 300),
        from_level: text('from_level', levels[levels.length - 1] ?? 'L2'),
        to_level: text('to_level', levels[0] ?? 'Roof'),
      };
    case 'forces':
      return {
        level: text('level', levels[0] ?? 'Roof'),
        case: text('case', 'WX'),
        kind: text('kind', 'wind'),
        fx: 0,
        fy: 0,
      };
    case 'gravity':
      return { level: text('level', levels[0] ?? 'Roof'), wall: text('wall', walls[0] ?? 'W1'), dead: 0 };
    case 'combinations':
      return { name: null, expression: '1.4D' };
    case 'overrides':
      return {
        kind: 'transfer',
        level: text('level', levels[levels.length - 1] ?? 'L2'),
        wall: text('wall', walls[0] ?? 'W1'),
        shear: 0,
        reason: 'reason not stated yet',
      };
  }
}
