import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { parseCombination } from './parseCombination.ts';
import type { LoadFactors } from './symbols.ts';
import { loadSymbols } from './symbols.ts';

const constants = { SDS: 0.5, rho: 1.3, Omega0: 2.5 };
const zero = { D: 0, L: 0, Lr: 0, S: 0, R: 0, W: 0, E: 0, H: 0, F: 0, T: 0 };

const factorsOf = (text: string): LoadFactors[] => {
  const reading = parseCombination(text, constants);
  if (!reading.ok) throw new Error(`${text}: ${reading.message} at ${String(reading.position)}`);
  return reading.alternatives.map((alternative) => alternative.factors);
};
const textsOf = (text: string): string[] => {
  const reading = parseCombination(text, constants);
  if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
  return reading.alternatives.map((alternative) => alternative.text);
};

describe('parseCombination reads', () => {
  it.each([
    ['1.2D+1E+2L', { D: 1.2, E: 1, L: 2 }],
    ['1.0E+0.5L', { E: 1, L: 0.5 }],
    ['0.9D-1.0E-1H', { D: 0.9, E: -1, H: -1 }],
    ['rhoE', { E: 1.3 }],
    ['0.2SDSD', { D: 0.1 }],
    ['(1.2 + 0.2SDS)D + rho E + L', { D: 1.3, E: 1.3, L: 1 }],
    ['Omega0E', { E: 2.5 }],
    ['E/0.4', { E: 2.5 }],
    ['(D + L)/4 - -S', { D: 0.25, L: 0.25, S: 1 }],
    ['1/2D', { D: 0.5 }],
    ['2(3(D - L))', { D: 6, L: -6 }],
    ['D + D + 0.5 D', { D: 2.5 }],
    ['.5Lr+1.R', { Lr: 0.5, R: 1 }],
    ['1.2D + 1.2F + 1.2T', { D: 1.2, F: 1.2, T: 1.2 }],
  ])('%s', (text, expected) => {
    const [factors] = factorsOf(text);
    for (const symbol of loadSymbols) {
      expect(factors?.[symbol]).toBeCloseTo({ ...zero, ...expected }[symbol], 12);
    }
  });

  it('gives alternatives in the order written', () => {
    expect(textsOf('1.2D + 1.0W + L + 0.5(Lr or S or R)')).toEqual([
      '1.2D + 1.0W + 1.0L + 0.5Lr',
      '1.2D + 1.0W + 1.0L + 0.5S',
      '1.2D + 1.0W + 1.0L + 0.5R',
    ]);
  });

  it('multiplies groups out, the first varying slowest', () => {
    expect(textsOf('1.2D + (1.6Lr or 1.0S) + (0.5L or 0.5W)')).toEqual([
      '1.2D + 1.6Lr + 0.5L',
      '1.2D + 1.6Lr + 0.5W',
      '1.2D + 1.0S + 0.5L',
      '1.2D + 1.0S + 0.5W',
    ]);
  });

  it('opens groups in groups and an or outside parentheses', () => {
    expect(textsOf('D + (L or (S or 2R))')).toEqual(['1.0D + 1.0L', '1.0D + 1.0S', '1.0D + 2.0R']);
    expect(textsOf('1.4D or 0.9D - W')).toEqual(['1.4D', '0.9D - 1.0W']);
  });

  it('takes W in one alternative and E in another', () => {
    expect(textsOf('0.9D + (W or E)')).toEqual(['0.9D + 1.0W', '0.9D + 1.0E']);
  });

  it('writes factors with one decimal at least and four at most, and leaves out what is zero', () => {
    expect(textsOf('D/3 + 1.25L - 0S')).toEqual(['0.3333D + 1.25L']);
    expect(textsOf('-0.5D')).toEqual(['-0.5D']);
    expect(textsOf('0D')).toEqual(['0.0D']);
  });

  it('keeps constants apart in the cache', () => {
    expect(factorsOf('rho E')[0]?.E).toBe(1.3);
    const other = parseCombination('rho E', { ...constants, rho: 1 });
    expect(other.ok && other.alternatives[0]?.factors.E).toBe(1);
  });
});

describe('parseCombination refuses with the place', () => {
  it.each([
    ['', 0, 0, 'empty'],
    ['   ', 0, 0, 'empty'],
    ['1.2D * L', 7, 1, 'product of two loads'],
    ['DL', 1, 1, 'product of two loads'],
    ['2/D', 2, 1, 'division by a load'],
    ['D/(2 - 2)', 3, 5, 'division by zero'],
    ['1.2D + 3', 7, 1, 'number without a load'],
    ['1.2D + (1 + 2SDS)', 8, 8, 'number without a load'],
    ['1.2', 0, 3, 'at least one load'],
    ['1.2D + 1.0X', 10, 1, 'read "X"'],
    ['1.2d', 3, 1, 'case-sensitive, expected D'],
    ['D + lr', 4, 2, 'case-sensitive, expected Lr'],
    ['D OR L', 2, 2, 'case-sensitive, expected or'],
    ['D^2', 1, 1, 'exponents'],
    ['1,2D', 0, 3, 'decimal point'],
    ['1.2.3D', 0, 5, 'one decimal point'],
    ['0x1FD', 1, 5 - 1, 'read "x1FD"'],
    ['# D', 0, 1, 'read "#"'],
    ["D'", 1, 1, `read "'"`],
    ['D; L', 1, 1, 'read ";"'],
    ['1.2D + ', 5, 1, 'ends after "+"'],
    ['1.2D + * L', 7, 1, 'expected a load'],
    ['* D', 0, 1, 'at the start'],
    ['(D + L', 0, 1, 'not closed'],
    ['D + L)', 5, 1, 'closes nothing'],
    ['D + ()', 5, 1, 'read ")"'],
    ['D + (or S)', 5, 2, 'read "or"'],
    ['1.2D 1.6L', 5, 3, 'expected + - * or /'],
    ['D2', 1, 1, 'expected + - * or /'],
    ['1.2D + W + E', 11, 1, 'W and E'],
    ['0.5E + D + 0W', 12, 1, 'W and E'],
    ['D \u2212 L', 2, 1, 'write the minus sign as -'],
    ['D + NaN', 4, 3, 'read "NaN"'],
    ['sin(D)', 0, 3, 'read "sin"'],
    ['D = L', 2, 1, 'read "="'],
  ])('%s', (text, position, length, message) => {
    const reading = parseCombination(text, constants);
    expect(reading).toMatchObject({ ok: false, position, length });
    expect(reading.ok ? '' : reading.message).toContain(message);
  });

  it('holds bounds on length, nesting and alternatives', () => {
    expect(parseCombination('D+'.repeat(600), constants)).toMatchObject({ ok: false, position: 1000 });
    expect(parseCombination('('.repeat(60) + 'D' + ')'.repeat(60), constants)).toMatchObject({
      ok: false,
      position: 40,
    });
    expect(parseCombination('9'.repeat(400) + 'D', constants)).toMatchObject({ ok: false, position: 0, length: 400 });
    const groups = Array.from({ length: 9 }, () => '(L or S)').join(' + ');
    expect(parseCombination(groups, constants)).toMatchObject({ ok: false, position: 8 * 11 });
  });
});

describe('properties', () => {
  const piece = fc.constantFrom(
    ...['D', 'L', 'Lr', 'S', 'W', 'E', 'SDS', 'rho', 'Omega0', ' or ', '+', '-', '*', '/', '(', ')', '1.2', '0', '.5'],
    ...['E5', '1e3', ' ', 'x', ',', '^', '\n', '[', '"'],
  );

  it('never throws, and a place lies inside the text', () => {
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: 'binary' }),
          fc.array(piece).map((list) => list.join('')),
        ),
        (text) => {
          const reading = parseCombination(text, constants);
          if (reading.ok) {
            expect(reading.alternatives.length).toBeGreaterThan(0);
            for (const { factors } of reading.alternatives) {
              for (const symbol of loadSymbols) expect(Number.isFinite(factors[symbol])).toBe(true);
            }
          } else {
            expect(reading.position).toBeGreaterThanOrEqual(0);
            expect(reading.position + reading.length).toBeLessThanOrEqual(text.length);
            expect(reading.message.length).toBeGreaterThan(10);
          }
        },
      ),
      { numRuns: 2000 },
    );
  });

  const factor = fc.integer({ min: 0, max: 3000 }).map((thousandths) => thousandths / 1000);
  const term = fc.tuple(factor, fc.constantFrom('D', 'L', 'Lr', 'S', 'R', 'E', 'H', 'F', 'T'));
  const sum = fc
    .array(term, { minLength: 1, maxLength: 6 })
    .map((terms) => terms.map(([value, symbol]) => `${String(value)}${symbol}`).join(' + '));

  it('is linear: factors of a scaled sum are the scaled sum of factors', () => {
    fc.assert(
      fc.property(sum, sum, factor, (first, second, by) => {
        const [whole] = factorsOf(`${String(by)}(${first}) - (${second})`);
        const [a] = factorsOf(first);
        const [b] = factorsOf(second);
        for (const symbol of loadSymbols) {
          expect(whole?.[symbol]).toBeCloseTo(by * (a?.[symbol] ?? NaN) - (b?.[symbol] ?? NaN), 9);
        }
      }),
    );
  });

  it('reads back its own text', () => {
    fc.assert(
      fc.property(sum, (text) => {
        const [printed] = textsOf(text);
        const [again] = factorsOf(printed ?? '');
        const [factors] = factorsOf(text);
        for (const symbol of loadSymbols) expect(again?.[symbol]).toBeCloseTo(factors?.[symbol] ?? NaN, 4);
      }),
    );
  });
});
