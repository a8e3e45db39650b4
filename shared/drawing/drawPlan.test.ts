import fc from 'fast-check';
import { expect, it } from 'vitest';

import { drawPlan, placePlanWalls } from './drawPlan.ts';
import type { DrawingElement, TextElement } from './elements.ts';
import { overlaps } from './labelBoxes.ts';
import { planScale } from './planScale.ts';
import type { PlanInput, PlanWall } from './planTypes.ts';
import { scaleBarPart } from './scaleBarPart.ts';
import { textWidth } from './textWidth.ts';

const wall = (name: string, x1: number, y1: number, x2: number, y2: number, share = 0.2): PlanWall => ({
  name,
  x1,
  y1,
  x2,
  y2,
  thickness: 1,
  direct: share * 80,
  torsional: share * 20,
  total: share * 100,
  share,
});

const input = (part: Partial<PlanInput> = {}): PlanInput => ({
  units: 'us',
  width: 690,
  extent: { x: 100, y: 60, edgeX: 0, edgeY: 0 },
  walls: [
    wall('P1', 0, 10, 0, 40, 0.4),
    wall('P2', 100, 10, 100, 40, 0.6),
    wall('P3', 20, 60, 50, 60, 0),
    wall('P4', 60, 0, 90, 0, 0),
  ],
  mass: { x: 50, y: 30 },
  massName: 'center of mass',
  rigidity: { x: 60, y: 30 },
  force: { x: 0, y: 100, text: '100.0 kip', note: 'story shear, EY' },
  chosenWall: null,
  ...part,
});

const words = (elements: readonly DrawingElement[]): string[] =>
  elements.filter((element): element is TextElement => element.shape === 'text').map((element) => element.text);

it('has one scale both ways', () => {
  // (690 - 120) / 100 = 5.7 and 360 / 60 = 6: the smaller
  const scale = planScale(input());
  expect(scale.pixelsPerLength).toBeCloseTo(5.7, 9);
  expect(scale.slab).toEqual({ left: 60, right: 630, top: 44, bottom: 386 });
  expect(scale.at(50, 30)).toEqual({ x: 345, y: 215 });
});

it('makes room for a wall outside the slab', () => {
  const scale = planScale(input({ walls: [wall('P1', 120, 0, 120, 30)] }));
  expect(scale.pixelsPerLength).toBeCloseTo(570 / 120, 9);
});

it('stands arrows away from the center of rigidity, and inside the slab at its edges', () => {
  const { placed } = placePlanWalls(input({ walls: [wall('In', 80, 10, 80, 40), wall('Edge', 100, 10, 100, 40)] }));
  expect(placed[0]?.outward.x).toBeCloseTo(1, 9);
  expect(placed[1]?.outward.x).toBeCloseTo(-1, 9);
});

it('dimensions the distance between the centers', () => {
  const shown = words(drawPlan(input()).elements);
  expect(shown).toContain('10.0 ft');
  expect(shown).toContain('center of mass');
  expect(shown).toContain('center of rigidity');
});

it('writes the distance under a dimension that is narrower than it', () => {
  // 5 ft are 28.5 px, less than the number; 10 ft are 57 px
  const heights = (x: number): { number: number; name: number } => {
    const texts = drawPlan(input({ rigidity: { x, y: 30 } })).elements.filter(
      (element): element is TextElement => element.shape === 'text',
    );
    const heightOf = (text: string): number => texts.find((one) => one.text === text)?.y ?? Number.NaN;
    return { number: heightOf(x === 55 ? '5.0 ft' : '10.0 ft'), name: heightOf('center of mass') };
  };
  const narrow = heights(55);
  const wide = heights(60);
  expect(narrow.number - narrow.name).toBeCloseTo(16, 9);
  expect(wide.number - wide.name).toBeCloseTo(-10, 9);
});

it('leads the names aside where the centers nearly meet', () => {
  const shown = words(drawPlan(input({ rigidity: { x: 51, y: 30 } })).elements);
  expect(shown).not.toContain('1.0 ft');
  expect(shown).toContain('center of rigidity');
});

it('names every wall; a share under half a percent is left out', () => {
  const shown = words(drawPlan(input()).elements);
  expect(shown).toEqual(expect.arrayContaining(['P1', 'P2', 'P3', 'P4', '40.0 %', '60.0 %']));
  expect(shown.filter((text) => text === '0.0 %')).toEqual([]);
});

it('takes a part of the scale bar that is round and can be seen', () => {
  expect(scaleBarPart(4.36, 'us')).toBe(10);
  expect(scaleBarPart(1.2, 'us')).toBe(50);
  expect(scaleBarPart(15, 'si')).toBe(2);
});

it('keeps scale bar, legend and axes apart and on the page, for slabs of any shape', () => {
  const extents = fc.record({ x: fc.integer({ min: 20, max: 400 }), y: fc.integer({ min: 20, max: 200 }) });
  fc.assert(
    fc.property(extents, fc.constantFrom(690, 500), ({ x, y }, width) => {
      const plan = input({
        walls: [],
        force: null,
        width,
        extent: { x, y, edgeX: 0, edgeY: 0 },
        mass: { x: x / 2, y: y / 2 },
      });
      const drawing = drawPlan({ ...plan, rigidity: null });
      const from = planScale(plan).slab.bottom + 20;
      const texts = drawing.elements.filter(
        (element): element is TextElement => element.shape === 'text' && element.y > from,
      );
      const boxes = texts.map((text) => {
        const long = textWidth(text.text, text.size, text.weight);
        const left = text.anchor === 'end' ? text.x - long : text.anchor === 'middle' ? text.x - long / 2 : text.x;
        return { left, right: left + long, top: text.y - 9, bottom: text.y };
      });
      boxes.forEach((box, index) => {
        expect(box.right).toBeLessThanOrEqual(width);
        expect(boxes.slice(index + 1).some((other) => overlaps(box, other))).toBe(false);
      });
    }),
  );
});

it('keeps marks apart in a plan with room, for walls anywhere', () => {
  const place = fc.record({
    x: fc.integer({ min: 0, max: 9 }),
    y: fc.integer({ min: 0, max: 3 }),
    upright: fc.boolean(),
  });
  fc.assert(
    fc.property(fc.uniqueArray(place, { minLength: 2, maxLength: 8, selector: ({ x, y }) => x * 10 + y }), (places) => {
      const walls = places.map(({ x, y, upright }, index) => {
        const [x1, y1] = [x * 24 + 6, y * 30 + 6];
        return upright ? wall(`Q${index}`, x1, y1, x1, y1 + 14, 0.1) : wall(`Q${index}`, x1, y1, x1 + 14, y1, 0.1);
      });
      const { elements } = drawPlan(
        input({ walls, extent: { x: 250, y: 130, edgeX: 0, edgeY: 0 }, width: 1100, force: null }),
      );
      const marks = elements.filter(
        (element): element is TextElement => element.shape === 'text' && element.text.startsWith('Q'),
      );
      expect(marks).toHaveLength(walls.length);
      const boxes = marks.map((mark) => {
        const width = textWidth(mark.text, mark.size, mark.weight);
        const left = mark.anchor === 'end' ? mark.x - width : mark.x;
        return { left, right: left + width, top: mark.y - 10, bottom: mark.y };
      });
      boxes.forEach((box, index) => {
        expect(boxes.slice(index + 1).some((other) => overlaps(box, other))).toBe(false);
      });
    }),
  );
});
