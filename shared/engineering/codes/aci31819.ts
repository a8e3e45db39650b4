import type { CodeRules } from './codeRules.ts';

/** beta1 of Table 22.2.2.4.3: 0.85 up to 4,000 psi, 0.05 less for each 1,000 psi more, not below 0.65. */
function blockDepthFactor(fcPsi: number): number {
  return Math.max(0.65, Math.min(0.85, 0.85 - (0.05 * (fcPsi - 4000)) / 1000));
}

/**
 * alpha_c of 11.5.4.3: 3 at hw/lw <= 1.5, 2 at >= 2.0, linear between; in net tension 2 (1 + Nu/(500 Ag)) >= 0 of 11.5.4.4,
 * Nu in lb and negative, Ag in in2.
 */
function concreteFactor(heightOverLength: number, netAxialKip: number, grossAreaIn2: number): number {
  if (netAxialKip < 0) return Math.max(0, 2 * (1 + (netAxialKip * 1000) / (500 * grossAreaIn2)));
  return Math.max(2, Math.min(3, 3 - 2 * (heightOverLength - 1.5)));
}

/**
 * psi_g of Table 25.4.2.5: 1.0 for Grades 40 and 60, 1.15 for 80, 1.3 for 100. Soft-metric 420, 550 and 690 fall with 60, 80, 100.
 */
function gradeFactor(fyKsi: number): number {
  if (fyKsi <= 65) return 1;
  return fyKsi <= 85 ? 1.15 : 1.3;
}

/**
 * ldh of 25.4.3.1: fy psi_e psi_r psi_o psi_c db^1.5/(55 lambda sqrt(f'c)), bars in a wall or footing spaced 6 db or more
 * (psi_r 1.0) with side cover below 6 db (psi_o 1.25), uncoated; psi_c = f'c/15,000 + 0.6 below 6,000 psi. From memory.
 */
function hookIn(diameterIn: number, fyKsi: number, fcPsi: number, lambda: number): number {
  const strength = fcPsi < 6000 ? fcPsi / 15000 + 0.6 : 1;
  const root = Math.min(100, Math.sqrt(fcPsi));
  return (fyKsi * 1000 * 1.25 * strength * diameterIn * Math.sqrt(diameterIn)) / (55 * lambda * root);
}

/** ACI 318-19, ordinary structural walls (chapter 11). Constants from memory, checked against the published values in validation/. */
export const aci31819: CodeRules = {
  edition: 'aci318-19',
  title: 'ACI 318-19',
  crushingStrain: 0.003,
  blockDepthFactor,
  phiCompression: 0.65,
  phiTension: 0.9,
  tensionControlledStrain: (yieldStrain) => yieldStrain + 0.003,
  axialCapFactor: 0.8,
  phiShear: 0.75,
  caps: { rootFcPsi: 100, fyFlexureKsi: 100, fyAxialKsi: 80, fytShearKsi: 60, fyFrictionKsi: 60 },
  shear: { concreteFactor, limitFactor: 8 },
  lowShearSteel: (smallBar) =>
    smallBar ? { vertical: 0.0012, horizontal: 0.002 } : { vertical: 0.0015, horizontal: 0.0025 },
  highShearSteel: (heightOverLength, provided, forStrength) => ({
    horizontal: 0.0025,
    vertical: Math.max(
      0.0025,
      Math.min(0.0025 + 0.5 * Math.max(0, 2.5 - heightOverLength) * (provided - 0.0025), forStrength),
    ),
  }),
  friction: {
    // Table 22.9.4.2: 1.0 lambda on a surface roughened to 1/4 in, 0.6 lambda otherwise
    coefficient: (surface, lambda) => (surface === 'roughened' ? 1 : 0.6) * lambda,
    // Table 22.9.4.4: normalweight and roughened; all other cases (lightweight, or not roughened)
    limitKsi: (surface, lambda, fcPsi) =>
      (surface === 'roughened' && lambda >= 1
        ? Math.min(0.2 * fcPsi, 480 + 0.08 * fcPsi, 1600)
        : Math.min(0.2 * fcPsi, 800)) / 1000,
  },
  development: {
    gradeFactor,
    // psi_s of Table 25.4.2.5: 0.8 for No. 6 and smaller (soft-metric No. 19 is 19.1 mm)
    sizeFactor: (diameterIn) => (diameterIn <= 0.76 ? 0.8 : 1),
    hookIn,
  },
  tiesAboveRatio: 0.01,
  clauses: {
    flexure: '22.4, 11.5.2',
    shear: '11.5.4.3',
    'shear-limit': '11.5.4.2',
    'low-shear': '11.6.1',
    'high-shear': '11.6.2',
    'spacing-vertical': '11.7.2.1',
    'spacing-horizontal': '11.7.3.1',
    curtains: '11.7.2.3',
    thickness: '11.3.1.1',
    axial: '11.5.3',
    ties: '11.7.4.1',
    'tie-spacing': '25.7.2.1',
    joint: '22.9.4',
    fit: '25.2.3',
    splice: '25.5.2.1',
  },
};
