import { describe, expect, it } from 'vitest';

import { nestsTooDeep } from './nestsTooDeep.ts';

const lists = (depth: number): unknown => JSON.parse('['.repeat(depth) + ']'.repeat(depth));

describe('nestsTooDeep', () => {
  it('lets 32 levels pass and no more', () => {
    expect(nestsTooDeep(lists(32))).toBe(false);
    expect(nestsTooDeep(lists(33))).toBe(true);
    expect(nestsTooDeep({ a: 1, b: [lists(31)] })).toBe(true);
  });

  it('does not follow a million levels', () => {
    expect(nestsTooDeep(lists(1_000_000))).toBe(true);
  });

  it('has nothing against plain values', () => {
    expect([5, 'x', null, undefined].map((value) => nestsTooDeep(value))).toEqual([false, false, false, false]);
  });
});
