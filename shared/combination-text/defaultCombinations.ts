import { printFactor } from './printFactors.ts';

export interface NamedCombination {
  readonly name: string;
  readonly expression: string;
}

/**
 * Strength combinations of ASCE 7 2.3.1 (1 to 5) and 2.3.6 (6, 7), from memory, in the order of the standard. `liveFactor`
 * stands for the f of engineering.md section 5: 1.0, or 0.5 where the exception of 2.3.1 holds. ASCE 7-22 uses strength-level
 * snow (0.3S, 1.0S, 0.15S), ASCE 7-16 the service-level snow of that edition (0.5S, 1.6S, 0.2S).
 */
export function defaultCombinations(loads: 'asce7-22' | 'asce7-16', liveFactor: number): readonly NamedCombination[] {
  const live = `${printFactor(liveFactor)}L`;
  const lower = loads === 'asce7-22' ? '(0.5Lr or 0.3S or 0.5R)' : '0.5(Lr or S or R)';
  const upper = loads === 'asce7-22' ? '(1.6Lr or 1.0S or 1.6R)' : '1.6(Lr or S or R)';
  const seismicSnow = loads === 'asce7-22' ? '0.15S' : '0.2S';
  const standard = loads === 'asce7-22' ? 'ASCE 7-22' : 'ASCE 7-16';
  return [
    { name: `${standard} 2.3.1 (1)`, expression: '1.4D' },
    { name: `${standard} 2.3.1 (2)`, expression: `1.2D + 1.6L + ${lower}` },
    { name: `${standard} 2.3.1 (3)`, expression: `1.2D + ${upper} + (${live} or 0.5W)` },
    { name: `${standard} 2.3.1 (4)`, expression: `1.2D + 1.0W + ${live} + ${lower}` },
    { name: `${standard} 2.3.1 (5)`, expression: '0.9D + 1.0W' },
    { name: `${standard} 2.3.6 (6)`, expression: `(1.2 + 0.2SDS)D + rho E + ${live} + ${seismicSnow}` },
    { name: `${standard} 2.3.6 (7)`, expression: '(0.9 - 0.2SDS)D + rho E' },
  ];
}
