const squareInchesPerSquareFoot = 144;

/**
 * L/Lo = 0.25 + 15/sqrt(KLL AT), AT in ft2 (given in in2), where KLL AT is at least 400 ft2; not below 0.50 for one floor and 0.40 for
 * two or more (ASCE/SEI 7 4.7.2). 1 where it does not apply.
 */
export function liveReductionFactor(areaIn2: number, floors: number, kll: number): number {
  const influenceFt2 = (kll * areaIn2) / squareInchesPerSquareFoot;
  if (floors === 0 || influenceFt2 < 400 * (1 - 1e-12)) return 1;
  return Math.min(1, Math.max(floors > 1 ? 0.4 : 0.5, 0.25 + 15 / Math.sqrt(influenceFt2)));
}
