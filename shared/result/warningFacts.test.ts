import { describe, expect, it } from 'vitest';

import type { BuildingInput, Warning } from '../engineering/input.ts';
import { building, force, level, wall } from '../engineering/testing/handBuilding.ts';

import { runBuilding } from './runBuilding.ts';
import { factsHash, settleWarnings, type Acknowledged } from './warningFacts.ts';

const extent = { extent_x: 60, extent_y: 40, x: 30, y: 20 };
/** Two stories; B has openings in the lower one. */
const input: BuildingInput = building(
  {
    levels: [level('Roof', 11, extent), level('L2', 13, extent)],
    walls: [
      wall('A', [0, 10, 0, 30], 10, ['L2', 'Roof']),
      wall('B', [60, 10, 60, 30], 10, ['L2', 'L2'], { opening: 0.2 }),
      wall('B', [60, 10, 60, 30], 10, ['Roof', 'Roof']),
      wall('C', [20, 0, 40, 0], 10, ['L2', 'Roof']),
      wall('D', [20, 40, 40, 40], 10, ['L2', 'Roof']),
    ],
    forces: [force('Roof', 'WX', 'wind', 24, 0), force('Roof', 'WY', 'wind', 0, 30)],
  },
  { bandStories: 1 },
);
function run(given: BuildingInput, acknowledged: readonly Acknowledged[] = []) {
  const outcome = runBuilding(given, { acknowledged });
  if (!outcome.ok) throw new Error(outcome.problems.map(({ message }) => message).join('; '));
  return outcome.document;
}
const states = (document: ReturnType<typeof run>) =>
  document.schedule.map(({ wall: name, from, state }) => [name, from, state]);
const withWalls = (change: (row: BuildingInput['tables']['walls'][number]) => object): BuildingInput => ({
  ...input,
  tables: { ...input.tables, walls: input.tables.walls.map((row) => ({ ...row, ...change(row) })) },
});

function settled(code: string): Acknowledged {
  const named = run(input).warnings.filter((warning) => warning.code === code);
  return { code, level: named[0]?.level ?? null, wall: named[0]?.wall ?? null, factsHash: factsHash(input, named) };
}

describe('acknowledged warnings', () => {
  it('keep their rows at not settled until they are settled, and the others not at all', () => {
    expect(states(run(input)).filter(([, , state]) => state === 'not settled')).toEqual([['B', 'L2', 'not settled']]);
    const document = run(input, [settled('opening-solid')]);
    expect(states(document).filter(([, , state]) => state === 'not settled')).toEqual([]);
    expect(document.warnings.filter((warning) => warning.settled).map(({ code }) => code)).toEqual(['opening-solid']);
  });

  it('lapse when the wall, its level or the sentence moves, and not with what is elsewhere', () => {
    const acknowledged = [settled('opening-solid')];
    const stands = (given: BuildingInput) => run(given, acknowledged).warnings.some((warning) => warning.settled);
    expect(stands(withWalls(({ wall: name }) => (name === 'A' ? { thickness: 11 } : {})))).toBe(true);
    expect(stands(withWalls(({ wall: name }) => (name === 'B' ? { thickness: 11 } : {})))).toBe(false);
    expect(stands(withWalls(({ opening }) => (opening === null ? {} : { opening: 0.3 })))).toBe(false);
    const levels = input.tables.levels.map((row) => ({ ...row, height: row.level === 'L2' ? 13.5 : row.height }));
    expect(stands({ ...input, tables: { ...input.tables, levels } })).toBe(false);
  });

  it('name level and wall exactly', () => {
    const acknowledged = settled('opening-solid');
    const others = [
      { ...acknowledged, level: null },
      { ...acknowledged, wall: 'A' },
    ];
    expect(run(input, others).warnings.some((warning) => warning.settled)).toBe(false);
  });

  it('settle all warnings of one name together or none', () => {
    const first: Warning = { code: 'material-capped', message: 'fy counts as 100 ksi' };
    const second: Warning = { code: 'material-capped', message: 'fyt counts as 60 ksi' };
    const hash = factsHash(input, [first, second]);
    const acknowledged = [{ code: 'material-capped', level: null, wall: null, factsHash: hash }];
    const marks = (warnings: readonly Warning[]) =>
      settleWarnings(input, warnings, acknowledged).map((warning) => warning.settled ?? false);
    expect(marks([first, second])).toEqual([true, true]);
    expect(marks([first])).toEqual([false]);
  });
});
