import type { DrawingElement } from './elements.ts';
import type { PlanScale } from './planScale.ts';
import type { PlanPoint, PlanWall } from './planTypes.ts';
import { round2 } from './round2.ts';

/** A wall on paper: its ends, direction and normal in px (y down), and the width of its stroke. */
export interface PlacedWall {
  readonly wall: PlanWall;
  readonly end1: PlanPoint;
  readonly end2: PlanPoint;
  readonly middle: PlanPoint;
  /** unit direction from end 1 to end 2 */
  readonly along: PlanPoint;
  /** unit normal, turned to the side on which arrow and label stand */
  readonly outward: PlanPoint;
  readonly length: number;
  readonly thickness: number;
}

const leastThickness = 4;
const arrowOffFace = 9;

export const move = (from: PlanPoint, direction: PlanPoint, distance: number): PlanPoint => ({
  x: from.x + direction.x * distance,
  y: from.y + direction.y * distance,
});

/** Places a wall; its arrow stands on the side away from the center of rigidity, and inside the slab at the edges. */
export function placeWall(wall: PlanWall, scale: PlanScale, rigidity: PlanPoint): PlacedWall {
  const end1 = scale.at(wall.x1, wall.y1);
  const end2 = scale.at(wall.x2, wall.y2);
  const length = Math.sqrt((end2.x - end1.x) * (end2.x - end1.x) + (end2.y - end1.y) * (end2.y - end1.y)) || 1;
  const along = { x: (end2.x - end1.x) / length, y: (end2.y - end1.y) / length };
  const middle = { x: (end1.x + end2.x) / 2, y: (end1.y + end2.y) / 2 };
  const thickness = Math.max(leastThickness, wall.thickness * scale.pixelsPerLength);
  const normal = { x: -along.y, y: along.x };
  const away = (middle.x - rigidity.x) * normal.x + (middle.y - rigidity.y) * normal.y >= 0 ? 1 : -1;
  const inside = (sign: number): boolean => {
    const point = move(middle, normal, sign * (thickness / 2 + arrowOffFace));
    const { left, right, top, bottom } = scale.slab;
    return point.x > left && point.x < right && point.y > top && point.y < bottom;
  };
  const sign = !inside(away) && inside(-away) ? -away : away;
  return { wall, end1, end2, middle, along, outward: { x: normal.x * sign, y: normal.y * sign }, length, thickness };
}

const point = ({ x, y }: PlanPoint): string => `${round2(x)} ${round2(y)}`;

export const polygon = (points: readonly PlanPoint[]): string => `M${points.map(point).join('L')}Z`;

/** The four corners of a strip of `width` along a direction, from `start` on. */
export function strip(start: PlanPoint, along: PlanPoint, length: number, width: number): readonly PlanPoint[] {
  const across = { x: -along.y, y: along.x };
  const end = move(start, along, length);
  return [
    move(start, across, width / 2),
    move(end, across, width / 2),
    move(end, across, -width / 2),
    move(start, across, -width / 2),
  ];
}

/** Walls are filled, never outlined; the chosen one has a 1 px frame 4 px outside it. */
export function drawPlanWall(placed: PlacedWall, chosen: boolean): DrawingElement[] {
  const { end1, along, length, thickness } = placed;
  const body: DrawingElement = { shape: 'path', d: polygon(strip(end1, along, length, thickness)), fill: 'ink' };
  if (!chosen) return [body];
  const frame = polygon(strip(move(end1, along, -4), along, length + 8, thickness + 8));
  return [{ shape: 'path', d: frame, fill: 'none', stroke: 'ink', strokeWidth: 1 }, body];
}
