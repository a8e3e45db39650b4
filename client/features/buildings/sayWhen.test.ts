import { expect, it } from 'vitest';

import { sayWhen } from './sayWhen.ts';

const now = new Date(2026, 10, 30, 15, 0, 0);
const before = (minutes: number) => new Date(now.getTime() - minutes * 60_000).toISOString();

it.each([
  [0, 'just now'],
  [12, '12 min ago'],
  [180, 'today, 12:00'],
  [24 * 60, 'yesterday'],
  [6 * 24 * 60, 'Nov 24'],
  [400 * 24 * 60, 'Oct 26, 2025'],
])('%i minutes ago reads %s', (minutes, words) => {
  expect(sayWhen(before(minutes), now)).toBe(words);
});

it('reads a dash where no time is known', () => {
  expect(sayWhen('', now)).toBe('–');
});
