import { describe, expect, it } from 'vitest';

import { chosenRange, gridReducer, initialGridState, locate, type GridAction, type GridShape } from './gridReducer.ts';

const shape: GridShape = { rowIds: ['a', 'b', 'c', 'd'], columnIds: ['x', 'y', 'z'] };

const run = (actions: readonly GridAction[], at: GridShape = shape) =>
  actions.reduce((state, action) => gridReducer(state, action, at), initialGridState);

describe('gridReducer', () => {
  it('moves within the edges', () => {
    expect(locate(run([{ type: 'move', rows: 1, columns: 1 }]), shape)).toEqual({ row: 1, column: 1 });
    expect(locate(run([{ type: 'move', rows: -5, columns: -5 }]), shape)).toEqual({ row: 0, column: 0 });
    expect(locate(run([{ type: 'to', row: 99, column: 99 }]), shape)).toEqual({ row: 3, column: 2 });
  });

  it('stays with its row when rows come in above it', () => {
    const state = run([{ type: 'to', row: 1, column: 2 }]);
    expect(state.rowId).toBe('b');
    expect(locate(state, { ...shape, rowIds: ['new', 'a', 'b', 'c', 'd'] })).toEqual({ row: 2, column: 2 });
  });

  it('takes the place of a row that is gone, or the last row', () => {
    const state = run([{ type: 'to', row: 3, column: 0 }]);
    expect(locate(state, { ...shape, rowIds: ['a', 'b'] })).toEqual({ row: 1, column: 0 });
  });

  it('extends a range from where it began and drops it at the next plain move', () => {
    const extended = run([
      { type: 'to', row: 1, column: 1 },
      { type: 'move', rows: 2, columns: 0, extend: true },
      { type: 'move', rows: 0, columns: 1, extend: true },
    ]);
    expect(chosenRange(extended, shape)).toEqual({ fromRow: 1, toRow: 3, fromColumn: 1, toColumn: 2 });
    const moved = gridReducer(extended, { type: 'move', rows: -1, columns: 0 }, shape);
    expect(moved.anchor).toBeNull();
    expect(chosenRange(moved, shape)).toEqual({ fromRow: 2, toRow: 2, fromColumn: 2, toColumn: 2 });
  });

  it('chooses everything', () => {
    expect(chosenRange(run([{ type: 'all' }]), shape)).toEqual({ fromRow: 0, toRow: 3, fromColumn: 0, toColumn: 2 });
  });

  it('edits, types, is refused and leaves without moving', () => {
    const editing = run([
      { type: 'to', row: 1, column: 1 },
      { type: 'edit', draft: '1' },
      { type: 'draft', draft: '12' },
    ]);
    expect(editing.editing).toEqual({ draft: '12', refused: false });
    const refused = gridReducer(editing, { type: 'refuse' }, shape);
    expect(refused.editing).toEqual({ draft: '12', refused: true });
    expect(gridReducer(refused, { type: 'draft', draft: '13' }, shape).editing?.refused).toBe(false);
    const left = gridReducer(refused, { type: 'leave' }, shape);
    expect(left.editing).toBeNull();
    expect(locate(left, shape)).toEqual({ row: 1, column: 1 });
  });

  it('goes down after Enter and right after Tab', () => {
    const editing = run([
      { type: 'to', row: 1, column: 1 },
      { type: 'edit', draft: '1' },
    ]);
    expect(locate(gridReducer(editing, { type: 'committed', rows: 1, columns: 0 }, shape), shape)).toEqual({
      row: 2,
      column: 1,
    });
    expect(locate(gridReducer(editing, { type: 'committed', rows: 0, columns: 1 }, shape), shape)).toEqual({
      row: 1,
      column: 2,
    });
  });

  it('does not edit a grid without rows, nor type where nothing is edited', () => {
    expect(run([{ type: 'edit', draft: '1' }], { ...shape, rowIds: [] }).editing).toBeNull();
    expect(run([{ type: 'draft', draft: '1' }]).editing).toBeNull();
  });
});
