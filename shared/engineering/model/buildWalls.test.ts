import { describe, expect, it } from 'vitest';

import { storyStiffness } from '../distribution/storyStiffness.ts';
import { storyRigidities } from '../rigidity/storyRigidities.ts';
import { building, level, wall } from '../testing/handBuilding.ts';

import { toModel } from './toModel.ts';

/** One story of 10 ft. A wall 20 ft long, 10 in thick: h 120, l 240 in, Ec = 57 sqrt(f'c) ksi. */
const rigidityOf = (more: Parameters<typeof wall>[4], settings = {}) => {
  const model = toModel(
    building({ levels: [level('Roof', 10)], walls: [wall('A', [0, 0, 20, 0], 10, ['Roof', 'Roof'], more)] }, settings),
  );
  return storyRigidities(model)[0] ?? NaN;
};
/** by hand: h3/(3 Ec f t l3/12) = 4 (h/l)3/(Ec t f) = 0.5/(Ec t f); 1.2 h/(0.4 Ec s t l) = 3 (h/l)/(Ec t s) = 1.5/(Ec t s) */
const byHand = (fcPsi: number, flexure: number, shear: number, bending = 0.5) =>
  (57 * Math.sqrt(fcPsi) * 10) / (bending / flexure + 1.5 / shear);

describe('a wall’s own values win over those of the building', () => {
  it('flexure factor, shear factor, concrete', () => {
    expect(rigidityOf({})).toBeCloseTo(byHand(4000, 0.5, 1), 6);
    expect(rigidityOf({ flexure_factor: 0.35 })).toBeCloseTo(byHand(4000, 0.35, 1), 6);
    expect(rigidityOf({ shear_factor: 0.4 })).toBeCloseTo(byHand(4000, 0.5, 0.4), 6);
    expect(rigidityOf({ fc: 9000 })).toBeCloseTo(byHand(9000, 0.5, 1), 6);
  });
  it('the building’s values hold without them; fixed ends bend a quarter', () => {
    const stiffness = { flexure: 0.7, shear: 0.8, end: 'cantilever' as const, unitWeight: null };
    expect(rigidityOf({}, { stiffness })).toBeCloseTo(byHand(4000, 0.7, 0.8), 6);
    expect(rigidityOf({}, { fc: 6400 })).toBeCloseTo(byHand(6400, 0.5, 1), 6);
    expect(rigidityOf({}, { stiffness: { ...stiffness, end: 'fixed' } })).toBeCloseTo(byHand(4000, 0.7, 0.8, 0.125), 6);
  });
});

/** Parallel = within 0.5 degree; one point = within 1 in (engineering.md section 1): both sides of each limit. */
describe('what a story can’t resist', () => {
  const lackOf = (ends: readonly (readonly [number, number, number, number])[]) => {
    const model = toModel(
      building({
        levels: [level('Roof', 10)],
        walls: ends.map((place, i) => wall(`W${String(i)}`, place, 10, ['Roof', 'Roof'])),
      }),
    );
    const outcome = storyStiffness(model, storyRigidities(model), 0);
    return outcome.ok ? null : outcome.lack;
  };
  it('walls 0.4 degree apart count as parallel, 0.6 degree apart do not', () => {
    // over 100 ft: 0.698 ft and 1.047 ft
    expect(
      lackOf([
        [0, 0, 100, 0],
        [0, 50, 100, 50.698],
      ]),
    ).toContain('parallel');
    expect(
      lackOf([
        [0, 0, 100, 0],
        [0, 50, 100, 51.047],
        [0, 90, 100, 90],
      ]),
    ).toBeNull();
  });
  it('lines that miss one point by half an inch resist no torsion, by 12 in they do', () => {
    // three walls of one rigidity at 0, 90 and 0 degrees: the two along x stand d apart, the center between them
    const cross = (d: number) => [
      [-10, d / 24, 10, d / 24] as const,
      [0, -10, 0, 10] as const,
      [-10, -d / 24, 10, -d / 24] as const,
    ];
    expect(lackOf(cross(1))).toContain('one point');
    expect(lackOf(cross(12))).toBeNull();
  });
});
