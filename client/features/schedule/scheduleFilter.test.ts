import { expect, it } from 'vitest';

import { sample } from '../../engine/testing/sampleBuilding.ts';
import { applyChange, changedColumns } from './applyChange.ts';
import { mergeRows } from './mergeRows.ts';
import { readNotes } from './readNotes.ts';
import { filterRows, summarize } from './scheduleFilter.ts';
import { toPatch } from './toPatch.ts';
import { wallNotes } from './wallNotes.ts';

const rows = sample.rows.map((row, index) => ({
  ...row,
  ok: index !== 1,
  state: index === 1 ? ('over' as const) : index === 2 ? ('not settled' as const) : row.state,
  overwritten: index === 3 ? (['vertical', 'ends'] as const) : [],
}));

it('filters by what needs a person', () => {
  expect(filterRows(rows, 'all')).toHaveLength(8);
  expect(filterRows(rows, 'over').map((row) => row.id)).toEqual(['row-2']);
  expect(filterRows(rows, 'overwritten').map((row) => row.id)).toEqual(['row-4']);
});

it('counts walls, bands and what stands out', () => {
  expect(summarize(rows)).toEqual({
    size: '4 walls, 8 bands',
    over: '1 over a limit',
    rest: ['2 cells overwritten', '1 not settled'],
  });
  expect(summarize(rows.slice(0, 1))).toEqual({ size: '1 wall, 1 band', over: null, rest: [] });
});

it('puts answered rows in the place of theirs', () => {
  const [first, second] = rows;
  if (!first || !second) throw new Error('no rows');
  const merged = mergeRows({ rows, seq: 7, orphans: [] }, [{ ...second, version: 9 }]);
  expect(merged.rows.map((row) => row.version)).toEqual([1, 9, 1, 1, 1, 1, 1, 1]);
});

it('sends whole cells and what is given back', () => {
  const change = { rowId: 'row-1', own: { notes: ['Verify at the opening'], ends: null }, release: ['laps'] as const };
  expect(toPatch(change, 4)).toEqual({ version: 4, ends: null, notes: ['Verify at the opening'], release: ['laps'] });
  expect(toPatch({ rowId: 'row-1' }, 4)).toEqual({ version: 4 });
});

it('says each note once, with its rows where not all carry it', () => {
  const two = rows.slice(0, 2).map((row, index) => ({
    ...row,
    notes: index === 0 ? ['Lap above each floor.'] : ['Lap above each floor.', 'Dowels as bars.'],
    notDesigned: [],
  }));
  expect(wallNotes(two)).toEqual([
    { text: 'Lap above each floor', where: null, own: false },
    { text: 'Dowels as bars', where: 'L2 – L3', own: false },
  ]);
});

it('shows a change before it is answered: cells, marks and what is given back', () => {
  const [first] = rows;
  if (!first) throw new Error('no rows');
  const vertical = { curtains: 2, bar: 6, spacing: 12 } as const;
  const after = applyChange(first, { rowId: first.id, own: { vertical } });
  expect(after).toMatchObject({ vertical, overwritten: ['vertical'], ratio: first.ratio });
  expect(changedColumns(first, { rowId: first.id, own: { vertical } }, 'us')).toEqual(['vertical']);
  expect(changedColumns(after, { rowId: first.id, own: { vertical } }, 'us')).toEqual([]);
  const back = applyChange(after, { rowId: first.id, release: ['vertical'] });
  expect(back).toMatchObject({ vertical: first.automatic.vertical, overwritten: [] });
});

it('reads notes a line each within the limits of the contract', () => {
  expect(readNotes(' Verify at opening. \n\n Pour break at L3. ')).toEqual({
    ok: true,
    value: ['Verify at opening.', 'Pour break at L3.'],
  });
  expect(readNotes('x'.repeat(301)).ok).toBe(false);
  expect(readNotes(Array.from({ length: 21 }, () => 'n').join('\n')).ok).toBe(false);
});
