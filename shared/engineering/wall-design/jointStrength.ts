import type { CodeRules } from '../codes/codeRules.ts';
import type { JointSurface } from '../input.ts';

export interface Joint {
  readonly surface: JointSurface;
  readonly lambda: number;
  /** the weaker of the concretes above and below */
  readonly fcPsi: number;
  readonly fyKsi: number;
  /** Ac = lw t */
  readonly areaIn2: number;
}

/**
 * Permanent compression that may help the joint (22.9.4.5): the smaller of the factored dead load and Pu, not below 0. `deadFactor`
 * is 0.9, and 0.9 - 0.2 SDS in combinations with E. Kip.
 */
export function jointCompression(deadKip: number, deadFactor: number, axialKip: number): number {
  return Math.max(0, Math.min(deadFactor * deadKip, axialKip));
}

/**
 * Shear friction across a construction joint (22.9.4.2): phi Vn = phi mu (Avf min(fy, 60) + N), not above the limit of Table 22.9.4.4
 * times Ac; net tension takes Tu/(0.90 fy) from Avf first. `steelIn2` is all vertical steel through the joint. Kip.
 */
export function jointStrength(
  joint: Joint,
  steelIn2: number,
  compressionKip: number,
  axialKip: number,
  rules: CodeRules,
): { readonly phiVnKip: number; readonly limitKip: number } {
  const tensionIn2 = Math.max(0, -axialKip) / (rules.phiTension * joint.fyKsi);
  const frictionIn2 = Math.max(0, steelIn2 - tensionIn2);
  const fyKsi = Math.min(joint.fyKsi, rules.caps.fyFrictionKsi);
  const limitKip = rules.friction.limitKsi(joint.surface, joint.lambda, joint.fcPsi) * joint.areaIn2;
  const mu = rules.friction.coefficient(joint.surface, joint.lambda);
  const vnKip = Math.min(mu * (frictionIn2 * fyKsi + compressionKip), limitKip);
  return { phiVnKip: rules.phiShear * vnKip, limitKip };
}

/** Vertical steel that a joint needs for Vu: jointStrength solved for Avf, in2; where the limit is passed, what reaches the limit. */
export function jointSteelNeeded(
  joint: Joint,
  shearKip: number,
  compressionKip: number,
  axialKip: number,
  rules: CodeRules,
): number {
  const limitKip = rules.friction.limitKsi(joint.surface, joint.lambda, joint.fcPsi) * joint.areaIn2;
  const vnKip = Math.min(Math.abs(shearKip) / rules.phiShear, limitKip);
  const mu = rules.friction.coefficient(joint.surface, joint.lambda);
  const frictionIn2 = Math.max(0, vnKip / mu - compressionKip) / Math.min(joint.fyKsi, rules.caps.fyFrictionKsi);
  return frictionIn2 + Math.max(0, -axialKip) / (rules.phiTension * joint.fyKsi);
}
