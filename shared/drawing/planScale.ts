import type { PlanInput, PlanPoint } from './planTypes.ts';
import { round2 } from './round2.ts';

/** px around the slab: dimensions above and at the left, legend below */
export const planMargin = { side: 60, top: 44, bottom: 62 };
const sideMargins = planMargin.side * 2;
const mostHeight = 360;

/** Under this width the legend takes a line of its own below the scale bar. */
const legendBeside = 640;
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
export function planScale(input: Pick<PlanInput, 'width' | 'extent' | 'walls'>): PlanScale {
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
  const legendBelow = input.width < legendBeside;
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
