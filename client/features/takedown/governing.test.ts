import { describe, expect, it } from 'vitest';

import type { ResultAction } from '#shared/contracts/result';

import { caseReactions } from './caseReactions.ts';
import { foundationRows } from './foundation.ts';
import { axialRange, governing } from './governing.ts';
import { sayDead } from './sayDead.ts';

const action = (
  combination: string,
  axial: number,
  moment: number,
  shear: number,
  basis: ResultAction['basis'] = 'rigid',
): ResultAction => ({ basis, level: 'L2', wall: 'A', combination, axial, moment, shear });

const actions = [
  action('1.2D+1.6L', 500, 10, 2),
  action('1.2D+E', 420, -900, 80),
  action('0.9D+E', 200, -900, 80),
  action('0.9D-E', 200, 850, -95, 'compatible'),
];

describe('what governs a story', () => {
  it('takes each effect from the combination where it is worst, sign kept, ties by list order', () => {
    const rows = governing({ actions }, 'A', 'L2', null);
    expect(rows.map((one) => [one.effect, one.value, one.action.combination])).toEqual([
      ['Pmax', 500, '1.2D+1.6L'],
      ['Pmin', 200, '0.9D+E'],
      ['moment', -900, '1.2D+E'],
      ['shear', -95, '0.9D-E'],
    ]);
  });

  it('keeps to one basis, and is empty where the wall does not stand', () => {
    expect(governing({ actions }, 'A', 'L2', 'rigid')[3]).toMatchObject({ value: 80 });
    expect(governing({ actions }, 'A', 'L9', null)).toEqual([]);
  });

  it('spans Pmin to Pmax', () => {
    expect(axialRange({ actions }, 'A', ['Roof', 'L2'])).toEqual([null, { least: 200, most: 500 }]);
  });
});

describe('reactions for the foundation', () => {
  it('gives the least edge load and says where an edge lifts', () => {
    // lw 20 ft: 200/20 - 6 x 900/400 = 10 - 13.5; |M|/P = 4.5 ft above 20/6 = 3.33
    const [row] = foundationRows({ actions }, [{ wall: 'A', level: 'L2', length: 20, atBase: true }]);
    expect(row?.edge?.value).toBeCloseTo(-3.5, 12);
    expect(row?.edge?.action.combination).toBe('0.9D+E');
    expect(row?.lifts).toBe(true);
  });

  it('leaves a long wall without uplift', () => {
    // lw 30 ft: 4.5 ft under 5 ft
    const [row] = foundationRows({ actions }, [{ wall: 'A', level: 'L2', length: 30, atBase: true }]);
    expect(row?.lifts).toBe(false);
    expect(row?.edge?.value).toBeCloseTo(200 / 30 - 6, 12);
  });

  it('lists cases by basis, with a gap where a basis lists no such variant', () => {
    const at = { wall: 'A', level: 'L2', shear: 7, moment: 70 };
    const lateral = [
      { ...at, basis: 'rigid', case: 'EY', variant: '0' },
      { ...at, basis: 'rigid', case: 'EY', variant: '+' },
      { ...at, basis: 'flexible', case: 'EY', variant: '0', shear: 9 },
    ] as const;
    expect(caseReactions({ lateral }, 'A', 'L2', ['rigid', 'flexible'])).toEqual([
      {
        case: 'EY',
        variant: '0',
        forces: [
          { shear: 7, moment: 70 },
          { shear: 9, moment: 70 },
        ],
      },
      { case: 'EY', variant: '+', forces: [{ shear: 7, moment: 70 }, null] },
    ]);
  });

  it('tells self-weight from what was typed', () => {
    const gravity = [
      { level: 'L2', wall: 'A', dead: 40 },
      { level: 'L3', wall: 'A', dead: 50 },
      { level: 'L3', wall: 'B', dead: 999 },
    ].map((row) => ({
      ...row,
      live: null,
      roof_live: null,
      snow: null,
      tributary_area: null,
      eccentricity: null,
      live_class: null,
    }));
    expect(sayDead(125.5, gravity, 'A', true, 'us')).toBe(
      'A: dead 125.5 kip at its foot, 90.0 of it typed, 35.5 self-weight, counted once.',
    );
    expect(sayDead(90, gravity, 'A', false, 'si')).toBe(
      'A: dead 90.0 kN at its foot, 90.0 of it typed; self-weight is off.',
    );
  });
});
