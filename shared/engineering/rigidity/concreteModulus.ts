import { psiPerKsi } from '../units.ts';

/**
 * Modulus of elasticity of concrete in ksi: Ec = 57,000 sqrt(f'c) (ACI 318-19 19.2.2.1 b, normal weight), or
 * 33 w^1.5 sqrt(f'c) (19.2.2.1 a) where a unit weight in pcf is given. f'c in psi.
 */
export function concreteModulusKsi(fcPsi: number, unitWeightPcf: number | null): number {
  const root = Math.sqrt(fcPsi);
  const psi = unitWeightPcf === null ? 57000 * root : 33 * unitWeightPcf * Math.sqrt(unitWeightPcf) * root;
  return psi / psiPerKsi;
}
