import fc from 'fast-check';
import { expect, it } from 'vitest';

import { barTables } from '../wall-design/bars.ts';
import type { OwnCells } from '../wall-design/designTypes.ts';
import { inventedDemand, middlingWall, usSettings } from '../wall-design/testing/inventedWall.ts';

import { designWall } from './designWall.ts';

const bar = fc.constantFrom(...barTables.us.map(({ number }) => number));
const curtains = fc.constantFrom(1 as const, 2 as const);
const spacing = fc.constantFrom(2, 3, 6, 8, 12, 18, 48);
const own: fc.Arbitrary<OwnCells> = fc.record(
  {
    vertical: fc.record({ curtains, bar, spacing }),
    horizontal: fc.record({ curtains, bar, spacing, end: fc.constantFrom('hook', 'u-bar', 'in-core') }),
    ends: fc.option(
      fc.record({ bar, count: fc.constantFrom(2, 4, 8, 20, 60), length: fc.constantFrom(4, 12, 40, 200) }),
      { nil: null },
    ),
    ties: fc.constant(null),
  },
  { requiredKeys: [] },
);
const levels = ['L1', 'L2', 'L3', 'L4', 'L5', 'L6', 'L7', 'L8', 'L9'];

it('whatever an engineer writes into a band, every story is covered once and the own cells stand', () => {
  fc.assert(
    fc.property(own, fc.nat(8), fc.nat(8), (cells, a, b) => {
      const [from, to] = [Math.min(a, b), Math.max(a, b)];
      const pinned = [{ wall: 'W', fromLevel: levels[from] ?? '', toLevel: levels[to] ?? '', own: cells }];
      const demand = inventedDemand(middlingWall);
      const { rows } = designWall(
        demand,
        usSettings,
        pinned.map((band) => ({ ...band, wall: demand.wall })),
      );
      const covered = rows.flatMap((row) => levels.slice(levels.indexOf(row.from), levels.indexOf(row.to) + 1));
      expect([...covered].sort()).toEqual(levels);
      for (const row of rows) {
        const inside = levels.indexOf(row.from) >= from && levels.indexOf(row.to) <= to;
        for (const [name, value] of Object.entries(inside ? cells : {})) {
          expect(Object.entries(row.cells).find(([cell]) => cell === name)?.[1]).toEqual(value);
        }
      }
    }),
    { numRuns: 150 },
  );
});
