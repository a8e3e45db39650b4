import { describe, expect, it } from 'vitest';

import { defaultCombinations } from './defaultCombinations.ts';
import { parseCombination } from './parseCombination.ts';

const constants = { SDS: 0.6, rho: 1.3, Omega0: 2.5 };
const written = (loads: 'asce7-22' | 'asce7-16', liveFactor: number): string[] =>
  defaultCombinations(loads, liveFactor).flatMap(({ expression }) => {
    const reading = parseCombination(expression, constants);
    if (!reading.ok) throw new Error(reading.message);
    return reading.alternatives.map((alternative) => alternative.text);
  });

describe('defaultCombinations', () => {
  it('lists ASCE 7-22 with strength-level snow, SDS 0.6, rho 1.3 written out', () => {
    expect(written('asce7-22', 0.5)).toEqual([
      '1.4D',
      '1.2D + 1.6L + 0.5Lr',
      '1.2D + 1.6L + 0.3S',
      '1.2D + 1.6L + 0.5R',
      '1.2D + 1.6Lr + 0.5L',
      '1.2D + 1.6Lr + 0.5W',
      '1.2D + 1.0S + 0.5L',
      '1.2D + 1.0S + 0.5W',
      '1.2D + 1.6R + 0.5L',
      '1.2D + 1.6R + 0.5W',
      '1.2D + 1.0W + 0.5L + 0.5Lr',
      '1.2D + 1.0W + 0.5L + 0.3S',
      '1.2D + 1.0W + 0.5L + 0.5R',
      '0.9D + 1.0W',
      '1.32D + 1.3E + 0.5L + 0.15S',
      '0.78D + 1.3E',
    ]);
  });

  it('lists ASCE 7-16 with its snow factors', () => {
    const texts = written('asce7-16', 1);
    expect(texts).toHaveLength(16);
    expect(texts.slice(1, 4)).toEqual(['1.2D + 1.6L + 0.5Lr', '1.2D + 1.6L + 0.5S', '1.2D + 1.6L + 0.5R']);
    expect(texts).toContain('1.2D + 1.6S + 1.0L');
    expect(texts).toContain('1.32D + 1.3E + 1.0L + 0.2S');
  });

  it('names each by its standard and number', () => {
    expect(defaultCombinations('asce7-16', 1).map(({ name }) => name)).toEqual([
      'ASCE 7-16 2.3.1 (1)',
      'ASCE 7-16 2.3.1 (2)',
      'ASCE 7-16 2.3.1 (3)',
      'ASCE 7-16 2.3.1 (4)',
      'ASCE 7-16 2.3.1 (5)',
      'ASCE 7-16 2.3.6 (6)',
      'ASCE 7-16 2.3.6 (7)',
    ]);
  });
});
