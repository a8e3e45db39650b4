import { expect, it } from 'vitest';

import { leaderLines } from './leaderLines.ts';

const row = (top: number, stackTop: number, stackBottom: number, chosen = false) => ({
  chosen,
  top,
  bottom: top + 40,
  stackTop,
  stackBottom,
});

it('leads each limit once, and the foot of the last row', () => {
  const leaders = leaderLines([row(100, 20, 60), row(140, 60, 120)], 0, 500);
  expect(leaders.map((leader) => leader.d)).toEqual([
    'M0 20.0H4L20 100.5H24',
    'M0 60.0H4L20 140.5H24',
    'M0 120.0H4L20 179.5H24',
  ]);
});

it('draws both limits of the chosen band last and strong', () => {
  const leaders = leaderLines([row(100, 20, 60), row(140, 60, 120, true), row(180, 120, 200)], 0, 500);
  expect(leaders.map((leader) => leader.chosen)).toEqual([false, false, true, true]);
  expect(leaders.slice(2).map((leader) => leader.d)).toEqual(['M0 60.0H4L20 140.5H24', 'M0 120.0H4L20 180.5H24']);
});

it('leaves out what has scrolled out of the grid', () => {
  expect(leaderLines([row(-60, 20, 60), row(-20, 60, 120), row(20, 120, 160)], 10, 100)).toHaveLength(2);
});

it('closes a band whose neighbor is filtered away', () => {
  expect(leaderLines([row(100, 20, 60), row(140, 120, 160)], 0, 500)).toHaveLength(4);
});
