import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { parseNumber } from './parseNumber.ts';

const valueOf = (text: string, ambiguous = false): number | null => {
  const reading = parseNumber(text, ambiguous);
  return reading.ok ? reading.value : null;
};
const remedyOf = (text: string, ambiguous = false): string => {
  const reading = parseNumber(text, ambiguous);
  return reading.ok ? '' : reading.remedy;
};

describe('parseNumber', () => {
  it.each([
    ['12', 12],
    ['-12.5', -12.5],
    ['+0.75', 0.75],
    ['.5', 0.5],
    ['4.', 4],
    ['1,250', 1250],
    ['-12,345,678.25', -12345678.25],
    ['1 250.5', 1250.5],
    ['12\u00a0345', 12345],
    ['1\u202f000\u202f000', 1000000],
    ['\u221212.5', -12.5],
    ['\u20133', -3],
    ['  7 ', 7],
    ['1e3', 1000],
    ['2.5E-2', 0.025],
    ['007', 7],
    ['-0', 0],
  ])('reads %j as %d', (text, value) => {
    expect(valueOf(text)).toBe(value);
  });

  it.each([
    '',
    '-',
    '.',
    'abc',
    'NaN',
    'Infinity',
    '-inf',
    '0x1F',
    '0b11',
    '1e',
    '1e999',
    '5e12',
    '12 5',
    '1 23',
    '1,23',
    '12,3456',
    '1,234 567',
    '1 234,567',
    '3,5',
    '0,500',
    '00,500',
    '-0,250',
    '1.234,5',
    '1,,234',
    ',500',
    '500,',
    '1.2.3',
    '12 ft',
    '11\'6"',
    '50%',
    '(24)',
    '$5',
    '1_000',
    '١٢',
    '--3',
    '+-3',
    '1e3.5',
    "'5",
  ])('refuses %j', (text) => {
    expect(valueOf(text)).toBeNull();
  });

  it('names the decimal comma with the number rewritten', () => {
    expect(remedyOf('3,5')).toContain('write 3.5');
    expect(remedyOf('0,500')).toContain('write 0.500');
    expect(remedyOf('1.234,5')).toContain('write 1234.5');
    expect(remedyOf('-,5')).toContain('write -0.5');
  });

  it('takes a lone comma for ambiguous only where asked, and only where it is the one mark', () => {
    expect(valueOf('3,500')).toBe(3500);
    expect(valueOf('3,500', true)).toBeNull();
    expect(valueOf('-3,500', true)).toBeNull();
    expect(remedyOf('3,500', true)).toContain('write 3500 or 3.500');
    expect(valueOf('3,500.0', true)).toBe(3500);
    expect(valueOf('3,500,000', true)).toBe(3500000);
    expect(remedyOf('0,500', true)).toContain('decimal comma');
  });

  it('says what to write instead', () => {
    expect(remedyOf('50%')).toContain('fraction');
    expect(remedyOf('(24)')).toContain('minus');
    expect(remedyOf('12 ft')).toContain('header');
    expect(remedyOf('NaN')).toContain('finite');
  });

  it('gives back every number that JavaScript prints, within the limit', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e12, max: 1e12, noNaN: true }), (value) => {
        expect(valueOf(String(value))).toBe(value === 0 ? 0 : value);
      }),
    );
  });

  it('reads whole numbers the same with and without groups', () => {
    fc.assert(
      fc.property(fc.integer({ min: -999_999_999, max: 999_999_999 }), (value) => {
        const grouped = value.toLocaleString('en-US');
        expect(valueOf(grouped)).toBe(value === 0 ? 0 : value);
        expect(valueOf(grouped.replaceAll(',', ' '))).toBe(value === 0 ? 0 : value);
      }),
    );
  });

  it('never throws and never gives a number that is not finite', () => {
    fc.assert(
      fc.property(fc.string(), fc.boolean(), (text, ambiguous) => {
        const reading = parseNumber(text, ambiguous);
        expect(reading.ok ? Number.isFinite(reading.value) : reading.remedy.length > 0).toBe(true);
      }),
    );
  });
});
