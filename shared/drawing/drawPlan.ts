import type { Drawing, DrawingElement } from './elements.ts';
import { boxAround, type LabelBox } from './labelBoxes.ts';
import { drawCenters } from './planCenters.ts';
import { drawDisplaced } from './planDisplaced.ts';
import { drawPlanLegend, drawSlab } from './planFurniture.ts';
import { drawPlanLabels } from './planLabels.ts';
import { planScale, type PlanScale } from './planScale.ts';
import { drawPlanWall, move, placeWall, polygon, strip, type PlacedWall } from './planWall.ts';
import type { PlanInput, PlanPoint } from './planTypes.ts';
import { round2 } from './round2.ts';
import { arrowParts, arrowTail, drawShareArrow, largestShare } from './shareArrow.ts';
import { textWidth } from './textWidth.ts';

const forceLength = 74;

/** 2.5 px arrow from the center of mass in the direction of the story shear, `V` and its value at the head. */
function drawForce(
  force: NonNullable<PlanInput['force']>,
  mass: PlanPoint,
): { elements: DrawingElement[]; boxes: LabelBox[] } {
  const size = Math.sqrt(force.x * force.x + force.y * force.y);
  if (size === 0) return { elements: [], boxes: [] };
  const along = { x: force.x / size, y: -force.y / size };
  const tail = move(mass, along, 10);
  const neck = move(tail, along, forceLength);
  const tip = move(neck, along, 16);
  const across = { x: -along.y, y: along.x };
  const left = along.x < -0.5;
  const x = round2(tip.x + (Math.abs(along.x) > 0.5 ? (left ? -6 : 6) : 12));
  const y = round2(Math.abs(along.x) > 0.5 ? tip.y - 4 : tip.y + (along.y < 0 ? 16 : -18));
  const width = Math.max(textWidth(`V ${force.text}`, 12, 600), textWidth(force.note, 12)) + 4;
  const from = left ? x - width : x;
  const text = { shape: 'text' as const, y, size: 12 as const, halo: 'sheet' as const };
  return {
    elements: [
      {
        shape: 'line',
        x1: round2(tail.x),
        y1: round2(tail.y),
        x2: round2(neck.x),
        y2: round2(neck.y),
        stroke: 'ink',
        strokeWidth: 2.5,
      },
      { shape: 'path', d: polygon([move(neck, across, 6), tip, move(neck, across, -6)]), fill: 'ink' },
      { ...text, x: from, text: 'V', weight: 600, fill: 'ink' },
      { ...text, x: from + 12, text: force.text, weight: 400, fill: 'ink' },
      { ...text, x: from, y: y + 15, text: force.note, weight: 400, fill: 'graphite' },
    ],
    boxes: [{ left: from, right: from + width, top: y - 12, bottom: y + 20 }, boxAround([tail, tip], 6)],
  };
}

/** Placed walls of a plan, in px: what can be pointed at. */
export function placePlanWalls(input: PlanInput): {
  readonly placed: readonly PlacedWall[];
  readonly width: number;
  readonly height: number;
} {
  const scale = planScale(input);
  const rigidity =
    input.rigidity === null ? scale.at(input.mass.x, input.mass.y) : scale.at(input.rigidity.x, input.rigidity.y);
  return {
    placed: input.walls.map((wall) => placeWall(wall, scale, rigidity)),
    width: scale.width,
    height: scale.height,
  };
}

/** The four edges of the slab: a label stands on one side of them. */
function slabEdges({ slab: { left, right, top, bottom } }: PlanScale): LabelBox[] {
  const corners = [
    { x: left, y: top },
    { x: right, y: top },
    { x: right, y: bottom },
    { x: left, y: bottom },
  ];
  return corners.map((corner, index) => boxAround([corner, corners[(index + 1) % 4] ?? corner], 1));
}

/** The plan of a story: walls to scale, both centers with their distance, the applied force, what each wall takes. */
export function drawPlan(input: PlanInput): Drawing {
  const scale = planScale(input);
  const { placed } = placePlanWalls(input);
  const mass = scale.at(input.mass.x, input.mass.y);
  const rigidity = input.rigidity && scale.at(input.rigidity.x, input.rigidity.y);
  const largest = largestShare(input.walls);
  const wallBoxes = placed.map((one) => boxAround(strip(one.end1, one.along, one.length, one.thickness), 2));
  const arrows = placed.map((one) => {
    const { direct, torsional, total } = one.wall;
    const parts = arrowParts(direct, torsional, total, largest);
    if (!parts) return { elements: [], boxes: [] };
    const tail = arrowTail(one, parts.sense);
    const reach = parts.solid + parts.hatched + Math.max(parts.hollow, 7);
    const tip = move(tail, { x: one.along.x * parts.sense, y: one.along.y * parts.sense }, reach);
    return { elements: drawShareArrow(one, parts), boxes: [boxAround([tail, tip], 5)] };
  });
  const arrowBoxes = arrows.flatMap((arrow) => arrow.boxes);
  const force = input.force ? drawForce(input.force, mass) : { elements: [], boxes: [] };
  const centers = drawCenters(input, mass, rigidity, [...wallBoxes, ...arrowBoxes, ...force.boxes]);
  const page = { left: 2, right: scale.width - 2, top: 0, bottom: scale.height - (scale.legendBelow ? 56 : 34) };
  const labels = drawPlanLabels(
    placed.map((one, index) => ({ placed: one, arrowed: (arrows[index]?.boxes.length ?? 0) > 0 })),
    [...centers.boxes, ...force.boxes, ...wallBoxes, ...arrowBoxes, ...slabEdges(scale)],
    page,
  );
  return {
    width: scale.width,
    height: scale.height,
    elements: [
      ...drawDisplaced(input, scale),
      ...drawSlab(input, scale),
      ...placed.flatMap((one) => drawPlanWall(one, one.wall.name === input.chosenWall)),
      ...arrows.flatMap((arrow) => arrow.elements),
      ...centers.under,
      ...labels,
      ...force.elements,
      ...centers.over,
      ...drawPlanLegend(input, scale),
    ],
  };
}
