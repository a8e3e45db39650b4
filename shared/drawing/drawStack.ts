import { formatPlanLength } from '../format/length.ts';
import type { Drawing, DrawingElement } from './elements.ts';
import { drawGround } from './ground.ts';
import { heightScale, type HeightScale, type StoryBox } from './heightScale.ts';
import { round2 } from './round2.ts';
import { drawStackWalls } from './stackElevation.ts';
import { labelDensity, sparseLabels, type LabelDensity } from './stackLabels.ts';
import { stackColumns, type StackColumns, type StackInput, type StackStory } from './stackTypes.ts';
import { fitText } from './textWidth.ts';

const labelRight = 30;
const tagWidth = 38;
const floorLeft = 40;
const floorRight = 118;
const valueRight = 217;

/** Bars run from 0 to the largest value; ratios from 0 to the larger of 1.25 and the worst. */
export function stackBarScale(
  stories: readonly StackStory[],
  limit: number | undefined,
  { barLength }: StackColumns = stackColumns(false),
): number {
  let most = limit === undefined ? 0 : 1.25;
  for (const story of stories) most = Math.max(most, Math.abs(story.value ?? 0));
  return most > 0 ? barLength / most : 0;
}

function drawLabel(input: StackInput, story: StackStory, box: StoryBox, density: LabelDensity): DrawingElement[] {
  const middle = (box.top + box.bottom) / 2;
  const chosen = story.level === input.chosen;
  const inTag = chosen && (input.range === undefined || density === 'sparse');
  const fill = inTag ? 'sheet' : 'ink';
  const emphasis = story.level === input.hovered;
  const elements: DrawingElement[] = [];
  if (inTag) {
    const height = density === 'sparse' ? 16 : box.bottom - box.top;
    elements.push({
      shape: 'rect',
      x: 0,
      y: round2(middle - height / 2),
      width: tagWidth,
      height: round2(height),
      fill: 'ink',
    });
  }
  const size = density === 'sparse' ? 11 : 13;
  const roomy = density === 'full' && box.bottom - box.top >= 28;
  elements.push({
    shape: 'text',
    x: labelRight,
    y: round2(roomy ? middle - 2 : middle + (size === 13 ? 4.5 : 4)),
    text: fitText(story.level, labelRight + 4, size, 500),
    size,
    weight: emphasis ? 600 : density === 'sparse' && !inTag ? 400 : 500,
    anchor: 'end',
    fill: density === 'sparse' && !inTag && !emphasis ? 'graphite' : fill,
  });
  if (roomy) {
    const elevation = formatPlanLength(story.elevation, input.units);
    elements.push({
      shape: 'text',
      x: labelRight,
      y: round2(middle + 12),
      text: elevation,
      size: 11,
      anchor: 'end',
      fill: inTag ? 'sheet' : 'graphite',
    });
  }
  return elements;
}

function drawValue(input: StackInput, story: StackStory, box: StoryBox, density: LabelDensity): DrawingElement {
  const strong = story.level === input.chosen || story.level === input.hovered || story.over === true;
  return {
    shape: 'text',
    x: valueRight,
    y: round2((box.top + box.bottom) / 2 + 4),
    text: story.text,
    size: density === 'sparse' ? 11 : 12,
    weight: strong ? 600 : 400,
    anchor: 'end',
    fill: story.over ? 'oxide' : density === 'sparse' && !strong ? 'graphite' : 'ink',
  };
}

function drawBar(
  story: StackStory,
  box: StoryBox,
  perValue: number,
  density: LabelDensity,
  zero: number,
): DrawingElement[] {
  const middle = (box.top + box.bottom) / 2;
  const thick = Math.max(2, Math.min(8, (box.bottom - box.top) * 0.7));
  const length = round2(Math.abs(story.value ?? 0) * perValue);
  if (story.value === null || length < 0.5) return [];
  const box2 = { x: zero, y: round2(middle - thick / 2), width: length, height: round2(thick) };
  if (!story.over) return [{ shape: 'rect', ...box2, fill: 'ink' }];
  const bar: DrawingElement = { shape: 'rect', ...box2, fill: 'hatch-oxide', stroke: 'oxide', strokeWidth: 1 };
  if (density === 'sparse') return [bar];
  return [
    bar,
    { shape: 'text', x: zero, y: round2(middle + thick / 2 + 10), text: 'over', size: 11, weight: 600, fill: 'oxide' },
  ];
}

function drawChosen(
  input: StackInput,
  scale: HeightScale,
  width: number,
): { under: DrawingElement[]; over: DrawingElement[] } {
  const levels = new Set(input.range ?? (input.chosen === null ? [] : [input.chosen]));
  const boxes = scale.boxes.filter((box) => levels.has(box.level));
  if (boxes.length === 0) return { under: [], over: [] };
  const top = Math.min(...boxes.map((box) => box.top));
  const bottom = Math.max(...boxes.map((box) => box.bottom));
  const height = round2(bottom - top);
  const under: DrawingElement = { shape: 'rect', x: 0, y: top, width, height, fill: 'choose' };
  const over: DrawingElement = input.range
    ? { shape: 'path', d: `M1 ${top + 1.25}H-4.75V${bottom - 1.25}H1`, fill: 'none', stroke: 'ink', strokeWidth: 2.5 }
    : {
        shape: 'rect',
        x: 0.75,
        y: top,
        width: width - 1.5,
        height,
        fill: 'none',
        stroke: 'ink',
        strokeWidth: 1.5,
      };
  return { under: [under], over: [over] };
}

/** The elevation that runs down every page, with the quantity of the page as bars; 224 px wide, as a rail 80, drawn at its final size. */
export function drawStack(input: StackInput): Drawing {
  const scale = heightScale(input.stories);
  const density = labelDensity(scale.typicalCell);
  const named = density === 'sparse' ? sparseLabels(input, scale) : null;
  const rail = input.rail === true;
  const columns = stackColumns(rail);
  const { width, zero } = columns;
  const perValue = stackBarScale(input.stories, input.limit, columns);
  const chosen = drawChosen(input, scale, width);
  const elements: DrawingElement[] = [...chosen.under];
  for (const box of rail ? [] : scale.boxes) {
    const y = Math.floor(box.top) + 0.5;
    elements.push({
      shape: 'line',
      x1: floorLeft,
      y1: y,
      x2: floorRight,
      y2: y,
      stroke: 'line',
      strokeWidth: density === 'sparse' ? 0.5 : 1,
    });
  }
  if (!rail) elements.push(...drawStackWalls(input.walls, scale, input.chosenWall ?? null));
  elements.push(...drawGround(width, scale.bottom));
  input.stories.forEach((story, index) => {
    const box = scale.boxes[index];
    if (!box) return;
    elements.push(...drawBar(story, box, perValue, density, zero));
    if (named && !named.has(story.level) && story.level !== input.hovered) return;
    elements.push(...drawLabel(input, story, box, density));
    if (!rail) elements.push(drawValue(input, story, box, density));
  });
  const [top, bottom] = [scale.top, scale.bottom];
  elements.push({ shape: 'line', x1: zero - 0.5, y1: top, x2: zero - 0.5, y2: bottom, stroke: 'line', strokeWidth: 1 });
  if (input.limit !== undefined) {
    const x = Math.floor(zero + input.limit * perValue) + 0.5;
    elements.push({
      shape: 'line',
      x1: x,
      y1: top - 4,
      x2: x,
      y2: bottom,
      stroke: 'graphite',
      strokeWidth: 1,
      dash: '1.5 3.5',
    });
  }
  elements.push(...chosen.over);
  return { width, height: round2(bottom + 10), elements };
}
