import { describe, expect, it } from 'vitest';

import { drawStack, stackBarScale } from './drawStack.ts';
import type { DrawingElement, RectElement, TextElement } from './elements.ts';
import type { StackInput, StackStory } from './stackTypes.ts';

const story = (level: string, elevation: number, value: number | null, over = false): StackStory => ({
  level,
  elevation,
  height: 10,
  value,
  text: value === null ? '–' : String(value),
  over,
});

const input = (part: Partial<StackInput> = {}): StackInput => ({
  stories: [story('Top', 30, 100), story('Mid', 20, 200), story('Low', 10, 400)],
  walls: [
    { name: 'A', x1: 0, y1: 0, x2: 33, y2: 0, fromElevation: 0, toElevation: 30 },
    { name: 'B', x1: 66, y1: 0, x2: 66, y2: 20, fromElevation: 0, toElevation: 20 },
  ],
  units: 'us',
  chosen: 'Mid',
  ...part,
});

const texts = (elements: readonly DrawingElement[]): string[] =>
  elements.filter((element): element is TextElement => element.shape === 'text').map((element) => element.text);
const rects = (elements: readonly DrawingElement[], fill: string): RectElement[] =>
  elements.filter((element): element is RectElement => element.shape === 'rect' && element.fill === fill);

it('draws bars from zero to the largest value over 46 px', () => {
  // 3 stories of 56 px from y = 20; bars 8 px high at mid-height
  const bars = rects(drawStack(input()).elements, 'ink').filter((rect) => rect.x === 126);
  expect(bars.map((bar) => bar.width)).toEqual([11.5, 23, 46]);
  expect(bars.map((bar) => bar.y)).toEqual([44, 100, 156]);
});

it('keeps labels and bars in the rail of a tablet, without elevation and values', () => {
  const { width, elements } = drawStack(input({ rail: true }));
  expect(width).toBe(80);
  expect(
    rects(elements, 'ink')
      .filter((rect) => rect.x === 42)
      .map((bar) => bar.width),
  ).toEqual([8.5, 17, 34]);
  expect(texts(elements)).toEqual(expect.arrayContaining(['Top', 'Mid', 'Low']));
  expect(texts(elements)).not.toContain('400');
  expect(elements.some((element) => element.shape === 'rect' && element.fillOpacity !== undefined)).toBe(false);
});

it('scales ratios to 1.25, or to the worst above it', () => {
  expect(stackBarScale([story('A', 10, 0.5)], 1)).toBeCloseTo(46 / 1.25, 9);
  expect(stackBarScale([story('A', 10, 2)], 1)).toBeCloseTo(23, 9);
  expect(stackBarScale([story('A', 10, null)], undefined)).toBe(0);
});

it('shows walls in the view as fills and walls across it as strokes that end where they end', () => {
  const { elements } = drawStack(input());
  const [fill] = elements.filter(
    (element): element is RectElement => element.shape === 'rect' && element.fillOpacity === 0.22,
  );
  expect(fill).toMatchObject({ x: 46, width: 33, y: 20, height: 168 });
  const [stroke] = rects(elements, 'graphite').filter((rect) => rect.fillOpacity === undefined);
  expect(stroke).toMatchObject({ x: 111, width: 2, y: 76, height: 112 });
});

it('draws the chosen wall solid, 4 px where it is a stroke', () => {
  const solid = rects(drawStack(input({ chosenWall: 'B' })).elements, 'ink').find((rect) => rect.x === 110);
  expect(solid).toMatchObject({ width: 4, y: 76 });
});

it('frames the chosen story and inverts its label', () => {
  const { elements } = drawStack(input());
  expect(rects(elements, 'choose')).toMatchObject([{ y: 76, height: 56 }]);
  expect(elements.find((element) => element.shape === 'text' && element.text === 'Mid')).toMatchObject({
    fill: 'sheet',
  });
  expect(elements.find((element) => element.shape === 'text' && element.text === '200')).toMatchObject({ weight: 600 });
});

it('marks a story over its limit with hatch and word, never by color alone', () => {
  const stories = [story('Top', 20, 0.4), story('Low', 10, 1.2, true)];
  const { elements } = drawStack(input({ stories, limit: 1 }));
  expect(rects(elements, 'hatch-oxide')).toMatchObject([{ stroke: 'oxide' }]);
  expect(texts(elements)).toContain('over');
});

it('brackets a range instead of framing one story', () => {
  const { elements } = drawStack(input({ range: ['Mid', 'Low'] }));
  expect(rects(elements, 'choose')).toMatchObject([{ y: 76, height: 112 }]);
  expect(elements.filter((element) => element.shape === 'path' && element.strokeWidth === 2.5)).toHaveLength(1);
});

describe('sixty stories', () => {
  const stories = Array.from({ length: 60 }, (_, index) => story(`S${60 - index}`, (60 - index) * 10, 1));
  it('names every fifth from the base, the first and the last, and lets neighbors of the chosen one go', () => {
    const names = texts(drawStack(input({ stories, chosen: 'S30' })).elements).filter((text) => text.startsWith('S'));
    expect(names).toContain('S1');
    expect(names).toContain('S6');
    expect(names).toContain('S60');
    expect(names).toContain('S30');
    expect(names).not.toContain('S31');
    expect(names).not.toContain('S2');
  });
  it('names every story over a limit that has room', () => {
    const some = stories.map((one) => (one.level === 'S13' ? { ...one, over: true } : one));
    expect(texts(drawStack(input({ stories: some, chosen: null, limit: 1 })).elements)).toContain('S13');
  });
});

it('draws an empty building without failing', () => {
  expect(drawStack(input({ stories: [], walls: [], chosen: null })).width).toBe(224);
});
