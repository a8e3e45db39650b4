import type { DrawingElement } from './elements.ts';
import { move, polygon, strip, type PlacedWall } from './planWall.ts';
import type { PlanPoint } from './planTypes.ts';

const arrowOffFace = 9;
const shaftWidth = 5;
const headWidth = 10;
const headLength = 7;
const longest = 84;
const least = 1.5;

/** Parts of an arrow in px along its direction: direct solid, torsion that adds hatched, torsion that relieves hollow. */
export interface ArrowParts {
  /** +1 along (x1, y1) to (x2, y2) */
  readonly sense: 1 | -1;
  readonly solid: number;
  readonly hatched: number;
  /** beyond the head: what torsion takes off the direct part */
  readonly hollow: number;
}

/**
 * Lengths = force x 84 px / largest. Where torsion turns the force of the wall round, the arrow points its way and is hatched
 * over what is left of it. Null under 1.5 px.
 */
export function arrowParts(direct: number, torsional: number, total: number, largest: number): ArrowParts | null {
  const scale = largest > 0 ? longest / largest : 0;
  const length = Math.abs(total) * scale;
  if (length < least) return null;
  const sense = total >= 0 ? 1 : -1;
  const along = direct * sense;
  if (along <= 0) return { sense, solid: 0, hatched: length, hollow: 0 };
  const turned = torsional * sense;
  if (turned >= 0) return { sense, solid: along * scale, hatched: turned * scale, hollow: 0 };
  return { sense, solid: length, hatched: 0, hollow: -turned * scale };
}

/** The largest direct or total force of the walls: it gets the longest arrow. */
export function largestShare(walls: readonly { direct: number; total: number }[]): number {
  let largest = 0;
  for (const { direct, total } of walls) largest = Math.max(largest, Math.abs(direct), Math.abs(total));
  return largest;
}

/** Where the shaft of a wall's arrow starts: at the wall's end, 9 px off its face. */
export function arrowTail(placed: PlacedWall, sense: 1 | -1): PlanPoint {
  return move(sense > 0 ? placed.end1 : placed.end2, placed.outward, placed.thickness / 2 + arrowOffFace);
}

export function drawShareArrow(placed: PlacedWall, parts: ArrowParts): DrawingElement[] {
  const { sense, solid, hatched, hollow } = parts;
  const along = { x: placed.along.x * sense, y: placed.along.y * sense };
  const across = { x: -along.y, y: along.x };
  const tail = arrowTail(placed, sense);
  const elements: DrawingElement[] = [];
  if (solid >= 0.5) {
    elements.push({ shape: 'path', d: polygon(strip(tail, along, solid, shaftWidth)), fill: 'ink' });
  }
  const afterSolid = move(tail, along, solid);
  if (hatched >= 0.5) {
    const d = polygon(strip(afterSolid, along, hatched, shaftWidth));
    elements.push({ shape: 'path', d, fill: 'hatch-ink', stroke: 'ink', strokeWidth: 0.75 });
  }
  const neck = move(afterSolid, along, hatched);
  const tip = move(neck, along, headLength);
  const head = [move(neck, across, headWidth / 2), tip, move(neck, across, -headWidth / 2)];
  elements.push({ shape: 'path', d: polygon(head), fill: 'ink' });
  if (hollow > headLength + 1) {
    const d = polygon(strip(tip, along, hollow - headLength, shaftWidth));
    elements.push({ shape: 'path', d, fill: 'sheet', stroke: 'ink', strokeWidth: 0.75 });
  } else if (hollow >= 1) {
    elements.push({
      shape: 'path',
      d: polygon(strip(tip, along, 1, shaftWidth)),
      fill: 'sheet',
      stroke: 'ink',
      strokeWidth: 0.75,
    });
  }
  return elements;
}
