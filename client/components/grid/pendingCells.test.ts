import { expect, it } from 'vitest';

import { pendingRows } from './pendingCells.ts';

const cell = (rowId: string, columnId: string) => ({ rowId, columnId });

it('marks every cell that was sent, row by row', () => {
  const rows = pendingRows([
    { id: 1, cells: [cell('a', 'height'), cell('b', 'height')], late: false },
    { id: 2, cells: [cell('a', 'x')], late: true },
  ]);
  expect([...(rows.get('a') ?? [])]).toEqual([
    ['height', 'saving'],
    ['x', 'not saved'],
  ]);
  expect([...(rows.get('b') ?? [])]).toEqual([['height', 'saving']]);
  expect(rows.has('c')).toBe(false);
});

it('reads not saved as soon as one edit of the cell is late', () => {
  const early = { id: 2, cells: [cell('a', 'x')], late: false };
  const late = { id: 1, cells: [cell('a', 'x')], late: true };
  expect(pendingRows([early, late]).get('a')?.get('x')).toBe('not saved');
  expect(pendingRows([late, early]).get('a')?.get('x')).toBe('not saved');
  expect(pendingRows([]).size).toBe(0);
});
