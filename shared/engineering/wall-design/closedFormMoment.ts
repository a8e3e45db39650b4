import { psiPerKsi } from '../units.ts';

/**
 * Nominal moment of a wall with evenly spread steel in closed form, as a cross-check beside the exact solution, never a verdict:
 * Mn = 0.5 As fy lw (1 + Pn/(As fy)) (1 - c/lw), c/lw = (w + a)/(2 w + 0.85 beta1), w = As fy/(lw t f'c), a = Pn/(lw t f'c).
 * As all vertical steel in2, Pn kip, result kip-in. Source: Cardenas, Hanson, Corley, Hognestad (1973), "Design provisions for shear
 * walls", ACI Journal 70(3). Range: 0 <= Pn <= 0.2 f'c Ag, no end zones; null outside.
 */
export function closedFormMoment(wall: {
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  readonly fyKsi: number;
  readonly steelIn2: number;
  readonly blockDepthFactor: number;
  readonly axialKip: number;
}): { readonly mnKipIn: number; readonly depthOverLength: number } | null {
  const grossKip = (wall.lengthIn * wall.thicknessIn * wall.fcPsi) / psiPerKsi;
  if (wall.axialKip < 0 || wall.axialKip > 0.2 * grossKip) return null;
  const steelKip = wall.steelIn2 * wall.fyKsi;
  const omega = steelKip / grossKip;
  const alpha = wall.axialKip / grossKip;
  const depthOverLength = (omega + alpha) / (2 * omega + 0.85 * wall.blockDepthFactor);
  return {
    mnKipIn: 0.5 * wall.lengthIn * (steelKip + wall.axialKip) * (1 - depthOverLength),
    depthOverLength,
  };
}
