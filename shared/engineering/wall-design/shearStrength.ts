import type { CodeRules } from '../codes/codeRules.ts';
import { psiPerKsi } from '../units.ts';

export interface ShearWall {
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  readonly fytKsi: number;
  readonly lambda: number;
  /** hw: from the wall's base to its own top */
  readonly wallHeightIn: number;
}

export interface ShearStrength {
  readonly vcKip: number;
  readonly vsKip: number;
  /** the least of Vc + Vs and the limit */
  readonly vnKip: number;
  readonly phiVnKip: number;
  /** 8 sqrt(f'c) Acv, without phi */
  readonly limitKip: number;
}

/**
 * In-plane shear strength of an ordinary wall (11.5.4.2 to 11.5.4.4): Vn = (alpha_c lambda sqrt(f'c) + rho_t fyt) Acv, not above
 * 8 sqrt(f'c) Acv; Acv = lw t. Kip. Caps: sqrt(f'c) 100 psi (22.5.3.1), fyt 60 ksi (20.2.2.4). Nu in kip, compression positive;
 * below 0 alpha_c follows 11.5.4.4 and may reach 0.
 */
export function shearStrength(
  wall: ShearWall,
  horizontalRatio: number,
  axialKip: number,
  rules: CodeRules,
): ShearStrength {
  const areaIn2 = wall.lengthIn * wall.thicknessIn;
  const vcKip = concreteShear(wall, axialKip, rules);
  const vsKip = horizontalRatio * Math.min(wall.fytKsi, rules.caps.fytShearKsi) * areaIn2;
  const limitKip = (rules.shear.limitFactor * rootFcPsi(wall.fcPsi, rules) * areaIn2) / psiPerKsi;
  const vnKip = Math.min(vcKip + vsKip, limitKip);
  return { vcKip, vsKip, vnKip, phiVnKip: rules.phiShear * vnKip, limitKip };
}

/** Vc = alpha_c lambda sqrt(f'c) Acv in kip (11.5.4.3). */
export function concreteShear(wall: ShearWall, axialKip: number, rules: CodeRules): number {
  const areaIn2 = wall.lengthIn * wall.thicknessIn;
  const factor = rules.shear.concreteFactor(wall.wallHeightIn / wall.lengthIn, axialKip, areaIn2);
  return (factor * wall.lambda * rootFcPsi(wall.fcPsi, rules) * areaIn2) / psiPerKsi;
}

/** sqrt(f'c) in psi, not above the edition's cap (100 psi). */
export function rootFcPsi(fcPsi: number, rules: CodeRules): number {
  return Math.min(Math.sqrt(fcPsi), rules.caps.rootFcPsi);
}

/**
 * Steel ratio needed for shear: rho_t = (Vu/phi - Vc)/(fyt Acv), not below 0 (11.5.4.3 solved for rho_t). Vu in kip, either sign.
 * Where Vu/phi is above the limit no steel helps; the ratio that reaches the limit is given.
 */
export function shearSteelNeeded(wall: ShearWall, shearKip: number, axialKip: number, rules: CodeRules): number {
  const bare = shearStrength(wall, 0, axialKip, rules);
  const neededKip = Math.min(Math.abs(shearKip) / rules.phiShear, bare.limitKip) - bare.vcKip;
  const fullKip = Math.min(wall.fytKsi, rules.caps.fytShearKsi) * wall.lengthIn * wall.thicknessIn;
  return Math.max(0, neededKip / fullKip);
}

/** Vu above which 11.6.2 replaces Table 11.6.1: 0.5 phi alpha_c lambda sqrt(f'c) Acv with phi 0.75; kip. */
export function lowShearLimit(wall: ShearWall, axialKip: number, rules: CodeRules): number {
  return 0.5 * rules.phiShear * concreteShear(wall, axialKip, rules);
}
