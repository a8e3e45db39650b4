import { describe, expect, it } from 'vitest';

import { sample } from '../../engine/testing/sampleBuilding.ts';
import { leadingWall, levelsDown, resultChoice, sayVariant } from './resultChoice.ts';

const nothing = { level: null, case: null, variant: '0' } as const;

it('takes the first case as built in the lowest story unless the address says otherwise', () => {
  expect(resultChoice(sample.document, nothing)).toMatchObject({
    basis: 'rigid',
    case: 'EX',
    variant: '0',
    level: { level: 'L2' },
    cases: ['EX', 'EY'],
    variants: ['0', '+', '-'],
  });
  expect(resultChoice(sample.document, { level: 'L3', case: 'EY', variant: '-' })).toMatchObject({
    case: 'EY',
    variant: '-',
    level: { level: 'L3' },
  });
});

it('falls back where the address names what is not there', () => {
  expect(resultChoice(sample.document, { level: 'L99', case: 'WX', variant: '+' })).toMatchObject({
    case: 'EX',
    level: { level: 'L2' },
  });
});

it('has nothing to show where nothing was distributed', () => {
  expect(resultChoice({ ...sample.document, distribution: [] }, nothing)).toBeNull();
});

it('puts the roof first', () => {
  expect(levelsDown(sample.document).map((level) => level.level)).toEqual(['Roof', 'L3', 'L2']);
});

it('says variants by the eccentricity', () => {
  expect([sayVariant('0', 0.05), sayVariant('+', 0.05), sayVariant('-', 0.075)]).toEqual([
    'e as built',
    '+5 %',
    '−7.5 %',
  ]);
});

describe('leadingWall', () => {
  const share = (caseName: string, variant: '0' | '+', level: string, wall: string, total: number) =>
    ({ basis: 'rigid', case: caseName, variant, level, wall, total }) as const;
  const document = {
    ...sample.document,
    distribution: [
      share('EX', '0', 'L2', 'A', 10),
      share('EX', '0', 'L2', 'B', -40),
      share('EX', '0', 'L3', 'A', 30),
      share('EX', '+', 'L2', 'A', 90),
      share('EY', '0', 'L2', 'C', 99),
    ],
  };
  const of = (name: string) => leadingWall(document, { basis: 'rigid', case: name, variants: ['0', '+'] });

  it('is the wall with the largest force of the case as built, whatever its sign', () => {
    expect(of('EX')).toBe('B');
    expect(of('EY')).toBe('C');
    expect(of('WX')).toBeNull();
  });
});
