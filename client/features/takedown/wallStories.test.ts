import { expect, it } from 'vitest';

import { levelsDown, resultChoice } from '../../components/drawing/resultChoice.ts';
import { sample, sampleTables } from '../../engine/testing/sampleBuilding.ts';
import { baseReactions, baseShearSum } from './reactions.ts';
import { sayGravityBalance } from './sayGravityBalance.ts';
import { shareSteps } from './shareSteps.ts';
import { caseEnvelope, variantOf, wallBases, wallStories } from './wallStories.ts';

const { document } = sample;
const down = levelsDown(document);
const names = ['P1', 'P2', 'Q1', 'Q2'];
const chosen = resultChoice(document, { level: 'L2', case: 'EY', variant: '0' });
if (!chosen) throw new Error('the sample has no case');

it('gives shear and moment of a wall from the top down', () => {
  // half of 60, 105, 135 kip; moments at the bottom: 30 x 12, + 52.5 x 12, + 67.5 x 15
  const stories = wallStories(document, down, 'P1', { basis: 'rigid', variant: '0' });
  expect(stories.map((story) => story.level)).toEqual(['Roof', 'L3', 'L2']);
  const at = (index: number) => stories[index]?.lateral.get('EY');
  expect(at(0)?.shear).toBeCloseTo(30, 9);
  expect(at(1)?.shear).toBeCloseTo(52.5, 9);
  expect(at(2)?.moment).toBeCloseTo(360 + 630 + 1012.5, 9);
});

it('adds gravity and self-weight down the wall', () => {
  // 3 x 40 kip typed; 24 ft x 1 ft x 39 ft x 0.15 kcf of wall
  const story = wallStories(document, down, 'P1', { basis: 'rigid', variant: '0' })[2];
  expect(story?.gravity.get('D')?.axial).toBeCloseTo(120 + 24 * 39 * 0.15, 9);
  expect(story?.gravity.get('L')?.axial).toBeCloseTo(30, 9);
});

it('has no entries where a wall does not stand', () => {
  const lateral = document.lateral.filter((one) => !(one.wall === 'P1' && one.level === 'Roof'));
  const stories = wallStories({ ...document, lateral }, down, 'P1', { basis: 'rigid', variant: '0' });
  expect(stories[0]?.lateral.size).toBe(0);
});

it('takes a case as built where it lacks the variant', () => {
  const lateral = document.lateral.filter((one) => one.case !== 'EX' || one.variant === '0');
  expect(variantOf({ ...document, lateral }, 'EX', '+')).toBe('0');
  expect(variantOf({ ...document, lateral }, 'EY', '+')).toBe('+');
});

it('spans the variants', () => {
  const [roof] = caseEnvelope(document, down, 'P1', 'EY', (force) => force.shear);
  // the accidental part adds to one sense what it takes from the other
  expect((roof?.least ?? 0) + (roof?.most ?? 0)).toBeCloseTo(60, 6);
  expect(roof?.most).toBeGreaterThan(30);
});

it('sums the base shears to the base shear of the case', () => {
  const reactions = baseReactions(document, down, names, chosen);
  expect(reactions.map((one) => [one.wall, one.atBase])).toEqual(names.map((name) => [name, true]));
  expect(baseShearSum(document, down, reactions, sampleTables.walls, 'EY')).toBeCloseTo(135, 9);
});

it('knows a wall that starts above the base', () => {
  const gravity = document.gravity.filter((one) => !(one.wall === 'Q1' && one.level === 'L2'));
  expect(wallBases({ ...document, gravity }, down, names)).toContainEqual({ wall: 'Q1', level: 'L3' });
});

it('takes a share apart so that its parts sum to it', () => {
  const plus = resultChoice(document, { level: 'L2', case: 'EY', variant: '+' });
  if (!plus) throw new Error('no variant');
  const steps = shareSteps(document, 'P1', plus, 0.05);
  const [story, direct, torsion, change, total] = steps.map((step) => step.value);
  expect(story).toBeCloseTo(135, 9);
  expect(direct).toBeCloseTo(67.5, 9);
  expect((direct ?? 0) + (torsion ?? 0) + (change ?? 0)).toBeCloseTo(total ?? 0, 12);
  expect(Math.abs(change ?? 0)).toBeGreaterThan(1);
});

it('sets gravity in against gravity out', () => {
  // 1,018.2 kip dead with self-weight and 120 kip live
  expect(sayGravityBalance(document, 'rigid', 'L2')).toBe('Gravity in 1,138.2, out 1,138.2 kip.');
});
