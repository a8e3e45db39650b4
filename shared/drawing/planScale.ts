import type { PlanInput, PlanPoint } from './planTypes.ts';
import { round2 } from './round2.ts';
import { scaleBarPart } from './scaleBarPart.ts';

/** px around the slab: dimensions above and at the left, legend below */
export const planMargin = { side: 60, top: 44, bottom: 62 };
const sideMargins = planMargin.side * 2;
const mostHeight = 360;

/** px that the parts of the legend take beside each other */
export const legendWidths = { direct: 74, adds: 108, relieves: 120 };
/** between scale bar and legend, and for the axes after it */
const legendGaps = 32 + 46;
const legendLine = 22;

export interface PlanScale {
  readonly pixelsPerLength: number;
  readonly width: number;
  readonly height: number;
  readonly legendBelow: boolean;
  /** the slab in px */
  readonly slab: { readonly left: number; readonly top: number; readonly right: number; readonly bottom: number };
  readonly at: (x: number, y: number) => PlanPoint;
}

/** One scale both ways, s = min((width - 120) / extent x, 360 / extent y), over the slab and whatever wall stands outside it. */
export function planScale(input: Pick<PlanInput, 'units' | 'width' | 'extent' | 'walls'>): PlanScale {
  const { extent, walls } = input;
  const xs = walls.flatMap((wall) => [wall.x1, wall.x2]);
  const ys = walls.flatMap((wall) => [wall.y1, wall.y2]);
  const left = Math.min(extent.edgeX, ...xs);
  const right = Math.max(extent.edgeX + extent.x, ...xs);
  const low = Math.min(extent.edgeY, ...ys);
  const high = Math.max(extent.edgeY + extent.y, ...ys);
  const acrossX = right - left || 1;
  const acrossY = high - low || 1;
  const pixelsPerLength = Math.min((input.width - sideMargins) / acrossX, mostHeight / acrossY);
  const start = round2((input.width - acrossX * pixelsPerLength) / 2);
  const at = (x: number, y: number): PlanPoint => ({
    x: round2(start + (x - left) * pixelsPerLength),
    y: round2(planMargin.top + (high - y) * pixelsPerLength),
  });
  const barLength = 4 * scaleBarPart(pixelsPerLength, input.units) * pixelsPerLength;
  const legendLength = legendWidths.direct + legendWidths.adds + legendWidths.relieves + legendGaps;
  // where scale bar, legend and axes do not fit beside each other, the legend takes a line of its own
  const legendBelow = start + barLength + legendLength > input.width;
  const lowerLeft = at(extent.edgeX, extent.edgeY);
  const upperRight = at(extent.edgeX + extent.x, extent.edgeY + extent.y);
  return {
    pixelsPerLength,
    width: input.width,
    height: round2(planMargin.top + acrossY * pixelsPerLength + planMargin.bottom + (legendBelow ? legendLine : 0)),
    legendBelow,
    slab: { left: lowerLeft.x, bottom: lowerLeft.y, right: upperRight.x, top: upperRight.y },
    at,
  };
}
