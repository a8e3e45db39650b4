import type { DrawingElement } from './elements.ts';

/** The ground: 3 px ink with 45 degree earth ticks 9 px apart below, `y` at the base of the elevation. */
export function drawGround(width: number, y: number): DrawingElement[] {
  const elements: DrawingElement[] = [
    { shape: 'line', x1: 0, y1: y + 1, x2: width, y2: y + 1, stroke: 'ink', strokeWidth: 3 },
  ];
  for (let x = 7; x <= width; x += 9) {
    elements.push({
      shape: 'line',
      x1: x,
      y1: y + 3,
      x2: x - 5,
      y2: y + 8,
      stroke: 'graphite',
      strokeWidth: 0.75,
    });
  }
  return elements;
}
