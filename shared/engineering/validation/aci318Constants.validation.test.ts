/**
 * Constants and small formulas of ACI 318-19, from memory where nothing else is said: alpha_c of 11.5.4.3 as quoted in an adopted-code viewer
 * (text seen), phi ends of Table 21.2.2, shear friction in SI after a public note on 22.9.4 (text seen).
 */
import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';
import { jointStrength } from '../wall-design/jointStrength.ts';
import { stateAt } from '../wall-design/flexuralStrength.ts';
import { sectionCurve } from '../wall-design/sectionCurve.ts';

describe('alpha_c', () => {
  it.each([
    [1, 3],
    [1.5, 3],
    [1.75, 2.5],
    [2, 2],
    [3, 2],
  ])('hw/lw %f: %f', (ratio, alpha) => {
    expect(aci31819.shear.concreteFactor(ratio, 0, 1000)).toBeCloseTo(alpha, 12);
  });
  it('falls in net tension and stays at 0: 1,000 in2, -250 kip halves it, -600 kip ends it', () => {
    expect(aci31819.shear.concreteFactor(1, -250, 1000)).toBeCloseTo(1, 12);
    expect(aci31819.shear.concreteFactor(1, -600, 1000)).toBe(0);
  });
});

describe('phi by strain', () => {
  const layers = [{ positionIn: 90, areaIn2: 1, compression: true }];
  const curve = sectionCurve({ lengthIn: 100, thicknessIn: 10, fcPsi: 4000, fyKsi: 58, layers }, aci31819);
  const phi = (strain: number): number => stateAt(curve, (90 * 0.003) / (0.003 + strain)).phi;
  it('0.65 up to yield (58 ksi: 0.0020), 0.90 from 0.0050, the middle 0.775 at 0.0035', () => {
    expect(phi(0.001)).toBeCloseTo(0.65, 12);
    expect(phi(0.002)).toBeCloseTo(0.65, 9);
    expect(phi(0.0035)).toBeCloseTo(0.775, 9);
    expect(phi(0.005)).toBeCloseTo(0.9, 9);
    expect(phi(0.02)).toBe(0.9);
  });
});

describe('beta1', () => {
  it.each([
    [2500, 0.85],
    [4000, 0.85],
    [5000, 0.8],
    [8000, 0.65],
    [12000, 0.65],
  ])('f`c %i: %f', (fcPsi, beta1) => {
    expect(aci31819.blockDepthFactor(fcPsi)).toBeCloseTo(beta1, 12);
  });
});

describe('shear friction, 250 mm wall, f`c 40 MPa, not roughened, 2,093.3 mm2/m', () => {
  const mpa = 1 / 6.894757293168361;
  const kn = 1 / 4.4482216152605;
  const joint = {
    surface: 'plain' as const,
    lambda: 1,
    fcPsi: 40 * mpa * 1000,
    fyKsi: 420 * mpa,
    areaIn2: (1000 * 250) / 645.16,
  };
  const of = (fyFrictionKsi: number): ReturnType<typeof jointStrength> =>
    jointStrength(joint, 2093.3 / 645.16, 0, 0, { ...aci31819, caps: { ...aci31819.caps, fyFrictionKsi } });
  it('phi Vn 395.6 kN/m with fy 420 MPa (0.1 %)', () => {
    expect(Math.abs(of(420 * mpa).phiVnKip / kn - 395.6)).toBeLessThanOrEqual(0.4);
  });
  it('limit 1,031 kN/m (0.4 %: 5.5 MPa of the note stands for 800 psi)', () => {
    expect(Math.abs((0.75 * of(60).limitKip) / kn - 1031)).toBeLessThanOrEqual(0.004 * 1031);
  });
});
