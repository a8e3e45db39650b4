import fc from 'fast-check';
import { expect, it } from 'vitest';

import { parseLevelRange, printLevelRange, sayBandLimits } from './levelRange.ts';

it('prints a band from its lowest to its highest story', () => {
  expect(printLevelRange('L4', 'L5')).toBe('L4 – L5');
  expect(printLevelRange('Roof', 'Roof')).toBe('Roof');
});

it('says the limits of a band in words', () => {
  expect(sayBandLimits('L3', 'L5')).toBe('top of L3 to L5');
  expect(sayBandLimits(null, 'L3')).toBe('base to L3');
});

it('reads back what it prints', () => {
  const name = fc.stringMatching(/^[A-Z][a-z0-9]{0,6}$/);
  fc.assert(
    fc.property(name, name, (from, to) => {
      expect(parseLevelRange(printLevelRange(from, to))).toEqual({ from, to });
    }),
  );
  expect(parseLevelRange('L2 to L4')).toEqual({ from: 'L2', to: 'L4' });
  expect(parseLevelRange('L2 – L3 – L4')).toBeNull();
});
