import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';
import { barLayers } from './barLayers.ts';
import { findBar } from './bars.ts';
import { closedFormMoment } from './closedFormMoment.ts';
import { nominalStrength } from './flexuralStrength.ts';
import { sectionCurve } from './sectionCurve.ts';

describe('closedFormMoment beside the exact solution', () => {
  it.each([
    [180, 10, 4000, 4, 12],
    [300, 12, 5000, 5, 12],
    [420, 14, 6000, 6, 10],
  ])('lies 0.90 to 1.00 of it for a wall %d x %d in', (lengthIn, thicknessIn, fcPsi, number, webSpacingIn) => {
    const bars = { curtains: 2 as const, web: findBar('us', number), webSpacingIn, ends: null, edgeIn: 3 };
    const layers = barLayers(bars, lengthIn, { web: true, ends: true });
    const curve = sectionCurve({ lengthIn, thicknessIn, fcPsi, fyKsi: 60, layers }, aci31819);
    const steelIn2 = layers.reduce((sum, layer) => sum + layer.areaIn2, 0);
    for (const share of [0.02, 0.05, 0.1, 0.2]) {
      const axialKip = (share * lengthIn * thicknessIn * fcPsi) / 1000;
      const blockDepthFactor = aci31819.blockDepthFactor(fcPsi);
      const closed = closedFormMoment({
        lengthIn,
        thicknessIn,
        fcPsi,
        fyKsi: 60,
        steelIn2,
        blockDepthFactor,
        axialKip,
      });
      const ratio = (closed?.mnKipIn ?? 0) / (nominalStrength(curve, axialKip)?.mnKipIn ?? 1);
      expect(ratio).toBeGreaterThan(0.9);
      expect(ratio).toBeLessThan(1);
    }
  });
});
