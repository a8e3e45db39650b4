import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { aci31819 } from '../codes/aci31819.ts';
import { designStrength, nominalStrength, stateAt } from './flexuralStrength.ts';
import { interactionCurve } from './interactionCurve.ts';
import { sectionCurve } from './sectionCurve.ts';
import type { WallSection } from './sectionCurve.ts';

const bars = (places: readonly (readonly [number, number])[], compression = true): WallSection['layers'] =>
  places.map(([positionIn, areaIn2]) => ({ positionIn, areaIn2, compression }));

/** A 240 x 12 in wall with end bars and an even web, invented. */
const wall: WallSection = {
  lengthIn: 240,
  thicknessIn: 12,
  fcPsi: 5000,
  fyKsi: 60,
  layers: bars([
    [3, 2],
    [9, 2],
    [15, 2],
    [21, 2],
    ...Array.from({ length: 16 }, (_, index): [number, number] => [21 + ((index + 1) * 198) / 17, 0.62]),
    [219, 2],
    [225, 2],
    [231, 2],
    [237, 2],
  ]),
};

/** Another route: forces summed in strips and bar by bar at a depth c, every rule written out anew. */
function naive(section: WallSection, c: number, strips: number): { phi: number; pn: number; mn: number } {
  const fc = section.fcPsi / 1000;
  const beta1 = section.fcPsi <= 4000 ? 0.85 : Math.max(0.65, 0.85 - 0.05 * (section.fcPsi / 1000 - 4));
  let pn = 0;
  let mn = 0;
  const width = section.lengthIn / strips;
  for (let strip = 0; strip < strips; strip += 1) {
    const covered = Math.min(1, Math.max(0, (beta1 * c - strip * width) / width));
    const force = 0.85 * fc * section.thicknessIn * width * covered;
    pn += force;
    mn += force * (section.lengthIn / 2 - (strip * width + (covered * width) / 2));
  }
  let far = 0;
  for (const layer of section.layers) {
    far = Math.max(far, layer.positionIn);
    const strain = 0.003 * (1 - layer.positionIn / c);
    let stress = 29000 * strain;
    if (stress > section.fyKsi) stress = section.fyKsi;
    if (stress < -section.fyKsi) stress = -section.fyKsi;
    if (layer.positionIn < beta1 * c) stress -= 0.85 * fc;
    pn += stress * layer.areaIn2;
    mn += stress * layer.areaIn2 * (section.lengthIn / 2 - layer.positionIn);
  }
  const tension = 0.003 * (far / c - 1);
  const yielding = section.fyKsi / 29000;
  const phi = Math.min(0.9, Math.max(0.65, 0.65 + (0.25 * (tension - yielding)) / 0.003));
  return { phi, pn, mn };
}

/** Every root of phi Pn(c) = Pu on a fine ladder of depths, then halved; the smallest phi Mn. */
function naiveStrength(section: WallSection, axialKip: number, strips: number): number {
  let best = Infinity;
  const top = 3 * section.lengthIn;
  const steps = 30000;
  const gap = (c: number): number => {
    const { phi, pn } = naive(section, c, strips);
    return phi * pn - axialKip;
  };
  let low = 1e-6;
  let below = gap(low);
  for (let step = 1; step <= steps; step += 1) {
    const high = (top * step) / steps;
    const above = gap(high);
    if (below <= 0 !== above <= 0) {
      let [a, b] = [low, high];
      for (let halving = 0; halving < 80; halving += 1) {
        const middle = (a + b) / 2;
        if (gap(middle) <= 0 === below <= 0) a = middle;
        else b = middle;
      }
      const state = naive(section, (a + b) / 2, strips);
      if (Math.abs(state.phi * state.pn - axialKip) < 1e-6) best = Math.min(best, state.phi * state.mn);
    }
    low = high;
    below = above;
  }
  return best;
}

describe('designStrength', () => {
  const curve = sectionCurve(wall, aci31819);

  it.each([-1200, -300, 0, 250, 900, 2500, 4200, 5800])(
    'agrees with a naive solution at Pu %d kip to 1e-9',
    (axialKip) => {
      const expected = naiveStrength(wall, axialKip, 1);
      const solved = designStrength(curve, axialKip)?.phiMnKipIn ?? 0;
      expect(Math.abs(solved - expected)).toBeLessThanOrEqual(1e-9 * Math.abs(expected));
    },
  );

  it('agrees with 2,000 strips of concrete to 0.01 %', () => {
    const state = designStrength(curve, 900);
    const strips = naive(wall, state?.cIn ?? 1, 2000);
    expect(Math.abs(strips.phi * strips.pn - 900)).toBeLessThan(0.09);
    expect(Math.abs(strips.phi * strips.mn - (state?.phiMnKipIn ?? 0))).toBeLessThan(1e-4 * strips.mn);
  });

  it('meets its axial force to the last digits', () => {
    for (const axialKip of [-1000, 0, 123.456, 3000]) {
      const state = designStrength(curve, axialKip);
      const at = stateAt(curve, state?.cIn ?? 0);
      expect(Math.abs(at.phi * at.axialKip - axialKip)).toBeLessThan(1e-8);
    }
  });

  it('ends at phi Pn,max and at 0.90 As fy', () => {
    const steelIn2 = 16 + 16 * 0.62;
    const squash = 0.85 * 5 * (2880 - steelIn2) + 60 * steelIn2;
    expect(curve.phiAxialCapKip).toBeCloseTo(0.65 * 0.8 * squash, 8);
    expect(designStrength(curve, curve.phiAxialCapKip)).not.toBeNull();
    expect(designStrength(curve, curve.phiAxialCapKip + 0.001)).toBeNull();
    expect(designStrength(curve, -0.9 * 60 * steelIn2 - 0.001)).toBeNull();
    expect(designStrength(curve, -0.9 * 60 * steelIn2)?.phiMnKipIn).toBeCloseTo(0, 6);
  });

  it('takes the smallest phi Mn where several depths carry Pu: phi falls faster than Pn grows', () => {
    const lean: WallSection = {
      lengthIn: 100,
      thicknessIn: 10,
      fcPsi: 4000,
      fyKsi: 60,
      layers: bars([
        [5, 8],
        [95, 0.2],
      ]),
    };
    const leanCurve = sectionCurve(lean, aci31819);
    let turns = 0;
    for (let step = 1; step < 4000; step += 1) {
      const [a, b] = [stateAt(leanCurve, step * 0.05), stateAt(leanCurve, (step + 1) * 0.05)];
      if (b.phi * b.axialKip < a.phi * a.axialKip - 1e-9) turns += 1;
    }
    expect(turns).toBeGreaterThan(0);
    for (const axialKip of [1000, 1100, 1200, 1250]) {
      const expected = naiveStrength(lean, axialKip, 1);
      expect(Math.abs((designStrength(leanCurve, axialKip)?.phiMnKipIn ?? 0) - expected)).toBeLessThan(1e-7 * expected);
    }
    // 1,315 kip is carried near c 35.3 in with phi Mn 51,000 and near c 45.2 in, phi fallen, with 46,000 kip-in
    const first = naive(lean, 35.32, 1);
    const second = naive(lean, 45.2, 1);
    expect(Math.abs(first.phi * first.pn - 1315)).toBeLessThan(1);
    expect(Math.abs(second.phi * second.pn - 1315)).toBeLessThan(1);
    expect(second.phi * second.mn).toBeLessThan(0.91 * first.phi * first.mn);
    const least = designStrength(leanCurve, 1315)?.phiMnKipIn ?? 0;
    expect(Math.abs(least - second.phi * second.mn)).toBeLessThan(0.01 * least);
    expect(Math.abs(least - naiveStrength(lean, 1315, 1))).toBeLessThan(1e-7 * least);
  });

  it('leaves bars without compression out of the block: by hand, 2 in2 at 5 in and at 95 in, Pu 0', () => {
    const layers = bars(
      [
        [5, 2],
        [95, 2],
      ],
      false,
    );
    const state = nominalStrength(
      sectionCurve({ lengthIn: 100, thicknessIn: 10, fcPsi: 4000, fyKsi: 60, layers }, aci31819),
      0,
    );
    // the near bar is compressed (c above 5 in would need 0.85 c 34 kip = 120): c = 120/28.9 = 4.15 in, so it is in tension
    const c = state?.cIn ?? 0;
    const near = Math.max(-60, (29000 * 0.003 * (c - 5)) / c) * 2;
    expect(0.85 * 4 * 10 * 0.85 * c + near - 120).toBeCloseTo(0, 8);
  });

  it('gives the same for a section and its mirror image, and more with more steel', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 4, max: 40 }),
        fc.double({ min: -200, max: 2500, noNaN: true }),
        (size, axialKip) => {
          const section: WallSection = {
            ...wall,
            layers: bars([
              [3, size / 10],
              [60, 1],
              [120, 1],
              [180, 1],
              [237, size / 10],
            ]),
          };
          const mirrored = {
            ...section,
            layers: section.layers.map((l) => ({ ...l, positionIn: 240 - l.positionIn })),
          };
          const heavier = { ...section, layers: section.layers.map((l) => ({ ...l, areaIn2: l.areaIn2 * 1.1 })) };
          const of = (s: WallSection): number => designStrength(sectionCurve(s, aci31819), axialKip)?.phiMnKipIn ?? -1;
          expect(of(mirrored)).toBeCloseTo(of(section), 6);
          expect(of(heavier)).toBeGreaterThan(of(section));
        },
      ),
      { numRuns: 100 },
    );
  });
});

describe('nominalStrength', () => {
  it('with 1.25 fy lies above, and both meet Pn = Pu', () => {
    const nominal = nominalStrength(sectionCurve(wall, aci31819), 500);
    const probable = nominalStrength(sectionCurve(wall, aci31819, 1.25), 500);
    expect(probable?.mnKipIn ?? 0).toBeGreaterThan(1.1 * (nominal?.mnKipIn ?? 0));
    expect(naive(wall, nominal?.cIn ?? 0, 1).pn).toBeCloseTo(500, 8);
    expect(naive({ ...wall, fyKsi: 75 }, probable?.cIn ?? 0, 1).pn).toBeCloseTo(500, 8);
  });

  it('is null beyond the squash load and beyond As fy', () => {
    const curve = sectionCurve(wall, aci31819);
    expect(nominalStrength(curve, curve.squashKip + 1)).toBeNull();
    expect(nominalStrength(curve, curve.tensionKip - 1)).toBeNull();
  });
});

describe('interactionCurve', () => {
  it('runs from tension to the cap and lies on the design strength', () => {
    const curve = sectionCurve(wall, aci31819);
    const points = interactionCurve(curve);
    expect(points[0]?.phiPnKip).toBeLessThan(0);
    expect(points[points.length - 1]).toEqual({ phiPnKip: curve.phiAxialCapKip, phiMnKipIn: 0 });
    const middle = points[Math.floor(points.length / 3)];
    const solved = designStrength(curve, middle?.phiPnKip ?? 0)?.phiMnKipIn ?? 0;
    expect(Math.abs(solved - (middle?.phiMnKipIn ?? 0))).toBeLessThan(1e-7 * solved);
  });
});
