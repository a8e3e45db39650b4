import { describe, expect, it } from 'vitest';

import { toModel } from '../model/toModel.ts';
import { building, level, wall } from '../testing/handBuilding.ts';

import { assemblyWarnings } from './assemblyWarnings.ts';

type Ends = readonly [number, number, number, number];
const levels = [level('Roof', 11), level('L3', 11), level('L2', 13)];
/** Walls 12 in thick over all stories unless said otherwise. */
const plan = (
  walls: Readonly<Record<string, Ends>>,
  stories: Readonly<Record<string, readonly [string, string]>> = {},
) =>
  assemblyWarnings({
    model: toModel(
      building({
        levels,
        walls: Object.entries(walls).map(([name, ends]) => wall(name, ends, 12, stories[name] ?? ['L2', 'Roof'])),
      }),
    ),
  }).map(({ code, level: at, wall: name, holds }) => [code, at, name, ...(holds?.walls ?? []), holds?.from, holds?.to]);

describe('flanged', () => {
  it('finds an end in the face of another wall, once for each of the two, with the stories as a range', () => {
    expect(plan({ A: [0, 0, 20, 0], B: [10, 0.5, 10, 20] })).toEqual([
      ['flanged', 'L2', 'A', 'A', 'L2', 'Roof'],
      ['flanged', 'L2', 'B', 'B', 'L2', 'Roof'],
    ]);
  });

  it('finds a corner drawn to center lines and to outer faces', () => {
    expect(plan({ A: [0, 0, 20, 0], B: [0, 0, 0, 20] })).toHaveLength(2);
    expect(plan({ A: [-0.5, 0, 20, 0], B: [0, -0.5, 0, 20] })).toHaveLength(2);
  });

  it('is quiet where a wall stops 3 in short of the face', () => {
    expect(plan({ A: [0, 0, 20, 0], B: [10, 0.75, 10, 20] })).toEqual([]);
  });

  it('finds walls that cross between their ends', () => {
    expect(plan({ A: [0, 0, 20, 0], B: [8, -9, 8, 14] })).toHaveLength(2);
    expect(plan({ A: [0, 0, 20, 0], B: [20.9, -9, 20.9, 14] })).toEqual([]);
    expect(plan({ A: [0, 0, 20, 20], B: [4, 16, 16, 4] })).toHaveLength(2);
  });

  it('stands only where both walls stand', () => {
    expect(plan({ A: [0, 0, 20, 0], B: [10, 0, 10, 20] }, { B: ['L2', 'L3'] })[0]).toEqual([
      'flanged',
      'L2',
      'A',
      'A',
      'L2',
      'L3',
    ]);
  });
});

describe('coupled', () => {
  it('takes a clear gap up to 12 ft, or up to the longer wall', () => {
    expect(plan({ A: [0, 0, 8, 0], B: [20, 0, 28, 0] })).toEqual([['coupled', 'L2', 'A', 'A', 'B', 'L2', 'Roof']]);
    expect(plan({ A: [0, 0, 8, 0], B: [20.1, 0, 28, 0] })).toEqual([]);
    expect(plan({ A: [0, 0, 16, 0], B: [31.9, 0, 40, 0] })).toHaveLength(1);
  });

  it('wants one line within 1 in, whichever way the walls are drawn', () => {
    expect(plan({ A: [0, 0, 8, 0], B: [28, 0.08, 20, 0.08] })).toHaveLength(1);
    expect(plan({ A: [0, 0, 8, 0], B: [20, 0.2, 28, 0.2] })).toEqual([]);
  });

  it('couples neighbors only, past a third wall in the gap', () => {
    const walls = { A: [0, 0, 10, 0], B: [12, 0, 14, 0], C: [16, 0, 26, 0] } as const;
    expect(plan(walls).map(([, , name, one, other]) => [name, one, other])).toEqual([
      ['A', 'A', 'B'],
      ['B', 'B', 'C'],
    ]);
  });
});

describe('core', () => {
  const box = { N: [0, 20, 20, 20], E: [20, 0, 20, 20], S: [0, 0, 20, 0], W: [0, 0, 0, 20] } as const;
  const cores = (walls: Readonly<Record<string, Ends>>) => plan(walls).filter(([code]) => code === 'core');
  it('closes a box, and not a channel', () => {
    expect(cores(box)).toEqual([['core', 'L2', 'N', 'N', 'E', 'S', 'W', 'L2', 'Roof']]);
    expect(cores({ N: box.N, E: box.E, S: box.S })).toEqual([]);
  });

  it('counts a door as closed', () => {
    const open = { N: box.N, E: box.E, W: box.W, S1: [0, 0, 8, 0], S2: [12, 0, 20, 0] } as const;
    expect(cores(open)[0]?.slice(3, 8)).toEqual(['N', 'E', 'W', 'S1', 'S2']);
  });

  it('leaves out what hangs on the box by one corner, and three walls in one corner are no loop', () => {
    expect(cores({ ...box, T: [20, 10, 40, 10] })[0]?.slice(3, 7)).toEqual(['N', 'E', 'S', 'W']);
    expect(cores({ A: [0, 0, 10, 0], B: [0, 0, 0, 10], C: [0, 0, -7, -7] })).toEqual([]);
  });
});
