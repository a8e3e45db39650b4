import { expect, it } from 'vitest';

import { editedTable } from './editedTable.ts';

const table = {
  version: 1,
  seq: 1,
  rows: [
    { id: 'a', version: 1, name: 'U1', expression: '1.4D' },
    { id: 'b', version: 1, name: null, expression: '1.2D + 1.6L' },
  ],
};

it('edits and takes out rows; new ones wait for the server', () => {
  const edited = editedTable<'combinations'>(table, {
    edits: [
      { id: 'a', column: 'name', was: 'U1', to: 'A' },
      { id: 'a', column: 'expression', was: '1.4D', to: '1.5D' },
    ],
    deletes: [{ id: 'b', version: 1 }],
    inserts: [{ after: null, row: { expression: '0.9D' } }],
  });
  expect(edited.rows).toEqual([{ id: 'a', version: 1, name: 'A', expression: '1.5D' }]);
  expect(table.rows[0]?.name).toBe('U1');
});
