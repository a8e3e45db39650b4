import { expect, it } from 'vitest';

import { placeStackWalls } from './placeStackWalls.ts';

const levels = [
  { level: 'L3', elevation: 25, height: 10 },
  { level: 'L2', elevation: 15, height: 15 },
];
const wall = { wall: 'A', x1: 0, y1: 0, x2: 20, y2: 0, from_level: 'L2', to_level: 'L3' };

it('runs from the bottom of the lowest story to the floor of the highest', () => {
  expect(placeStackWalls(levels, [wall])).toMatchObject([{ name: 'A', fromElevation: 0, toElevation: 25 }]);
  expect(placeStackWalls(levels, [{ ...wall, from_level: 'L3' }])).toMatchObject([{ fromElevation: 15 }]);
});

it('leaves out a wall whose level is not there', () => {
  expect(placeStackWalls(levels, [{ ...wall, to_level: 'L9' }])).toEqual([]);
});
