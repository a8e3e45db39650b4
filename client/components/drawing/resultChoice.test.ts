import { expect, it } from 'vitest';

import { sample } from '../../engine/testing/sampleBuilding.ts';
import { levelsDown, resultChoice, sayVariant } from './resultChoice.ts';

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
