import { describe, expect, it } from 'vitest';

import type { ResultCheck, ResultDrift } from '#shared/contracts/result';
import { formatDrift } from '#shared/format/drift';

import { sample } from '../../engine/testing/sampleBuilding.ts';
import { levelDrifts, torsionClass, totalWindDrift } from './levelDrifts.ts';
import { stackContent } from './stackQuantity.ts';

const drift = (variant: ResultDrift['variant'], y: number, torsionRatio: number | null): ResultDrift => ({
  case: 'EY',
  variant,
  level: 'L2',
  x: 0,
  y,
  edge: y * 1.5,
  torsionRatio,
  ax: torsionRatio === null ? null : 1,
  theta: 0.02,
});

const check = (name: string, demand: number, capacity: number): ResultCheck => ({
  basis: 'compatible',
  level: 'L2',
  wall: '',
  check: name,
  demand,
  capacity,
  unit: '',
  ratio: demand / capacity,
  clause: '',
  combination: 'EY at +e',
  ok: demand <= capacity,
});

const document = {
  ...sample.document,
  drifts: [drift('0', 0.001, null), drift('+', 0.0012, 1.31), drift('-', 0.0008, 1.15)],
  checks: [check('drift', 0.03, 0.02), check('drift-wind', 0.001, 0.0025), check('drift-wind-total', 0.0011, 0.0025)],
};
const down = sample.document.levels.filter((one) => one.level === 'L2');
const rows = levelDrifts(document, down, { case: 'EY', variant: '-' });

describe('drift of a level', () => {
  it('is of the variant in view, the torsion ratio of the worst', () => {
    expect(rows[0]).toMatchObject({
      y: 0.0008,
      torsionRatio: 1.31,
      seismic: { ratio: 1.5, ok: false },
      wind: { ok: true },
    });
    expect(rows[0]?.edge).toBeCloseTo(0.0012, 12);
    expect(totalWindDrift(document)?.ratio).toBeCloseTo(0.44, 12);
    expect(totalWindDrift({ checks: [] })).toBeNull();
  });

  it('is blank where nothing was made', () => {
    expect(levelDrifts({ drifts: [], checks: [] }, down, { case: 'EY', variant: '0' })[0]).toEqual({
      level: 'L2',
      x: null,
      y: null,
      edge: null,
      torsionRatio: null,
      ax: null,
      theta: null,
      seismic: null,
      wind: null,
    });
  });

  it('has its class above 1.2 and 1.4, not at them', () => {
    expect([1.2, 1.21, 1.4, 1.41].map(torsionClass)).toEqual(['regular', 'irregular', 'irregular', 'extreme']);
  });

  it('reads in percent of the height', () => {
    expect([formatDrift(0.0012345), formatDrift(-0.02)]).toEqual(['0.123 %', '−2.000 %']);
  });
});

describe('bars of the stack', () => {
  it('are drift over its limit, the worse of seismic and wind, hatched when over', () => {
    const content = stackContent(document, down, rows, 'drift', 'EY');
    expect(content.limit).toBe(1);
    expect(content.stories[0]).toMatchObject({ value: 1.5, text: '1.50', over: true });
  });

  it('are the torsion ratio with 1.2 as the dotted line', () => {
    expect(stackContent(document, down, rows, 'torsion', 'EY')).toMatchObject({
      caption: 'Torsion ratio EY',
      limit: 1.2,
      stories: [{ value: 1.31, text: '1.31' }],
    });
  });
});
