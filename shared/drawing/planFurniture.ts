import { formatPlanLength } from '../format/length.ts';
import type { DrawingElement } from './elements.ts';
import { legendWidths, planMargin, type PlanScale } from './planScale.ts';
import type { PlanInput } from './planTypes.ts';
import { round2 } from './round2.ts';
import { scaleBarPart } from './scaleBarPart.ts';

const line = (x1: number, y1: number, x2: number, y2: number, width = 0.75): DrawingElement => ({
  shape: 'line',
  x1: round2(x1),
  y1: round2(y1),
  x2: round2(x2),
  y2: round2(y2),
  stroke: width > 1 ? 'ink' : 'graphite',
  strokeWidth: width,
});

const tick = (x: number, y: number): DrawingElement => line(x - 4, y + 4, x + 4, y - 4, 1.5);

/** Slab edge, and its extent as a dimension above and at the left. */
export function drawSlab(input: PlanInput, scale: PlanScale): DrawingElement[] {
  const { left, right, top, bottom } = scale.slab;
  const unit = input.units === 'us' ? 'ft' : 'm';
  const above = planMargin.top - 22;
  const beside = left - 30;
  const text = (x: number, y: number, words: string): DrawingElement => ({
    shape: 'text',
    x: round2(x),
    y: round2(y),
    text: words,
    size: 11,
    anchor: 'middle',
    fill: 'graphite',
    halo: 'sheet',
  });
  return [
    {
      shape: 'rect',
      x: left,
      y: top,
      width: round2(right - left),
      height: round2(bottom - top),
      fill: 'none',
      stroke: 'line',
      strokeWidth: 1.5,
    },
    line(left, above - 5, left, top - 5),
    line(right, above - 5, right, top - 5),
    line(left, above, right, above),
    tick(left, above),
    tick(right, above),
    text((left + right) / 2, above + 4, `${formatPlanLength(input.extent.x, input.units)} ${unit}`),
    line(beside - 5, top, left - 5, top),
    line(beside - 5, bottom, left - 5, bottom),
    line(beside, top, beside, bottom),
    tick(beside, top),
    tick(beside, bottom),
    text(beside, (top + bottom) / 2 + 4, `${formatPlanLength(input.extent.y, input.units)} ${unit}`),
  ];
}

/** Scale bar, legend of the arrows, and the axes of the plan at the lower right. */
export function drawPlanLegend(input: PlanInput, scale: PlanScale): DrawingElement[] {
  const { right } = scale.slab;
  const y = scale.height - (scale.legendBelow ? 48 : 26);
  const legendY = scale.legendBelow ? y + 32 : y;
  const part = scaleBarPart(scale.pixelsPerLength, input.units);
  const step = part * scale.pixelsPerLength;
  const unit = input.units === 'us' ? 'ft' : 'm';
  // under a narrow slab everything moves left, so that bar and axes stay on the page
  const left = Math.max(8, Math.min(scale.slab.left, scale.width - 4 * step - 90));
  const elements: DrawingElement[] = [];
  for (let index = 0; index < 4; index += 1) {
    const box = { x: round2(left + index * step), y, width: round2(step), height: 4 };
    if (index % 2 === 0) elements.push({ shape: 'rect', ...box, fill: 'ink' });
    else elements.push({ shape: 'rect', ...box, fill: 'sheet', stroke: 'ink', strokeWidth: 1 });
    elements.push({
      shape: 'text',
      x: round2(left + index * step),
      y: y + 17,
      text: `${index * part}`,
      size: 11,
      anchor: 'middle',
      fill: 'graphite',
    });
  }
  elements.push({
    shape: 'text',
    x: round2(left + 4 * step - 6),
    y: y + 17,
    text: `${4 * part} ${unit}`,
    size: 11,
    fill: 'graphite',
  });
  const legend: readonly [string, DrawingElement, number][] = [
    ['direct', { shape: 'rect', x: 0, y: legendY, width: 22, height: 5, fill: 'ink' }, legendWidths.direct],
    [
      'torsion adds',
      { shape: 'rect', x: 0, y: legendY, width: 22, height: 5, fill: 'hatch-ink', stroke: 'ink', strokeWidth: 0.75 },
      legendWidths.adds,
    ],
    [
      'torsion relieves',
      { shape: 'rect', x: 0, y: legendY, width: 22, height: 5, fill: 'sheet', stroke: 'ink', strokeWidth: 0.75 },
      legendWidths.relieves,
    ],
  ];
  const legendWidth = legend.reduce((sum, [, , advance]) => sum + advance, 0);
  // clear of the last figure of the scale bar, and where there is room clear of the axes
  const barEnd = left + 4 * step;
  let x = round2(
    scale.legendBelow
      ? Math.min(left, scale.width - legendWidth - 8)
      : Math.max(barEnd + 32, Math.min(left + 218, right - 40 - legendWidth)),
  );
  for (const [words, sample, advance] of legend) {
    elements.push(sample.shape === 'rect' ? { ...sample, x } : sample);
    elements.push({ shape: 'text', x: x + 28, y: legendY + 6, text: words, size: 12, fill: 'graphite' });
    x += advance;
  }
  const axesAt = Math.max(right - 22, scale.legendBelow ? barEnd + 52 : x + 20);
  return [...elements, ...drawAxes(axesAt, y + 14)];
}

/** The axes of the coordinates typed: the tables know x and y, not where north is. */
function drawAxes(x: number, y: number): DrawingElement[] {
  return [
    line(x, y, x, y - 20, 1.5),
    line(x, y, x + 20, y, 1.5),
    {
      shape: 'path',
      d: `M${round2(x - 3.5)} ${round2(y - 18)}H${round2(x + 3.5)}L${round2(x)} ${round2(y - 26)}Z`,
      fill: 'ink',
    },
    {
      shape: 'path',
      d: `M${round2(x + 18)} ${round2(y - 3.5)}V${round2(y + 3.5)}L${round2(x + 26)} ${round2(y)}Z`,
      fill: 'ink',
    },
    { shape: 'text', x: round2(x - 8), y: round2(y - 16), text: 'y', size: 12, anchor: 'end', fill: 'graphite' },
    { shape: 'text', x: round2(x + 20), y: round2(y - 8), text: 'x', size: 12, fill: 'graphite' },
  ];
}
