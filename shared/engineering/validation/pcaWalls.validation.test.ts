/**
 * PCA, Simplified Design of Reinforced Concrete Buildings: structural-wall flexure (web excerpt page 318; closed form of Cardenas et al.
 * 1973) and wall shear (page 216). PCA Time-Saving Design Aids: Walls (companion to D. A. Fanella, Structural Engineer, Nov 2001). Printed text
 * read. Only what 318-19 shares with the editions of these texts is compared; their Vc uses d = 0.8 lw and is not.
 */
import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';
import { webRatio } from '../wall-design/barLayers.ts';
import { findBar } from '../wall-design/bars.ts';
import { closedFormMoment } from '../wall-design/closedFormMoment.ts';

describe('closed form for evenly spread steel', () => {
  const wall = { lengthIn: 248, thicknessIn: 8, fcPsi: 4000, fyKsi: 60, blockDepthFactor: 0.85, axialKip: 279 };
  it('No. 4 at 9: c/lw 0.095, Mn 5,699 kip-ft (0.8 %: printed factors are rounded)', () => {
    const result = closedFormMoment({ ...wall, steelIn2: 5.5 });
    expect(Math.abs((result?.depthOverLength ?? 0) - 0.095)).toBeLessThanOrEqual(0.008 * 0.095);
    expect(Math.abs((result?.mnKipIn ?? 0) / 12 - 5699)).toBeLessThanOrEqual(0.008 * 5699);
  });
  it('12.81 in2: c/lw 0.144', () => {
    const result = closedFormMoment({ ...wall, steelIn2: 12.81 });
    expect(Math.abs((result?.depthOverLength ?? 0) - 0.144)).toBeLessThanOrEqual(0.008 * 0.144);
  });
  it('gives nothing in tension or above 0.2 f`c Ag', () => {
    expect(closedFormMoment({ ...wall, steelIn2: 5.5, axialKip: -1 })).toBeNull();
    expect(closedFormMoment({ ...wall, steelIn2: 5.5, axialKip: 0.2001 * 248 * 8 * 4 })).toBeNull();
  });
});

describe('vertical steel against horizontal steel', () => {
  it('hw/lw 2, rho_t 0.0055: rho_l 0.0033 (1.6 %: printed from rounded rho_t)', () => {
    const { vertical } = aci31819.highShearSteel(2, 0.0055357, 1);
    expect(Math.abs(vertical - 0.0033)).toBeLessThanOrEqual(0.016 * 0.0033);
  });
  it('318-19 stops at what strength needs (no publication: the words of 11.6.2)', () => {
    expect(aci31819.highShearSteel(2, 0.0055, 0.003).vertical).toBe(0.003);
    expect(aci31819.highShearSteel(2, 0.0055, 0).vertical).toBe(0.0025);
  });
});

describe('bar choices of the five-story wall meet the least ratios', () => {
  it.each([
    ['No. 5 at 15', 5, 15, 0.0025],
    ['No. 4 at 10', 4, 10, 0.0025],
    ['No. 3 at 11', 3, 11, 0.0012],
    ['No. 4 at 12', 4, 12, 0.002],
  ])('%s', (_, number, spacing, least) => {
    const ratio = webRatio(1, findBar('us', number), spacing, 8);
    expect(ratio).toBeGreaterThanOrEqual(least);
    expect(ratio).toBeLessThanOrEqual(1.05 * least);
  });
});
