import { expect, it } from 'vitest';

import type { LevelRow, WallRow } from '#shared/engineering/input';

import { elevationView } from './elevationView.ts';

const level = (name: string, height: number, elevation: number | null = null) =>
  ({ level: name, height, elevation }) as LevelRow;
const wall = (from: string, to: string) =>
  ({ wall: 'W1', x1: 0, y1: 0, x2: 10, y2: 0, from_level: from, to_level: to }) as WallRow;

it('adds heights up from the base, and gives walls their feet and tops', () => {
  const view = elevationView(
    [level('Roof', 12), level('L3', 11), level('L2', 15)],
    [wall('L3', 'Roof'), wall('L2', 'L2')],
  );
  expect(view.stories.map((story) => [story.level, story.elevation])).toEqual([
    ['Roof', 38],
    ['L3', 26],
    ['L2', 15],
  ]);
  expect(view.walls.map((band) => [band.fromElevation, band.toElevation])).toEqual([
    [15, 38],
    [0, 15],
  ]);
  expect(view.height).toBe(38);
});

it('starts at the base that elevations tell', () => {
  const view = elevationView([level('L3', 11, 126), level('L2', 15, 115)], []);
  expect(view.base).toBe(100);
  expect(view.stories[0]?.elevation).toBe(126);
});

it('leaves out walls whose levels are not there', () => {
  expect(elevationView([level('L2', 12)], [wall('L2', 'L9')]).walls).toEqual([]);
});
