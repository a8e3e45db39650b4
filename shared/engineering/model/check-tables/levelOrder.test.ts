import { describe, expect, it } from 'vitest';

import type { LevelRow } from '../../input.ts';

import { baseElevation, contradictingElevations, levelOrder } from './levelOrder.ts';

const level = (name: string, height: number, elevation: number | null = null): LevelRow => ({
  level: name,
  height,
  elevation,
  x: null,
  y: null,
  extent_x: null,
  extent_y: null,
  edge_x: null,
  edge_y: null,
  diaphragm: null,
  weight: null,
  gravity: null,
});
const namesUp = (levels: LevelRow[]): (string | undefined)[] => levelOrder(levels).map((index) => levels[index]?.level);

describe('levelOrder', () => {
  it('reads rows from the top down without elevations', () => {
    expect(namesUp([level('R', 10), level('2', 11), level('1', 12)])).toEqual(['1', '2', 'R']);
    expect(levelOrder([])).toEqual([]);
  });

  it('follows elevations where they say otherwise', () => {
    expect(namesUp([level('1', 12, 12), level('2', 11, 23), level('R', 10, 33)])).toEqual(['1', '2', 'R']);
    expect(namesUp([level('2', 11, 23), level('R', 10, 33), level('1', 12, 12)])).toEqual(['1', '2', 'R']);
    expect(namesUp([level('R', 10, 33), level('2', 11, 23), level('1', 12, 12)])).toEqual(['1', '2', 'R']);
  });

  it('follows two elevations of three where they run up the rows', () => {
    expect(namesUp([level('1', 12), level('2', 11, 123), level('R', 10, 133)])).toEqual(['1', '2', 'R']);
  });

  it('is not turned round by one wrong elevation', () => {
    expect(namesUp([level('R', 10, 43), level('3', 10, 3), level('2', 11, 23), level('1', 12, 12)])).toEqual([
      '1',
      '2',
      '3',
      'R',
    ]);
  });
});

describe('contradictingElevations', () => {
  const at = (levels: LevelRow[], tolerance = 0.001): number[] =>
    contradictingElevations(levels, levelOrder(levels), tolerance);

  it('holds 1 mm against 1 mm and refuses beyond', () => {
    expect(at([level('2', 3.5, 7.501), level('1', 4, 4)])).toEqual([]);
    expect(at([level('2', 3.5, 7.5011), level('1', 4, 4)])).toEqual([0]);
  });

  it('blames the one level that fits neither neighbor', () => {
    expect(at([level('4', 3, 13), level('3', 3, 9.5), level('2', 3, 7), level('1', 4, 4)])).toEqual([1]);
  });

  it('blames the upper level where a height is wrong, and compares further up with it', () => {
    expect(at([level('4', 3, 13), level('3', 4, 10), level('2', 3, 7), level('1', 4, 4)])).toEqual([1]);
  });

  it('passes over levels without an elevation and heights that were not read', () => {
    expect(at([level('3', 3, 10), level('2', 3), level('1', 4, 4)])).toEqual([]);
    expect(at([level('3', 3, 11), level('2', 3), level('1', 4, 4)])).toEqual([0]);
    expect(at([level('3', 3, 10), level('2', Number.NaN, 7), level('1', 4, 4)])).toEqual([]);
  });
});

describe('baseElevation', () => {
  it('is 0 without elevations, else the lowest one given less the heights below', () => {
    expect(baseElevation([level('2', 3), level('1', 4)])).toBe(0);
    expect(baseElevation([level('2', 3, 105), level('1', 4, 102)])).toBe(98);
    expect(baseElevation([level('2', 3, 105), level('1', 4)])).toBe(98);
  });
});
