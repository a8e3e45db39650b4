import { expect, test } from 'vitest';

import { lateralActions } from '../distribution/lateralActions.ts';
import { toModel } from '../model/toModel.ts';
import { building, force, level, wall } from '../testing/handBuilding.ts';

import { expandCombinations } from './expandCombinations.ts';

const tables = {
  levels: [level('Roof', 10)],
  walls: [wall('A', [0, 0, 20, 0], 10, ['Roof', 'Roof'])],
  forces: [
    force('Roof', 'WX', 'wind', 10, 0),
    force('Roof', 'EY', 'seismic', 0, 10),
    force('Roof', 'SOIL1', 'other', 5, 0),
    force('Roof', 'SOIL2', 'other', 6, 0),
  ],
};
const factors = { D: 1.2, L: 1, Lr: 0, S: 0, W: 0, E: 0, H: 0 };
const expand = (list: Partial<typeof factors>[], accidental = 0.05, forces = tables.forces) => {
  const model = toModel(building({ ...tables, forces }, { accidental }));
  return expandCombinations(
    list.map((more) => ({ name: null, text: 'text', factors: { ...factors, ...more }, standard: false })),
    lateralActions(model),
    model.settings,
  ).expansions;
};

test('wind acts both ways', () => {
  expect(expand([{ W: 1.6 }]).map(({ name, lateral }) => [name, lateral[0]?.factor])).toEqual([
    ['text; W = +WX', 1.6],
    ['text; W = −WX', -1.6],
  ]);
});

test('a seismic case enters as + and - only, both ways', () => {
  expect(expand([{ E: 1 }]).map(({ name }) => name)).toEqual([
    'text; E = +EY at +e',
    'text; E = −EY at +e',
    'text; E = +EY at −e',
    'text; E = −EY at −e',
  ]);
});

test('without accidental eccentricity only variant 0', () => {
  expect(expand([{ E: 1 }], 0).map(({ name }) => name)).toEqual(['text; E = +EY', 'text; E = −EY']);
});

test('each other case in turn is H, with its own sign', () => {
  expect(expand([{ H: 1.6 }]).map(({ name }) => name)).toEqual(['text; H = SOIL1', 'text; H = SOIL2']);
});

test('wind with two other cases: 2 x 2 states; a kind without a case counts 0', () => {
  expect(expand([{ W: 1, H: 1.6 }])).toHaveLength(4);
  expect(expand([{ W: 1 }], 0.05, []).map(({ lateral }) => lateral)).toEqual([[]]);
});

test('combinations with the same gravity factors share one axial load', () => {
  expect(expand([{ W: 1 }, { E: 1 }, { D: 0.9, E: 1 }]).map(({ gravitySet }) => gravitySet)).toEqual([
    0, 0, 0, 0, 0, 0, 1, 1, 1, 1,
  ]);
});
