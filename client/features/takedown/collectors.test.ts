import { expect, it } from 'vitest';

import { levelsDown } from '../../components/drawing/resultChoice.ts';
import { threeBases } from '../../components/drawing/testing/threeBases.ts';
import { sampleTables } from '../../engine/testing/sampleBuilding.ts';
import { collectorRows } from './collectors.ts';

const names = ['P1', 'P2', 'Q1', 'Q2'];
const rows = collectorRows(threeBases, levelsDown(threeBases), names, sampleTables.walls, {
  basis: 'rigid',
  case: 'EY',
  variant: '0',
});

it('gives each of two equal walls half of every floor', () => {
  // 60, 45, 30 kip on Roof, L3, L2
  expect(rows.map((row) => row.level)).toEqual(['Roof', 'L3', 'L2']);
  [30, 22.5, 15].forEach((half, index) => {
    expect(rows[index]?.taken[0]).toBeCloseTo(half, 9);
    expect(rows[index]?.taken[1]).toBeCloseTo(half, 9);
    expect(rows[index]?.along).toBeCloseTo(2 * half, 9);
    expect(rows[index]?.force).toBe(2 * half);
  });
});

it('has nothing where a wall stands neither above nor below the floor, and no sum without a force', () => {
  const lateral = threeBases.lateral.filter((one) => one.wall !== 'Q2');
  const levels = threeBases.levels.map((level) => ({ ...level, force: {} }));
  const [roof] = collectorRows({ lateral, levels }, levelsDown({ ...threeBases, levels }), names, sampleTables.walls, {
    basis: 'rigid',
    case: 'EY',
    variant: '0',
  });
  expect(roof?.taken[3]).toBeNull();
  expect(roof?.along).toBeNull();
});
