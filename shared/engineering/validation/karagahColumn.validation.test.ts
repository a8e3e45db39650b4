/**
 * Open engineering notes (H. Karagah, 2025, ACI 318-25), P-M interaction notebook: column 20 x 20 in, 8 No. 10, f'c 3 ksi, fy 60 ksi, layers at
 * 3.135, 10.0, 16.865 in, displaced concrete deducted. Printed text read; the numbers are program output of the notes. Tolerance 0.8 %.
 */
import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';
import { nominalStrength, stateAt } from '../wall-design/flexuralStrength.ts';
import { sectionCurve } from '../wall-design/sectionCurve.ts';

const layers = [
  [3.135, 3],
  [10, 2],
  [16.865, 3],
].map(([positionIn = 0, count = 0]) => ({ positionIn, areaIn2: count * 1.27, compression: true }));
const curve = sectionCurve({ lengthIn: 20, thicknessIn: 20, fcPsi: 3000, fyKsi: 60, layers }, aci31819);
const near = (value: number, printed: number): void => {
  expect(Math.abs(value - printed)).toBeLessThanOrEqual(0.008 * printed);
};

describe('P-M points of a column', () => {
  it('squash load 1602 and cap 1282 kip', () => {
    near(curve.squashKip, 1602);
    near(curve.phiAxialCapKip / 0.65, 1282);
  });
  it('zero strain at the far bars: 1033 kip, 297 kip-ft', () => {
    const state = stateAt(curve, 16.865);
    near(state.axialKip, 1033);
    near(state.momentKipIn / 12, 297);
  });
  it('balance: c 9.981 in, 421 kip, 462 kip-ft', () => {
    const state = stateAt(curve, (16.865 * 0.003) / (0.003 + 60 / 29000));
    near(state.axialKip, 421);
    near(state.momentKipIn / 12, 462);
    expect(state.phi).toBeCloseTo(0.65, 9);
  });
  it('far strain 0.005: 75 kip, 387 kip-ft', () => {
    const state = stateAt(curve, (16.865 * 0.003) / 0.008);
    near(state.axialKip, 75);
    near(state.momentKipIn / 12, 387);
  });
  it('pure flexure: c 5.615 in, 363 kip-ft', () => {
    const state = nominalStrength(curve, 0);
    near(state?.cIn ?? 0, 5.615);
    near((state?.mnKipIn ?? 0) / 12, 363);
  });
});
