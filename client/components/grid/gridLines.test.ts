import { expect, it } from 'vitest';

import { gridLines } from './gridLines.ts';

const rows = [
  { id: '1', wall: 'W1' },
  { id: '2', wall: 'W1' },
  { id: '3', wall: 'W2' },
];

it('puts a head before and a foot after each group', () => {
  const lines = gridLines(
    rows,
    (row) => row.id,
    (row) => row.wall,
    { heads: true, feet: true },
  );
  expect(lines.map((line) => line.key)).toEqual(['head W1', '1', '2', 'foot W1', 'head W2', '3', 'foot W2']);
});

it('is the rows alone without groups', () => {
  const lines = gridLines(rows, (row) => row.id, undefined, { heads: true, feet: true });
  expect(lines.map((line) => line.kind)).toEqual(['row', 'row', 'row']);
});
