import type { DrawingElement } from './elements.ts';
import type { HeightScale } from './heightScale.ts';
import { round2 } from './round2.ts';
import type { StackWall } from './stackTypes.ts';

const left = 46;
const width = 66;
const strokeBelow = 4;

/** Walls seen along +y: those in the view as 22 % fills, those across it as 2 px strokes; the chosen one solid ink. */
export function drawStackWalls(
  walls: readonly StackWall[],
  scale: HeightScale,
  chosenWall: string | null,
): DrawingElement[] {
  const ends = walls.flatMap((wall) => [wall.x1, wall.x2]);
  const [least, most] = [Math.min(...ends), Math.max(...ends)];
  const perLength = most > least ? width / (most - least) : 0;
  const xOf = (x: number): number => (perLength > 0 ? left + (x - least) * perLength : left + width / 2);
  const fills: DrawingElement[] = [];
  const strokes: DrawingElement[] = [];
  const chosen: DrawingElement[] = [];
  for (const wall of walls) {
    const [a, b] = [xOf(Math.min(wall.x1, wall.x2)), xOf(Math.max(wall.x1, wall.x2))];
    const isChosen = wall.name === chosenWall;
    const isStroke = b - a < strokeBelow;
    const thick = isChosen ? 4 : 2;
    const y = scale.yOf(wall.toElevation);
    const box = {
      shape: 'rect' as const,
      x: round2(isStroke ? (a + b) / 2 - thick / 2 : a),
      y,
      width: round2(isStroke ? thick : b - a),
      height: round2(scale.yOf(wall.fromElevation) - y),
    };
    if (isChosen) chosen.push({ ...box, fill: 'ink' });
    else if (isStroke) strokes.push({ ...box, fill: 'graphite' });
    else fills.push({ ...box, fill: 'graphite', fillOpacity: 0.22 });
  }
  return [...fills, ...strokes, ...chosen];
}
