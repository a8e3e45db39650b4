import { expect, it } from 'vitest';

import { heightScale } from './heightScale.ts';

const stories = (count: number, height: number) =>
  Array.from({ length: count }, (_, index) => ({
    level: `S${count - index}`,
    elevation: (count - index) * height,
    height,
  }));

it('stops at 56 px a typical story', () => {
  const scale = heightScale(stories(4, 13));
  expect(scale.typicalCell).toBeCloseTo(56, 9);
  expect(scale.bottom).toBe(20 + 4 * 56);
});

it('fills 612 px with what is taller', () => {
  const scale = heightScale(stories(17, 10));
  expect(scale.pixelsPerLength).toBeCloseTo(612 / 170, 9);
  expect(scale.boxes[0]).toEqual({ level: 'S17', top: 20, bottom: 56 });
  expect(scale.bottom).toBe(632);
});

it('keeps 6 px a story above about 100 stories, so that the column scrolls', () => {
  const scale = heightScale(stories(120, 10));
  expect(scale.typicalCell).toBeCloseTo(6, 9);
  expect(scale.bottom).toBe(20 + 720);
});

it('takes the base from the elevations, not from zero', () => {
  const scale = heightScale([
    { level: 'B', elevation: 0, height: 12 },
    { level: 'A', elevation: -12, height: 20 },
  ]);
  expect(scale.yOf(-32)).toBe(scale.bottom);
  expect(scale.yOf(0)).toBe(20);
});
