import { describe, expect, it } from 'vitest';

import { sectionCurve } from '../wall-design/sectionCurve.ts';
import { concreteShear, lowShearLimit, shearStrength } from '../wall-design/shearStrength.ts';

import { aci31819 } from './aci31819.ts';

/** Tables of ACI 318-19 worked by hand at values on both sides of every change of rule. Constants of the standard, from memory. */
describe('caps on fy (20.2.2.4, 22.4.2.1)', () => {
  const curveAt = (fyKsi: number) =>
    sectionCurve(
      {
        lengthIn: 100,
        thicknessIn: 10,
        fcPsi: 5000,
        fyKsi,
        layers: [
          { positionIn: 5, areaIn2: 3, compression: true },
          { positionIn: 95, areaIn2: 3, compression: true },
        ],
      },
      aci31819,
    );
  it('flexure counts 100 ksi in full and not more: tension limit 0.90 x 6 x 100 = 540 kip', () => {
    expect(curveAt(100).phiTensionKip).toBeCloseTo(-540, 9);
    expect(curveAt(110).phiTensionKip).toBeCloseTo(-540, 9);
    expect(curveAt(75).phiTensionKip).toBeCloseTo(-405, 9);
  });
  it('Po counts at most 80 ksi: 0.65 x 0.80 x (0.85 x 5 x 994 + 80 x 6) = 2,446.34 kip', () => {
    expect(curveAt(80).phiAxialCapKip).toBeCloseTo(0.52 * (4224.5 + 480), 9);
    expect(curveAt(100).phiAxialCapKip).toBeCloseTo(0.52 * (4224.5 + 480), 9);
    expect(curveAt(60).phiAxialCapKip).toBeCloseTo(0.52 * (4224.5 + 360), 9);
  });
});

describe('lightweight concrete, lambda 0.75: Acv 2,400 in2, sqrt(f`c) 70 psi', () => {
  const wall = { lengthIn: 200, thicknessIn: 12, fcPsi: 4900, fytKsi: 60, lambda: 0.75, wallHeightIn: 600 };
  it('Vc is three quarters of 336 kip, the low-shear limit with it; the upper limit of 11.5.4.2 has no lambda', () => {
    expect(concreteShear(wall, 0, aci31819)).toBeCloseTo(252, 9);
    expect(lowShearLimit(wall, 0, aci31819)).toBeCloseTo(0.375 * 252, 9);
    expect(shearStrength(wall, 0, 0, aci31819).limitKip).toBeCloseTo(1344, 9);
  });
});

describe('shear friction (22.9.4.2, 22.9.4.4)', () => {
  const { coefficient, limitKsi } = aci31819.friction;
  it('mu 1.0 lambda roughened, 0.6 lambda otherwise', () => {
    expect(coefficient('roughened', 1)).toBe(1);
    expect(coefficient('plain', 1)).toBe(0.6);
    expect(coefficient('roughened', 0.75)).toBeCloseTo(0.75, 12);
    expect(coefficient('plain', 0.75)).toBeCloseTo(0.45, 12);
  });
  // roughened: 0.2 f'c up to 4,000 psi, 480 + 0.08 f'c up to 14,000, then 1,600; otherwise 0.2 f'c up to 4,000, then 800
  it.each([
    ['roughened', 3000, 600],
    ['roughened', 4000, 800],
    ['roughened', 5000, 880],
    ['roughened', 10000, 1280],
    ['roughened', 15000, 1600],
    ['plain', 3000, 600],
    ['plain', 5000, 800],
    ['plain', 10000, 800],
  ] as const)('%s, f`c %d psi: %d psi', (surface, fcPsi, limit) => {
    expect(limitKsi(surface, 1, fcPsi) * 1000).toBeCloseTo(limit, 9);
  });
  it('lightweight concrete takes the lower limit even where roughened', () => {
    expect(limitKsi('roughened', 0.75, 10000)).toBeCloseTo(0.8, 12);
  });
});

describe('factors of development (25.4.2.5, 25.4.3.1)', () => {
  const { gradeFactor, sizeFactor, hookIn } = aci31819.development;
  it('psi_g 1.0 at Grade 60, 1.15 at 80, 1.3 at 100; soft-metric 420, 550, 690 MPa with them', () => {
    expect([40, 60, 80, 100].map(gradeFactor)).toEqual([1, 1, 1.15, 1.3]);
    expect([420, 550, 690].map((mpa) => gradeFactor(mpa / 6.894757293168361))).toEqual([1, 1.15, 1.3]);
  });
  it('psi_s 0.8 up to No. 6 and No. 19, 1.0 from No. 7 and No. 22', () => {
    expect([0.375, 0.75, 19.1 / 25.4, 0.875, 22.2 / 25.4, 1.41].map(sizeFactor)).toEqual([0.8, 0.8, 0.8, 1, 1, 1]);
  });
  it('hook of No. 8, f`c 10,000 psi: 60,000 x 1.25/(55 x 100) = 13.64 in; f`c 3,600: x (0.24 + 0.6)/(55 x 60)', () => {
    expect(hookIn(1, 60, 10000, 1)).toBeCloseTo(75000 / 5500, 9);
    expect(hookIn(1, 60, 3600, 1)).toBeCloseTo((75000 * 0.84) / 3300, 9);
    expect(hookIn(1, 60, 3600, 0.75)).toBeCloseTo((75000 * 0.84) / 3300 / 0.75, 9);
    expect(hookIn(0.64, 60, 10000, 1)).toBeCloseTo((75000 * 0.512) / 5500, 9);
  });
});

describe('least steel (Table 11.6.1, 11.6.2)', () => {
  it('the bracket: hw/lw 1, rho_t 0.0045: 0.0025 + 0.5 x 1.5 x 0.0020 = 0.0040; nothing from hw/lw 2.5 on', () => {
    expect(aci31819.highShearSteel(1, 0.0045, 1).vertical).toBeCloseTo(0.004, 12);
    expect(aci31819.highShearSteel(2.25, 0.0045, 1).vertical).toBeCloseTo(0.00275, 12);
    expect(aci31819.highShearSteel(2.5, 0.0045, 1).vertical).toBe(0.0025);
    expect(aci31819.highShearSteel(4, 0.0015, 1).vertical).toBe(0.0025);
    expect(aci31819.highShearSteel(1, 0.0045, 1).horizontal).toBe(0.0025);
  });
});
