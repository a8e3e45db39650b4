import { expect, it } from 'vitest';

import { drawDisplaced, exaggeration } from './planDisplaced.ts';
import { planScale } from './planScale.ts';
import type { PlanInput } from './planTypes.ts';

const extent = { x: 40, y: 30, edgeX: 0, edgeY: 0 };
const mass = { x: 20, y: 15 };

it('takes the largest round multiple that keeps the corners within 28 px', () => {
  // 0.01 ft at 10 px a foot: 0.1 px, so 280 times would reach 28 px
  expect(exaggeration(extent, mass, { x: 0.01, y: 0, rotation: 0 }, 10)).toBe(200);
  // turned by 0.001 about the middle: corners are 25 ft away, 0.25 px, 112 times
  expect(exaggeration(extent, mass, { x: 0, y: 0, rotation: 0.001 }, 10)).toBe(100);
  expect(exaggeration(extent, mass, { x: 5, y: 0, rotation: 0 }, 10)).toBe(0.5);
  expect(exaggeration(extent, mass, { x: 0, y: 0, rotation: 0 }, 10)).toBe(0);
});

it('moves and turns the slab about its point', () => {
  const input: PlanInput = {
    units: 'us',
    width: 520,
    extent,
    walls: [],
    mass,
    massName: 'center of mass',
    rigidity: null,
    force: null,
    chosenWall: null,
    displaced: { x: 0.01, y: 0, rotation: 0.001 },
  };
  // 400 px over 40 ft: 10 px a foot; at the lower left (0.01 + 0.015, -0.02) ft, 0.032 ft = 0.32 px: 50 times
  const scale = planScale(input);
  expect(scale.pixelsPerLength).toBe(10);
  const [outline] = drawDisplaced(input, scale);
  const at = scale.at(50 * 0.025, 50 * -0.02);
  expect(outline).toMatchObject({ shape: 'path', strokeWidth: 0.75, dash: '6 4' });
  expect(outline && 'd' in outline ? outline.d : '').toContain(`M${at.x} ${at.y}L`);
});
