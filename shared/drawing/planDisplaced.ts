import type { DrawingElement } from './elements.ts';
import type { PlanScale } from './planScale.ts';
import type { PlanDisplacement, PlanInput, PlanPoint } from './planTypes.ts';

/** px that the farthest corner may move */
const reach = 28;

type Extent = PlanInput['extent'];

const cornersOf = ({ x, y, edgeX, edgeY }: Extent): readonly PlanPoint[] => [
  { x: edgeX, y: edgeY },
  { x: edgeX + x, y: edgeY },
  { x: edgeX + x, y: edgeY + y },
  { x: edgeX, y: edgeY + y },
];

/** A floor rigid in its plane: u = (ux - theta (y - py), uy + theta (x - px)), small rotations. */
const moved = (
  corner: PlanPoint,
  point: PlanPoint,
  { x, y, rotation }: PlanDisplacement,
  times: number,
): PlanPoint => ({
  x: corner.x + times * (x - rotation * (corner.y - point.y)),
  y: corner.y + times * (y + rotation * (corner.x - point.x)),
});

/** 1, 2 or 5 times a power of ten, the largest with which no corner moves more than 28 px; 0 where nothing moves. */
export function exaggeration(
  extent: Extent,
  point: PlanPoint,
  displaced: PlanDisplacement,
  pixelsPerLength: number,
): number {
  const farthest = cornersOf(extent).reduce((most, corner) => {
    const to = moved(corner, point, displaced, 1);
    const [dx, dy] = [to.x - corner.x, to.y - corner.y];
    return Math.max(most, Math.sqrt(dx * dx + dy * dy));
  }, 0);
  if (farthest === 0) return 0;
  const most = reach / (farthest * pixelsPerLength);
  let power = 1;
  while (power * 10 <= most) power *= 10;
  while (power > most) power /= 10;
  return (power * 5 <= most ? 5 : power * 2 <= most ? 2 : 1) * power;
}

/** The slab as the case moves it, exaggerated: a dashed hairline. */
export function drawDisplaced(input: PlanInput, scale: PlanScale): DrawingElement[] {
  if (!input.displaced) return [];
  const times = exaggeration(input.extent, input.mass, input.displaced, scale.pixelsPerLength);
  if (times === 0) return [];
  const { displaced, mass } = input;
  const points = cornersOf(input.extent).map((corner) => {
    const to = moved(corner, mass, displaced, times);
    return scale.at(to.x, to.y);
  });
  return [
    {
      shape: 'path',
      d: `M${points.map(({ x, y }) => `${x} ${y}`).join('L')}Z`,
      fill: 'none',
      stroke: 'graphite',
      strokeWidth: 0.75,
      dash: '6 4',
    },
  ];
}
