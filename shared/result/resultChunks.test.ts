import { expect, it } from 'vitest';

import { building, force, level, wall } from '../engineering/testing/handBuilding.ts';

import { resultChunks } from './resultChunks.ts';
import { runBuilding } from './runBuilding.ts';

const outcome = runBuilding(
  building({
    levels: [level('Roof', 10), level('L2', 10)],
    walls: [
      wall('A', [0, 0, 20, 0], 10, ['L2', 'Roof']),
      wall('B', [0, 30, 20, 30], 10, ['L2', 'Roof']),
      wall('C', [0, 0, 0, 30], 10, ['L2', 'Roof']),
    ],
    forces: [force('Roof', 'W', 'wind', 10, 5)],
  }),
);
if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));

it('joined pieces are the document', () => {
  expect(JSON.parse([...resultChunks(outcome.document)].join(''))).toEqual(
    JSON.parse(JSON.stringify(outcome.document)),
  );
});

it('every action of every wall takes the place of those that govern', () => {
  const all: unknown = JSON.parse([...resultChunks(outcome.document, outcome.allActions())].join(''));
  // default combinations with one wind case: 7 + 7 x 2 + 2 expansions, 3 walls, 2 stories, 1 basis
  expect(all).toHaveProperty('actions.length', (7 + 14 + 2) * 3 * 2);
});
