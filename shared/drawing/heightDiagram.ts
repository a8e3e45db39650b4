import type { Drawing, DrawingElement } from './elements.ts';
import { drawGround } from './ground.ts';
import {
  heightDiagramWidth,
  type CurveStyle,
  type HeightCurve,
  type HeightDiagramInput,
} from './heightDiagramTypes.ts';
import { heightScale, type HeightScale } from './heightScale.ts';
import { roundTicks } from './roundTicks.ts';
import { round2 } from './round2.ts';
import { textWidth } from './textWidth.ts';

const left = 8;
const usable = 150;

/** Line weights of the bases, the same on every page. */
const lines: Readonly<Record<CurveStyle, { readonly strokeWidth: number; readonly dash?: string }>> = {
  solid: { strokeWidth: 1.75 },
  dashed: { strokeWidth: 1.4, dash: '6 4' },
  dotted: { strokeWidth: 2, dash: '1.5 3.5' },
};

interface ValueScale {
  readonly xOf: (value: number) => number;
  readonly most: number;
  readonly least: number;
}

function valueScale(input: HeightDiagramInput): ValueScale {
  let [least, most] = [0, 0];
  for (const curve of input.curves) {
    for (const value of curve.values) [least, most] = [Math.min(least, value ?? 0), Math.max(most, value ?? 0)];
  }
  for (const range of input.envelope ?? []) {
    if (range) [least, most] = [Math.min(least, range.least), Math.max(most, range.most)];
  }
  const perValue = most > least ? usable / (most - least) : 0;
  return { least, most, xOf: (value) => round2(left + (value - least) * perValue) };
}

/** Corners of a curve from the top down; a moment starts at zero at the wall's top. */
function corners(
  values: readonly (number | null)[],
  input: HeightDiagramInput,
  scale: HeightScale,
  xOf: ValueScale['xOf'],
) {
  const points: { x: number; y: number }[] = [];
  values.forEach((value, index) => {
    const box = scale.boxes[index];
    if (value === null || !box) return;
    const first = points.length === 0;
    if (first) points.push({ x: xOf(0), y: box.top });
    if (input.shape === 'step') points.push({ x: xOf(value), y: box.top });
    points.push({ x: xOf(value), y: box.bottom });
  });
  return points;
}

const polyline = (points: readonly { x: number; y: number }[]): string =>
  points.length === 0 ? '' : `M${points.map(({ x, y }) => `${x} ${y}`).join('L')}`;

function drawEnvelope(input: HeightDiagramInput, scale: HeightScale, xOf: ValueScale['xOf']): DrawingElement[] {
  if (!input.envelope) return [];
  const most = corners(
    input.envelope.map((range) => range && range.most),
    input,
    scale,
    xOf,
  );
  const least = corners(
    input.envelope.map((range) => range && range.least),
    input,
    scale,
    xOf,
  );
  if (most.length === 0) return [];
  return [{ shape: 'path', d: `${polyline([...most, ...least.reverse()])}Z`, fill: 'ink', fillOpacity: 0.07 }];
}

function drawMarks(
  curve: HeightCurve,
  input: HeightDiagramInput,
  scale: HeightScale,
  xOf: ValueScale['xOf'],
): DrawingElement[] {
  const index = input.stories.findIndex((story) => story.level === input.chosen);
  const [value, box] = [curve.values[index], scale.boxes[index]];
  if (value === undefined || value === null || !box) return [];
  const y = input.shape === 'step' ? (box.top + box.bottom) / 2 : box.bottom;
  return [{ shape: 'circle', cx: xOf(value), cy: round2(y), r: 3.5, fill: 'sheet', stroke: 'ink', strokeWidth: 1.5 }];
}

const legendLine = 26;

/** Where the legend has its room: in the upper right, wider where its words ask for it, or beside a zero line that stands inside. */
function legendSpan(zero: number, curves: readonly HeightCurve[]): { readonly x: number; readonly right: number } {
  const right = heightDiagramWidth - 4;
  const words = curves.map((curve) => legendLine + textWidth(curve.name, 12) + 8 + textWidth(curve.text, 12, 600));
  if (zero <= 72) return { x: Math.max(zero + 8, Math.min(84, Math.floor(right - Math.max(...words)))), right };
  if (zero <= heightDiagramWidth / 2) return { x: zero + 12, right: heightDiagramWidth - 4 };
  return { x: 4, right: zero - 12 };
}

/** Legend with the values of the chosen story; sheet behind it, so that no line runs through. */
function drawLegend(input: HeightDiagramInput, zero: number): DrawingElement[] {
  if (input.curves.length === 0) return [];
  const { x, right } = legendSpan(zero, input.curves);
  const top = 28;
  const height = 16 * input.curves.length + (input.chosenNote === '' ? 4 : 20);
  const elements: DrawingElement[] = [{ shape: 'rect', x: x - 4, y: top, width: right - x + 8, height, fill: 'sheet' }];
  let y = top + 14;
  if (input.chosenNote !== '') {
    elements.push({ shape: 'text', x, y, text: input.chosenNote, size: 12, fill: 'graphite' });
    y += 16;
  }
  for (const curve of input.curves) {
    elements.push(
      { shape: 'line', x1: x, y1: y - 4, x2: x + 20, y2: y - 4, stroke: 'ink', ...lines[curve.style] },
      { shape: 'text', x: x + legendLine, y, text: curve.name, size: 12, fill: 'ink' },
      {
        shape: 'text',
        x: right,
        y,
        text: curve.text,
        size: 12,
        weight: 600,
        anchor: 'end',
        fill: 'ink',
      },
    );
    y += 16;
  }
  return elements;
}

/** Round ticks, every other one where their figures would touch. */
function ticksWithRoom(input: HeightDiagramInput, larger: number, values: ValueScale): readonly number[] {
  const ticks = roundTicks(larger);
  const [first, last] = [ticks[0], ticks.at(-1)];
  if (first === undefined || last === undefined) return [];
  const apart = values.xOf(first) - values.xOf(0);
  const widest = textWidth(input.tickText(last), 11) + 8;
  return apart >= widest ? ticks : ticks.filter((_, index) => index % 2 === 1);
}

function drawAxis(input: HeightDiagramInput, scale: HeightScale, values: ValueScale): DrawingElement[] {
  const elements: DrawingElement[] = [];
  const larger = Math.max(values.most, -values.least);
  const ticks = ticksWithRoom(input, larger, values).flatMap((tick) => [tick, -tick]);
  const printed: { readonly x: number; readonly half: number }[] = [];
  for (const tick of [0, ...ticks.filter((value) => value >= values.least && value <= values.most)]) {
    const x = Math.floor(values.xOf(tick)) + 0.5;
    const half = textWidth(input.tickText(tick), 11) / 2;
    if (tick !== 0)
      elements.push({ shape: 'line', x1: x, y1: scale.top, x2: x, y2: scale.bottom, stroke: 'rule', strokeWidth: 1 });
    if (printed.some((other) => Math.abs(other.x - x) < other.half + half + 6)) continue;
    printed.push({ x, half });
    const anchor = x < 16 ? 'start' : 'middle';
    elements.push({
      shape: 'text',
      x: anchor === 'start' ? 4 : x,
      y: 14,
      text: input.tickText(tick),
      size: 11,
      anchor,
      fill: 'graphite',
    });
  }
  for (const box of scale.boxes) {
    const y = Math.floor(box.top) + 0.5;
    elements.push({ shape: 'line', x1: 0, y1: y, x2: heightDiagramWidth, y2: y, stroke: 'rule', strokeWidth: 1 });
  }
  return elements;
}

/** One slim diagram beside the stack, on its vertical scale: axial, shear or moment of a wall down its height. */
export function drawHeightDiagram(input: HeightDiagramInput): Drawing {
  const scale = heightScale(input.stories);
  const values = valueScale(input);
  const chosen = scale.boxes.find((box) => box.level === input.chosen);
  const zero = values.xOf(0);
  const under: DrawingElement[] = chosen
    ? [
        {
          shape: 'rect',
          x: 0,
          y: chosen.top,
          width: heightDiagramWidth,
          height: round2(chosen.bottom - chosen.top),
          fill: 'choose',
        },
      ]
    : [];
  const frame: DrawingElement[] = [chosen?.top, chosen?.bottom].flatMap((y) =>
    y === undefined
      ? []
      : [
          {
            shape: 'line' as const,
            x1: 0,
            y1: y + 0.25,
            x2: heightDiagramWidth,
            y2: y + 0.25,
            stroke: 'ink' as const,
            strokeWidth: 1.5,
          },
        ],
  );
  return {
    width: heightDiagramWidth,
    height: round2(scale.bottom + 10),
    elements: [
      ...under,
      ...drawAxis(input, scale, values),
      { shape: 'line', x1: zero, y1: scale.top, x2: zero, y2: scale.bottom, stroke: 'ink', strokeWidth: 1.5 },
      ...drawEnvelope(input, scale, values.xOf),
      ...drawLegend(input, zero),
      ...input.curves.map((curve): DrawingElement => ({
        shape: 'path',
        d: polyline(corners(curve.values, input, scale, values.xOf)),
        stroke: 'ink',
        ...lines[curve.style],
      })),
      ...drawGround(heightDiagramWidth, scale.bottom),
      ...frame,
      ...input.curves.flatMap((curve) => drawMarks(curve, input, scale, values.xOf)),
    ],
  };
}
