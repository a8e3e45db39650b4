import { describe, expect, it } from 'vitest';

import type { BuildingInput } from '#shared/engineering/input';
import { runBuilding } from '#shared/result/runBuilding';

import { sampleInput } from '../../engine/testing/sampleBuilding.ts';
import { holdsRow, reasonsOf, weighWarnings } from './heldRows.ts';

/** The sample with Q2 standing on L3 alone and an opening in P2: one transfer, one wall taken as solid. */
const held: BuildingInput = {
  ...sampleInput,
  tables: {
    ...sampleInput.tables,
    walls: sampleInput.tables.walls.map((wall) => ({
      ...wall,
      from_level: wall.wall === 'Q2' ? 'L3' : wall.from_level,
      opening: wall.wall === 'P2' ? 0.1 : null,
    })),
    gravity: sampleInput.tables.gravity.filter((row) => row.wall !== 'Q2' || row.level !== 'L2'),
  },
};

function compute(input: BuildingInput) {
  const outcome = runBuilding(input);
  if (!outcome.ok) throw new Error(outcome.problems.map((problem) => problem.message).join('; '));
  return outcome.document;
}

describe('rows that wait for a decision', () => {
  it.each([
    ['a transfer and an opening', held],
    ['high seismicity', { ...sampleInput, settings: { ...sampleInput.settings, sdc: 'D' as const } }],
    ['nothing to hold them', sampleInput],
  ])('have a reason exactly where the engine says not settled: %s', (_name, input) => {
    const document = compute(input);
    for (const row of document.schedule) {
      if (row.state === 'over') continue;
      expect([row.wall, row.from, reasonsOf(row, document).length > 0]).toEqual([
        row.wall,
        row.from,
        row.state === 'not settled',
      ]);
    }
  });

  it('are below the floor that a transfer arrives on, in every wall', () => {
    const { levels } = compute(held);
    const holds = { walls: null, from: 'L2', to: 'L2' };
    const warning = { code: 'transfer-not-assigned', level: 'L2', wall: 'Q2', message: 'arrives', holds };
    expect(holdsRow(warning, { wall: 'P1', from: 'L2', to: 'L3' }, levels)).toBe(true);
    expect(holdsRow(warning, { wall: 'P1', from: 'L3', to: 'Roof' }, levels)).toBe(false);
  });

  it('name what was not designed first', () => {
    const { levels } = compute(sampleInput);
    const holds = { walls: null, from: 'L2', to: 'Roof' };
    const document = { warnings: [{ code: 'ordinary-class', message: 'Category D.', holds }], levels };
    expect(reasonsOf({ wall: 'A', from: 'L2', to: 'L2', notDesigned: ['slenderness'] }, document)).toEqual([
      'Not designed: slenderness.',
      'Category D.',
    ]);
  });
});

it('puts warnings that hold rows before the others, with their number', () => {
  const document = compute(held);
  const weighed = weighWarnings(document);
  const holding = weighed.filter((one) => one.holds > 0).map((one) => one.warning.code);
  expect(new Set(holding)).toEqual(new Set(['transfer-not-assigned', 'opening-solid']));
  expect(weighed.slice(0, holding.length).every((one) => one.holds > 0)).toBe(true);
  // all but drift, which has its own note
  expect(weighed).toHaveLength(document.warnings.length - 1);
  const solid = weighed.find((one) => one.warning.code === 'opening-solid');
  expect(solid?.holds).toBe(document.schedule.filter((row) => row.wall === 'P2').length);
});
