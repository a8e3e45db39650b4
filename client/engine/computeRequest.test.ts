import { expect, it } from 'vitest';

import { buildingInput } from './buildingInput.ts';
import { comparedParts, differingParts } from './comparedParts.ts';
import { computeRequest } from './computeRequest.ts';
import { pinnedBands, pinnedWith } from './pinnedBands.ts';
import { sample, sampleInput, sampleResource, sampleTable } from './testing/sampleBuilding.ts';

const loaded = () => ({
  levels: sampleTable('levels'),
  walls: sampleTable('walls'),
  forces: sampleTable('forces'),
  gravity: sampleTable('gravity'),
  combinations: sampleTable('combinations'),
  overrides: sampleTable('overrides'),
});

it('puts together what the server sent to the input that it came from', () => {
  // TableResource rows of the sample are plain, so the cast of types is the only difference
  const input = buildingInput(sampleResource, loaded() as Parameters<typeof buildingInput>[1]);
  expect(input.tables).toEqual(sampleInput.tables);
  expect({ ...input.settings, given: sampleInput.settings.given }).toEqual(sampleInput.settings);
});

it('computes the same bits from what was sent', () => {
  const input = buildingInput(sampleResource, loaded() as Parameters<typeof buildingInput>[1]);
  const outcome = computeRequest({ input, options: { pinned: [] } });
  if (outcome.kind !== 'computed') throw new Error(outcome.kind);
  expect(differingParts(outcome.document, sample.document)).toEqual([]);
});

it('sees a difference in the last bit', () => {
  const first = sample.document.lateral.find((one) => one.shear > 1);
  if (!first) throw new Error('the sample has no shear');
  const moved = sample.document.lateral.map((one) =>
    one === first ? { ...one, shear: one.shear * (1 + Number.EPSILON) } : one,
  );
  expect(differingParts({ ...sample.document, lateral: moved }, sample.document)).toEqual(['lateral']);
  expect(comparedParts).toContain('lateral');
});

it('re-checks a row with the cells typed over it', () => {
  const row = sample.rows[1];
  if (!row) throw new Error('the sample has no second row');
  const pinned = pinnedWith(sample.rows, row.id, { horizontal: { ...row.horizontal, bar: 5, spacing: 10 } });
  expect(pinned).toEqual([
    {
      wall: 'P1',
      fromLevel: 'L2',
      toLevel: 'L3',
      own: { horizontal: { curtains: 2, bar: 5, spacing: 10, end: 'hook' } },
    },
  ]);
  const outcome = computeRequest({ input: sampleInput, options: { pinned } });
  if (outcome.kind !== 'computed') throw new Error(outcome.kind);
  const after = outcome.document.schedule.find((one) => one.wall === 'P1' && one.to === 'L3');
  expect(after?.horizontal).toMatchObject({ bar: 5, spacing: 10 });
});

it('sends the overwritten cells of every row, and those only', () => {
  const rows = sample.rows.map((row, index) => (index === 2 ? { ...row, overwritten: ['vertical'] as const } : row));
  expect(pinnedBands(rows)).toEqual([
    { wall: 'P2', fromLevel: 'Roof', toLevel: 'Roof', own: { vertical: { curtains: 2, bar: 4, spacing: 18 } } },
  ]);
});

it('names the problems of a building that does not compute', () => {
  const tables = { ...sampleInput.tables, walls: sampleInput.tables.walls.slice(0, 1) };
  const outcome = computeRequest({ input: { ...sampleInput, tables }, options: { pinned: [] } });
  expect(outcome.kind).toBe('refused');
});
