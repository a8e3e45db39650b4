import { expect, it } from 'vitest';

import { drawHeightDiagram } from './heightDiagram.ts';
import { heightDiagramWidth, type HeightDiagramInput } from './heightDiagramTypes.ts';
import { roundTicks } from './roundTicks.ts';

const input = (part: Partial<HeightDiagramInput> = {}): HeightDiagramInput => ({
  stories: [
    { level: 'Top', elevation: 20, height: 10 },
    { level: 'Low', elevation: 10, height: 10 },
  ],
  shape: 'step',
  curves: [{ name: 'rigid', style: 'solid', values: [50, 150], text: '150' }],
  chosen: 'Low',
  chosenNote: 'Low',
  tickText: String,
  ...part,
});

const curve = (part?: Partial<HeightDiagramInput>) =>
  drawHeightDiagram(input(part)).elements.find((element) => element.shape === 'path' && element.strokeWidth === 1.75);

// 150 px for 150: zero at x = 8; stories of 56 px from y = 20
it('steps at floors', () => {
  expect(curve()).toMatchObject({ d: 'M8 20L58 20L58 76L158 76L158 132' });
});

it('joins the bottoms of stories for moments, from zero at the top', () => {
  expect(curve({ shape: 'bottoms' })).toMatchObject({ d: 'M8 20L58 76L158 132' });
});

it('starts where the wall starts', () => {
  expect(curve({ curves: [{ name: 'rigid', style: 'solid', values: [null, 150], text: '150' }] })).toMatchObject({
    d: 'M8 76L158 76L158 132',
  });
});

it('moves the zero line inside when values change sign', () => {
  // -50 to 100: zero at 8 + 50
  const path = curve({ curves: [{ name: 'rigid', style: 'solid', values: [-50, 100], text: '100' }] });
  expect(path).toMatchObject({ d: 'M58 20L8 20L8 76L158 76L158 132' });
});

it('marks the chosen story at mid-height of a step and at the bottom for moment', () => {
  const mark = (part?: Partial<HeightDiagramInput>) =>
    drawHeightDiagram(input(part)).elements.filter((element) => element.shape === 'circle');
  expect(mark()).toMatchObject([{ cx: 158, cy: 104 }]);
  expect(mark({ shape: 'bottoms' })).toMatchObject([{ cx: 158, cy: 132 }]);
});

it('has two or three round ticks', () => {
  expect(roundTicks(498)).toEqual([200, 400]);
  expect(roundTicks(50_383)).toEqual([20_000, 40_000]);
  expect(roundTicks(1000)).toEqual([500, 1000]);
  expect(roundTicks(0)).toEqual([]);
  for (const most of [1, 3, 7, 12, 34, 99, 640, 0.02]) {
    const ticks = roundTicks(most);
    expect(ticks.length).toBeGreaterThanOrEqual(2);
    expect(ticks.length).toBeLessThanOrEqual(3);
    expect(Math.max(...ticks)).toBeLessThanOrEqual(most + 1e-9);
  }
});

it('is as wide as the design says', () => {
  expect(drawHeightDiagram(input()).width).toBe(heightDiagramWidth);
});
