import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { UnitSystem } from '../engineering/input.ts';
import { barNumbers } from './barNumbers.ts';
import { parseCurtains, printCurtains } from './curtainCallout.ts';
import { parseEnds, printEnds } from './endsCallout.ts';
import { parseHorizontal, printHorizontal } from './horizontalCallout.ts';
import { parseTies, printTies } from './tiesCallout.ts';

const systems: UnitSystem[] = ['us', 'si'];
const barOf = (units: UnitSystem): fc.Arbitrary<number> => fc.constantFrom(...barNumbers[units]);
const spacingOf = (units: UnitSystem): fc.Arbitrary<number> =>
  units === 'us' ? fc.integer({ min: 4, max: 96 }).map((n) => n / 4) : fc.integer({ min: 25, max: 600 });

describe.each(systems)('round trips in %s', (units) => {
  it('distributed steel', () => {
    const curtains = fc.record({
      curtains: fc.constantFrom(1 as const, 2 as const),
      bar: barOf(units),
      spacing: spacingOf(units),
    });
    fc.assert(
      fc.property(curtains, (value) => {
        expect(parseCurtains(printCurtains(value, units), units)).toEqual({ ok: true, value });
      }),
    );
  });

  it('horizontal steel with its ends', () => {
    const horizontal = fc.record({
      curtains: fc.constantFrom(1 as const, 2 as const),
      bar: barOf(units),
      spacing: spacingOf(units),
      end: fc.constantFrom('hook' as const, 'u-bar' as const, 'in-core' as const),
    });
    fc.assert(
      fc.property(horizontal, (value) => {
        expect(parseHorizontal(printHorizontal(value, units), units)).toEqual({ ok: true, value });
      }),
    );
  });

  it('end bars', () => {
    const ends = fc.option(fc.record({ bar: barOf(units), count: fc.integer({ min: 2, max: 40 }).map((n) => n * 2) }));
    fc.assert(
      fc.property(ends, (value) => {
        expect(parseEnds(printEnds(value, units), units)).toEqual({ ok: true, value });
      }),
    );
  });

  it('ties', () => {
    const legs = fc.integer({ min: 2, max: 40 });
    const ties = fc.option(
      fc.record({ bar: barOf(units), spacing: spacingOf(units), legsAcross: legs, legsAlong: legs }),
    );
    fc.assert(
      fc.property(ties, (value) => {
        expect(parseTies(printTies(value, units), units)).toEqual({ ok: true, value });
      }),
    );
  });
});

it('prints the notation of the trade', () => {
  expect(printCurtains({ curtains: 2, bar: 5, spacing: 12 }, 'us')).toBe('#5@12 EF');
  expect(printCurtains({ curtains: 1, bar: 4, spacing: 12 }, 'us')).toBe('#4@12');
  expect(printCurtains({ curtains: 2, bar: 16, spacing: 200 }, 'si')).toBe('16@200 EF');
  expect(printHorizontal({ curtains: 2, bar: 4, spacing: 10, end: 'hook' }, 'us')).toBe('#4@10 EF');
  expect(printHorizontal({ curtains: 2, bar: 4, spacing: 10, end: 'u-bar' }, 'us')).toBe('#4@10 EF u-bar');
  expect(printHorizontal({ curtains: 1, bar: 13, spacing: 250, end: 'in-core' }, 'si')).toBe('13@250 in-core');
  expect(printEnds({ bar: 9, count: 8 }, 'us')).toBe('(8)#9');
  expect(printEnds({ bar: 25, count: 8 }, 'si')).toBe('8-25');
  expect(printEnds(null, 'us')).toBe('none');
  expect(printTies({ bar: 4, spacing: 3.5, legsAcross: 7, legsAlong: 2 }, 'us')).toBe('#4@3.5, 7 legs');
  expect(printTies({ bar: 13, spacing: 100, legsAcross: 7, legsAlong: 3 }, 'si')).toBe('13@100, 7 x 3 legs');
});

it.each(['#5@12 EF', '#5 @ 12" ef', 'no. 5 @ 12 o.c. E.F.', 'No 5 at 12 in oc each face', '5@12ef', '#5@12" o.c., EF'])(
  'reads %s as No. 5 at 12 in, two curtains',
  (text) => {
    expect(parseCurtains(text, 'us')).toEqual({ ok: true, value: { curtains: 2, bar: 5, spacing: 12 } });
  },
);

it.each([
  ['#4 @ 10" EF', 'hook'],
  ['#4@10 ef hooked', 'hook'],
  ['#4@10EF, U bars', 'u-bar'],
  ['no. 4 at 10 o.c. ef ubar', 'u-bar'],
  ['#4@10 EF in core', 'in-core'],
])('reads %s with %s ends', (text, end) => {
  expect(parseHorizontal(text, 'us')).toEqual({ ok: true, value: { curtains: 2, bar: 4, spacing: 10, end } });
});

it.each(['(8)#9', '8#9', '8-#9', '8 no. 9', '( 8 ) # 9', '8 x #9'])('reads %s as eight No. 9', (text) => {
  expect(parseEnds(text, 'us')).toEqual({ ok: true, value: { bar: 9, count: 8 } });
});

it.each(['#4@4, 7 legs', '#4 @ 4" 7 LEGS', 'no. 4 at 4 in o.c., 7', '4@4, 7 x 2 legs'])(
  'reads %s as 7 legs',
  (text) => {
    expect(parseTies(text, 'us')).toEqual({ ok: true, value: { bar: 4, spacing: 4, legsAcross: 7, legsAlong: 2 } });
  },
);

describe('says what was expected', () => {
  const expected = (answer: { ok: boolean; expected?: string }): string => answer.expected ?? '';
  it('where a text is no callout', () => {
    expect(expected(parseCurtains('#5 12', 'us'))).toBe('bar @ spacing in inches, as #5@12 EF');
    expect(expected(parseCurtains('', 'si'))).toBe('bar @ spacing in mm, as 16@200 EF');
    expect(expected(parseEnds('89', 'us'))).toBe('(number)size, as (8)#9, or none');
    expect(expected(parseTies('#4@4', 'us'))).toBe('size @ spacing, legs, as #4@4, 7 legs, or none');
  });
  it('where horizontal bars end in a way that nobody knows', () => {
    expect(expected(parseHorizontal('#4@10 EF bent', 'us'))).toBe(
      'bar @ spacing in inches, as #5@12 EF; hook, u-bar or in-core after it for the ends',
    );
    expect(expected(parseHorizontal('#4@90 u-bar', 'us'))).toBe('a spacing of 1 to 60 in');
  });
  it('where a bar is of the other system', () => {
    expect(expected(parseCurtains('#16@12 EF', 'us'))).toContain('#3, #4, #5');
    expect(expected(parseCurtains('5@200 EF', 'si'))).toContain('10, 13, 16');
    expect(expected(parseTies('12@100, 7 legs', 'si'))).toContain('10, 13, 16');
  });
  it('where bars cannot stand on two faces', () => {
    expect(expected(parseEnds('(7)#9', 'us'))).toContain('even number');
    expect(expected(parseEnds('(2)#9', 'us'))).toContain('from 4 to 80');
  });
  it('where a spacing or a number of legs makes no sense', () => {
    expect(expected(parseCurtains('#5@0.5 EF', 'us'))).toBe('a spacing of 1 to 60 in');
    expect(expected(parseTies('#4@4, 1 legs', 'us'))).toBe('2 to 40 legs each way');
  });
});
