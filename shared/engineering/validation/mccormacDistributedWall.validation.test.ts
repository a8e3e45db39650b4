/**
 * McCormac, J.C. and Brown, R.H., Design of Reinforced Concrete, 9th ed. (ACI 318-11), Wiley, Example 20.4, Table 20.3. Printed text read.
 * A masonry wall of seven bars: same machinery, other constants (strain 0.0025, block 0.80 f'm over 0.80 c, phi 0.9 throughout,
 * bars in compression left out). f'm enters as 1.5 x 0.80/0.85, since the solver's block is 0.85 f'c. Tolerance 0.3 %: printed rounding.
 */
import { expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';
import { stateAt } from '../wall-design/flexuralStrength.ts';
import { sectionCurve } from '../wall-design/sectionCurve.ts';

it('phi Pn and phi Mn at nine depths of the neutral axis', () => {
  const layers = Array.from({ length: 7 }, (_, index) => ({
    positionIn: 4 + 48 * index,
    areaIn2: 0.31,
    compression: false,
  }));
  const masonry = { ...aci31819, crushingStrain: 0.0025, blockDepthFactor: () => 0.8 };
  const section = { lengthIn: 296, thicknessIn: 7.625, fcPsi: (1500 * 0.8) / 0.85, fyKsi: 60, layers };
  const curve = sectionCurve(section, masonry);
  const printed: readonly (readonly [number, number, number])[] = [
    [146, 924, 7519],
    [262.8, 1729, 6214],
    [233.6, 1533, 7065],
    [204.4, 1334, 7569],
    [175.2, 1130, 7730],
    [116.8, 717, 6884],
    [87.6, 510, 5823],
    [58.4, 303, 4340],
    [29.2, 93, 2394],
  ];
  for (const [c, phiPnKip, phiMnKipFt] of printed) {
    const { axialKip, momentKipIn } = stateAt(curve, c);
    expect(Math.abs(0.9 * axialKip - phiPnKip)).toBeLessThanOrEqual(0.003 * phiPnKip);
    expect(Math.abs((0.9 * momentKipIn) / 12 - phiMnKipFt)).toBeLessThanOrEqual(0.003 * phiMnKipFt);
  }
  expect(Math.abs(curve.phiTensionKip + 117.18)).toBeLessThan(1e-9);
});
