import type { EditableTable } from '#shared/contracts/tableColumns';

import type { Choice } from '../../app/useChoice.ts';
import { valueOf, type InputRow } from './inputColumns.ts';

/** The row that the address names: one linked from a problem, else the first of the chosen story or wall. */
export function focusRow(
  rows: readonly InputRow[],
  table: EditableTable,
  linked: string | null,
  choice: Pick<Choice, 'level' | 'wall'>,
): string | null {
  if (linked !== null && rows.some((row) => row.id === linked)) return linked;
  const column = table === 'walls' ? 'wall' : 'level';
  const name = table === 'walls' ? choice.wall : choice.level;
  return name === null ? null : (rows.find((row) => valueOf(row, column) === name)?.id ?? null);
}
