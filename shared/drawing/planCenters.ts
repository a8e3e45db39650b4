import { formatPlanLength } from '../format/length.ts';
import type { DrawingElement, TextElement } from './elements.ts';
import { boxAround, overlapArea, type LabelBox } from './labelBoxes.ts';
import type { PlanInput, PlanPoint } from './planTypes.ts';
import { round2 } from './round2.ts';
import { textWidth } from './textWidth.ts';

const closest = 24;
/** px from the farther center to the dimension, in the order they are tried; beside: negative is at the left */
const belowOffsets = [44, 68, 80, 92, 104, 116, 128, 32];
const besideOffsets = [40, -56, -40, -76, 76, -96, 96, -120, 120];
const rigidityName = 'center of rigidity';

export interface Centers {
  readonly under: readonly DrawingElement[];
  readonly over: readonly DrawingElement[];
  readonly boxes: readonly LabelBox[];
}

const note = (text: string, x: number, y: number, anchor: 'start' | 'end' | 'middle'): TextElement => ({
  shape: 'text',
  text,
  x: round2(x),
  y: round2(y),
  size: 12,
  anchor,
  fill: 'graphite',
  halo: 'sheet',
});

const dim = (x1: number, y1: number, x2: number, y2: number, heavy = false): DrawingElement => ({
  shape: 'line',
  x1: round2(x1),
  y1: round2(y1),
  x2: round2(x2),
  y2: round2(y2),
  stroke: heavy ? 'ink' : 'graphite',
  strokeWidth: heavy ? 1.5 : 0.75,
});

const tick = (x: number, y: number): DrawingElement => dim(x - 4, y + 4, x + 4, y - 4, true);

/** Quartered circle of 18 px. */
export function drawMass({ x, y }: PlanPoint): DrawingElement[] {
  const quarters = `M${x} ${y}V${y - 9}A9 9 0 0 1 ${x + 9} ${y}ZM${x} ${y}V${y + 9}A9 9 0 0 1 ${x - 9} ${y}Z`;
  return [
    { shape: 'circle', cx: x, cy: y, r: 9, fill: 'sheet', stroke: 'ink', strokeWidth: 1.5 },
    { shape: 'path', d: quarters, fill: 'ink' },
  ];
}

/** Square on its corner with a cross, 20 px. */
export function drawRigidity({ x, y }: PlanPoint): DrawingElement[] {
  const d = `M${x} ${y - 10}L${x + 10} ${y}L${x} ${y + 10}L${x - 10} ${y}Z`;
  return [
    { shape: 'path', d, fill: 'sheet', stroke: 'ink', strokeWidth: 1.5 },
    dim(x - 4.5, y, x + 4.5, y, true),
    dim(x, y - 4.5, x, y + 4.5, true),
  ];
}

/** Both centers with their names at the ends of one dimension: below them along x, beside them where they differ in y only. */
export function drawCenters(
  input: PlanInput,
  mass: PlanPoint,
  rigidity: PlanPoint | null,
  walls: readonly LabelBox[],
): Centers {
  const massBox = boxAround([mass], 10);
  const stiff = input.rigidity;
  if (rigidity === null || stiff === null) {
    const label = note(input.massName, mass.x + 14, mass.y + 4, 'start');
    return { under: [label], over: drawMass(mass), boxes: [massBox, around(label)] };
  }
  const over = [...drawMass(mass), ...drawRigidity(rigidity)];
  const marks = [massBox, boxAround([rigidity], 11)];
  const alongX = Math.abs(mass.x - rigidity.x);
  const alongY = Math.abs(mass.y - rigidity.y);
  if (alongX < closest && alongY < closest) {
    const { lines, texts } = nameWithLeaders(input, mass, rigidity, walls);
    return { under: [...lines, ...texts], over, boxes: [...marks, ...texts.map(around)] };
  }
  const build = (off: number): { lines: DrawingElement[]; texts: TextElement[] } =>
    alongX >= closest
      ? dimensionBelow(input, mass, rigidity, off, Math.abs(input.mass.x - stiff.x))
      : dimensionBeside(input, mass, rigidity, off, Math.abs(input.mass.y - stiff.y));
  let best = build(56);
  const cost = (texts: readonly TextElement[]): number =>
    texts.reduce((sum, text) => sum + overlapArea(around(text), walls), 0);
  for (const off of alongX >= closest ? belowOffsets : besideOffsets) {
    if (cost(best.texts) === 0) break;
    const next = build(off);
    if (cost(next.texts) < cost(best.texts)) best = next;
  }
  return { under: [...best.lines, ...best.texts], over, boxes: [...marks, ...best.texts.map(around)] };
}

/** px from a center to where its name begins, in the order they are tried; the two names go to opposite sides */
const nameOffsets: readonly (readonly [across: number, down: number])[] = [
  [34, 26],
  [34, -26],
  [34, 50],
  [34, -50],
  [34, 74],
  [56, 98],
  [56, -74],
];

/** Names of two centers that nearly meet: each with a leader to its own side, where it is written over the least. */
function nameWithLeaders(
  input: PlanInput,
  mass: PlanPoint,
  rigidity: PlanPoint,
  walls: readonly LabelBox[],
): { lines: DrawingElement[]; texts: TextElement[] } {
  const rigidityLeft = rigidity.x <= mass.x;
  const lines: DrawingElement[] = [];
  const texts: TextElement[] = [];
  for (const [name, center, side] of [
    [rigidityName, rigidity, rigidityLeft ? -1 : 1],
    [input.massName, mass, rigidityLeft ? 1 : -1],
  ] as const) {
    const anchor = side < 0 ? 'end' : 'start';
    const tries = nameOffsets.map(([across, down]) => {
      const text = note(name, center.x + side * across, center.y + down, anchor);
      return { text, across, down, cost: overlapArea(around(text), walls) };
    });
    const best = tries.reduce((before, next) => (next.cost < before.cost ? next : before));
    const toY = center.y + best.down - 4;
    const startY = center.y + (best.down < 0 ? -7 : 7);
    lines.push(dim(center.x + side * 6, startY, center.x + side * (best.across - 4), toY));
    texts.push(best.text);
  }
  return { lines, texts };
}

const strong = (text: TextElement): TextElement => ({ ...text, weight: 500, fill: 'ink' });

function dimensionBelow(input: PlanInput, mass: PlanPoint, rigidity: PlanPoint, off: number, distance: number) {
  const y = Math.max(mass.y, rigidity.y) + off;
  const rigidityLeft = rigidity.x < mass.x;
  const [left, right] = rigidityLeft ? [rigidity.x, mass.x] : [mass.x, rigidity.x];
  const [leftName, rightName] = rigidityLeft ? [rigidityName, input.massName] : [input.massName, rigidityName];
  const unit = input.units === 'us' ? 'ft' : 'm';
  const number = `${formatPlanLength(distance, input.units)} ${unit}`;
  // wider than its dimension, it would be struck through by the lines that come down to it
  const numberY = textWidth(number, 12, 500) + 6 > right - left ? y + 20 : y - 6;
  return {
    lines: [
      dim(mass.x, mass.y + 12, mass.x, y + 5),
      dim(rigidity.x, rigidity.y + 13, rigidity.x, y + 5),
      dim(left, y, right, y),
      tick(left, y),
      tick(right, y),
    ],
    texts: [
      strong(note(number, (left + right) / 2, numberY, 'middle')),
      note(leftName, left - 10, y + 4, 'end'),
      note(rightName, right + 10, y + 4, 'start'),
    ],
  };
}

function dimensionBeside(input: PlanInput, mass: PlanPoint, rigidity: PlanPoint, off: number, distance: number) {
  const right = off > 0;
  const x = right ? Math.max(mass.x, rigidity.x) + off : Math.min(mass.x, rigidity.x) + off;
  const toward = right ? 1 : -1;
  const anchor = right ? 'start' : 'end';
  const rigidityAbove = rigidity.y < mass.y;
  const [top, bottom] = rigidityAbove ? [rigidity.y, mass.y] : [mass.y, rigidity.y];
  const [topName, bottomName] = rigidityAbove ? [rigidityName, input.massName] : [input.massName, rigidityName];
  const unit = input.units === 'us' ? 'ft' : 'm';
  return {
    lines: [
      dim(mass.x + 12 * toward, mass.y, x + 5 * toward, mass.y),
      dim(rigidity.x + 13 * toward, rigidity.y, x + 5 * toward, rigidity.y),
      dim(x, top, x, bottom),
      tick(x, top),
      tick(x, bottom),
    ],
    texts: [
      strong(
        note(`${formatPlanLength(distance, input.units)} ${unit}`, x + 8 * toward, (top + bottom) / 2 + 4, anchor),
      ),
      note(topName, x + 8 * toward, top - 6, anchor),
      note(bottomName, x + 8 * toward, bottom + 14, anchor),
    ],
  };
}

function around(text: TextElement): LabelBox {
  const width = textWidth(text.text, text.size, text.weight);
  const left = text.anchor === 'end' ? text.x - width : text.anchor === 'middle' ? text.x - width / 2 : text.x;
  return { left, right: left + width, top: text.y - 12, bottom: text.y + 4 };
}
