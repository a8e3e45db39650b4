import { describe, expect, it } from 'vitest';

import type { LevelRow } from '../input.ts';
import { building, level, wall } from '../testing/handBuilding.ts';

import { toModel } from './toModel.ts';

/** Wall ends run from x 4 to 52 ft and y 2 to 40 ft: where nothing is typed the plan is 48 by 38 ft about (28, 21). */
function planOf(more: Partial<LevelRow>) {
  const story = toModel(
    building({
      levels: [level('Roof', 10, more)],
      walls: [
        wall('A', [4, 2, 4, 30], 10, ['Roof', 'Roof']),
        wall('B', [52, 12, 52, 40], 10, ['Roof', 'Roof']),
        wall('C', [10, 2, 30, 2], 10, ['Roof', 'Roof']),
      ],
    }),
  ).stories[0];
  if (!story) throw new Error('no story');
  const ft = (lengthIn: number) => Math.round((lengthIn / 12) * 1e9) / 1e9;
  return {
    point: [ft(story.xIn), ft(story.yIn)],
    extent: [ft(story.extentXIn), ft(story.extentYIn)],
    edge: [ft(story.edgeXIn), ft(story.edgeYIn)],
    assumed: story.extentAssumed,
  };
}

describe('extent and point of a level, engineering.md section 1', () => {
  it('nothing typed: the rectangle around the wall ends, said as assumed', () => {
    expect(planOf({})).toEqual({ point: [28, 21], extent: [48, 38], edge: [4, 2], assumed: true });
  });
  it('extent and edge: the point stands in the middle', () => {
    expect(planOf({ extent_x: 60, extent_y: 44, edge_x: -3, edge_y: 1 })).toEqual({
      point: [27, 23],
      extent: [60, 44],
      edge: [-3, 1],
      assumed: false,
    });
  });
  it('extent and point: the edge is the point less half the extent', () => {
    expect(planOf({ extent_x: 60, extent_y: 44, x: 31, y: 20 })).toEqual({
      point: [31, 20],
      extent: [60, 44],
      edge: [1, -2],
      assumed: false,
    });
  });
  it('all three: the point as typed, off the middle', () => {
    expect(planOf({ extent_x: 60, extent_y: 44, edge_x: 0, edge_y: 0, x: 33, y: 19 })).toEqual({
      point: [33, 19],
      extent: [60, 44],
      edge: [0, 0],
      assumed: false,
    });
  });
  it('a point alone: kept, with the extent of the walls', () => {
    const plan = planOf({ x: 26, y: 22 });
    expect(plan.point).toEqual([26, 22]);
    expect(plan.extent).toEqual([48, 38]);
    expect(plan.assumed).toBe(true);
  });
});
