import { describe, expect, it } from 'vitest';

import type { RowRecord } from '../../db/repositories/TableRepository.ts';

import { planReplacement } from './planReplacement.ts';

const row = (id: string, position: number, level: string, wall: string, dead: number): RowRecord => ({
  id,
  version: 1,
  position,
  cells: { level, wall, dead },
});
const counter = (): (() => string) => {
  let made = 0;
  return () => `new ${++made}`;
};

describe('planReplacement', () => {
  it('matches by level and wall, wherever the row stands', () => {
    const stored = [row('a', 1024, 'R', 'A', 1), row('b', 2048, 'R', 'B', 2)];
    const plan = planReplacement(
      'gravity',
      stored,
      [
        { level: 'R', wall: 'B', dead: 2 },
        { level: 'R', wall: 'A', dead: 5 },
      ],
      counter(),
    );
    expect(plan.counts).toEqual({ added: 0, removed: 0, changed: 1, same: 1 });
    expect(plan.before).toEqual({ a: { dead: 1, position: 1024 }, b: { position: 2048 } });
    expect(plan.after).toEqual({ a: { dead: 5, position: 2048 }, b: { position: 1024 } });
  });

  it('matches the nth to the nth where a key stands twice', () => {
    const stored = [row('a', 1024, 'R', 'A', 1), row('b', 2048, 'R', 'A', 2)];
    const same = { level: 'R', wall: 'A' };
    const plan = planReplacement(
      'gravity',
      stored,
      [1, 3, 4].map((dead) => ({ ...same, dead })),
      counter(),
    );
    expect(plan.counts).toEqual({ added: 1, removed: 0, changed: 1, same: 1 });
    expect(plan.after).toEqual({ b: { dead: 3 }, 'new 1': { ...same, dead: 4, position: 3072 } });
  });

  it('keeps whole rows of what goes, so that undo can bring them back', () => {
    const plan = planReplacement('gravity', [row('a', 512, 'R', 'A', 1)], [], counter());
    expect(plan.before).toEqual({ a: { level: 'R', wall: 'A', dead: 1, position: 512 } });
    expect(plan.after).toEqual({ a: null });
    expect(plan.work.remove).toEqual(['a']);
  });

  it('knows combinations by name, those without one by text', () => {
    const stored: RowRecord[] = [
      { id: 'a', version: 1, position: 1024, cells: { name: 'first', expression: '1.4D' } },
      { id: 'b', version: 1, position: 2048, cells: { name: null, expression: '1.2D + 1.6L' } },
    ];
    const rows = [
      { name: 'first', expression: '1.5D' },
      { name: null, expression: '1.2D + 1.6L' },
    ];
    expect(planReplacement('combinations', stored, rows, counter()).counts).toEqual({
      added: 0,
      removed: 0,
      changed: 1,
      same: 1,
    });
  });
});
