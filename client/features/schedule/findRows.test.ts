import { expect, it } from 'vitest';

import { sample } from '../../engine/testing/sampleBuilding.ts';
import { findRows } from './findRows.ts';

const rows = sample.rows.map((row, index) => (index === 3 ? { ...row, ends: { bar: 9, count: 8, length: 30 } } : row));
const ids = (text: string) => findRows(rows, text, 'us').map((row) => row.id);

it('finds rows by the beginning of the wall mark', () => {
  expect(ids(' p1 ')).toEqual(['row-1', 'row-2']);
  expect(ids('P')).toHaveLength(4);
  expect(ids('p3')).toEqual([]);
});

it('finds rows by what their bars read, spaces and case aside', () => {
  expect(ids('#9')).toEqual(['row-4']);
  expect(ids('( 8 ) #9')).toEqual(['row-4']);
  expect(ids('#4 @ 18 ef')).toEqual(
    rows.filter((row) => row.vertical.bar === 4 && row.vertical.spacing === 18).map((row) => row.id),
  );
  expect(ids('#18')).toEqual([]);
});

it('keeps all rows for a blank text', () => {
  expect(ids('  ')).toHaveLength(8);
});
