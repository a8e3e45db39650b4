import { describe, expect, it } from 'vitest';

import { threeBases } from '../../components/drawing/testing/threeBases.ts';
import { sampleTables } from '../../engine/testing/sampleBuilding.ts';
import { saySpread } from './saySpread.ts';
import { storyBases } from './storyBases.ts';
import { wallUnderBases } from './wallUnderBases.ts';

const bases = ['rigid', 'flexible', 'compatible'] as const;
const story = storyBases(threeBases, sampleTables.walls, { bases, case: 'EX', variant: '0', level: 'L2' });

/** cantilever of one story: 1/(h3/(3 x 0.5 E I) + 1.2 h/(0.4 E A)), E = 1, ft */
const rigidity = (length: number, height: number): number => {
  const inertia = (length * length * length) / 12;
  return 1 / ((height * height * height) / (1.5 * inertia) + (1.2 * height) / (0.4 * length));
};

/** By hand for the story of L2: 135 kip at y = 25; Q1 at y = 0, Q2 at y = 50, P1 and P2 80 ft apart. */
function rigidByHand(): readonly [number, number] {
  const [q1, q2, p] = [rigidity(24, 15), rigidity(20, 15), rigidity(24, 15)];
  const center = (50 * q2) / (q1 + q2);
  const polar = q1 * center * center + q2 * (50 - center) * (50 - center) + 2 * p * 40 * 40;
  const turn = (-135 * (25 - center)) / polar;
  return [(135 * q1) / (q1 + q2) + turn * q1 * center, (135 * q2) / (q1 + q2) - turn * q2 * (50 - center)];
}

describe('bases side by side', () => {
  it('give flexible floors by tributary width, rigid ones by hand', () => {
    expect(story.bases).toEqual(['rigid', 'flexible', 'compatible']);
    const q1 = story.walls.find((one) => one.wall === 'Q1');
    const q2 = story.walls.find((one) => one.wall === 'Q2');
    const [hand1, hand2] = rigidByHand();
    expect(q1?.values[0]).toBeCloseTo(hand1, 6);
    expect(q2?.values[0]).toBeCloseTo(hand2, 6);
    // the floor reaches from 0 to 50 ft: half each
    expect(q1?.values[1]).toBeCloseTo(67.5, 9);
    expect(q2?.values[1]).toBeCloseTo(67.5, 9);
  });

  it('sum to the story shear under each', () => {
    for (const sum of story.sums) expect(sum).toBeCloseTo(135, 7);
  });

  it('name the wall that spreads most, with both ends of its range', () => {
    const widest = story.widest;
    expect(['Q1', 'Q2']).toContain(widest?.wall);
    const values = widest?.values.map((value) => value ?? 0) ?? [];
    expect(widest?.spread).toBeCloseTo(Math.max(...values) - Math.min(...values), 12);
    const said = saySpread(story);
    expect(said?.lead).toBe(`${widest?.wall ?? ''} spreads most:`);
    expect(said?.rest).toContain(`${((100 * Math.max(...values)) / 135).toFixed(1)} %`);
  });

  it('say nothing of a spread where all bases agree', () => {
    const one = storyBases(threeBases, sampleTables.walls, { bases: ['rigid'], case: 'EX', variant: '0', level: 'L2' });
    expect(one.widest).toBeNull();
    expect(saySpread(one)).toBeNull();
  });

  it('take flexible as built beside an eccentricity that it does not list', () => {
    const plus = storyBases(threeBases, sampleTables.walls, { bases, case: 'EX', variant: '+', level: 'L2' });
    expect(plus.walls.find((one) => one.wall === 'Q1')?.values[1]).toBeCloseTo(67.5, 9);
  });
});

it('follows one wall over the height, with gaps where it does not stand', () => {
  const down = [...threeBases.levels].sort((a, b) => b.elevation - a.elevation);
  const rows = wallUnderBases(threeBases, down, 'Q1', { bases, case: 'EX', variant: '0' });
  // 60, 105, 135 kip by halves
  [30, 52.5, 67.5].forEach((half, index) => expect(rows[index]?.values[1]).toBeCloseTo(half, 9));
  const none = wallUnderBases(threeBases, down, 'X', { bases, case: 'EX', variant: '0' });
  expect(none[0]).toEqual({ level: 'Roof', values: [null, null, null], spread: 0 });
});
