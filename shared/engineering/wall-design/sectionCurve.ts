import type { CodeRules } from '../codes/codeRules.ts';
import { psiPerKsi } from '../units.ts';

/** Bars at one place along the wall. */
export interface SectionLayer {
  /** from the compression face */
  readonly positionIn: number;
  readonly areaIn2: number;
  /** false: the bars take no compression (11.7.4.1, not tied); tension counts as ever, the concrete they displace is not deducted */
  readonly compression: boolean;
}

export interface WallSection {
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  readonly fyKsi: number;
  readonly layers: readonly SectionLayer[];
}

export const steelModulusKsi = 29000;

/**
 * A section bent about mid-length, as exact functions of the depth c of the neutral axis (in), piece by piece: within a piece
 * no bar changes its state, so Pn = p1 c + p0 + pm/c (kip), Mn = m2 c^2 + m1 c + m0 + mm/c (kip-in), phi = a + b/c. A piece is a run
 * of ten numbers: from, to, p1, p0, pm, m2, m1, m0, a, b, mm. Assumptions of 22.2: plane sections, 0.003 at the compression face,
 * 0.85 f'c over beta1 c, steel elastic up to fy with 29,000 ksi, bars inside the block lose 0.85 f'c; phi of Table 21.2.2 by
 * the strain of the farthest bar.
 */
export interface SectionCurve {
  readonly pieces: Float64Array;
  readonly count: number;
  /** Po = 0.85 f'c (Ag - Ast) + fy Ast (22.4.2.2), fy to the edition's cap, bars without compression left out; kip */
  readonly squashKip: number;
  /** phi times the cap on Pn (22.4.2.1); kip */
  readonly phiAxialCapKip: number;
  /** 0.90 As fy, negative; kip */
  readonly phiTensionKip: number;
  /** the same without phi */
  readonly tensionKip: number;
  /** stretches between the turns of phi Pn and of Pn, kept by flexuralStrength once it has found them */
  readonly runs: { reduced: readonly number[] | null; nominal: readonly number[] | null };
}

export const pieceWidth = 11;
const layerWidth = 3;

/** Room in which curves are made one after another without new arrays; a curve made in it lives until the next one. */
export class CurveStore {
  depths = new Float64Array(0);
  pieces = new Float64Array(0);
  /** layers as columns: position, area and 1 where the bars take compression */
  layers = new Float64Array(0);

  /** Grows to the room that so many layers need. */
  reserve(layers: number): this {
    const depths = 5 + 3 * layers;
    if (this.depths.length < depths) {
      this.depths = new Float64Array(depths);
      this.pieces = new Float64Array(depths * pieceWidth);
      this.layers = new Float64Array(layers * layerWidth);
    }
    return this;
  }
}

/** Where some bar, the block or phi changes its rule: sorted depths of the neutral axis, in, from 0 to far outside the section. */
function breakpoints(
  section: WallSection,
  yieldStrain: number,
  rules: CodeRules,
  beta1: number,
  farIn: number,
  found: Float64Array,
): Float64Array {
  const ecu = rules.crushingStrain;
  const { layers, lengthIn } = section;
  found[0] = 0;
  let count = 1;
  const add = (c: number): void => {
    found[count] = c;
    count += 1;
  };
  add(lengthIn / beta1);
  add(1000 * lengthIn);
  for (const { positionIn: x, compression } of layers) {
    if (x <= 0) continue;
    add((x * ecu) / (ecu + yieldStrain));
    add(compression ? x / beta1 : x);
    if (yieldStrain < ecu) add((x * ecu) / (ecu - yieldStrain));
  }
  if (farIn > 0) {
    add((farIn * ecu) / (ecu + yieldStrain));
    add((farIn * ecu) / (ecu + rules.tensionControlledStrain(yieldStrain)));
  }
  const sorted = found.subarray(0, count).sort();
  let kept = 1;
  for (let index = 1; index < count; index += 1) {
    if ((sorted[index] as number) > (sorted[kept - 1] as number)) {
      sorted[kept] = sorted[index] as number;
      kept += 1;
    }
  }
  return sorted.subarray(0, kept);
}

/**
 * Makes the curve of a section. `steelFactor` multiplies fy (1; 1.25 for the probable strength Mpr); fy above the edition's cap for
 * flexure counts as the cap before that. A section without bars has no farthest bar: phi is that of compression throughout.
 */
export function sectionCurve(
  section: WallSection,
  rules: CodeRules,
  steelFactor = 1,
  store = new CurveStore(),
): SectionCurve {
  const { lengthIn, thicknessIn, layers } = section;
  const fyKsi = Math.min(section.fyKsi, rules.caps.fyFlexureKsi) * steelFactor;
  const yieldStrain = fyKsi / steelModulusKsi;
  const ecu = rules.crushingStrain;
  const beta1 = rules.blockDepthFactor(section.fcPsi);
  const blockKsi = (0.85 * section.fcPsi) / psiPerKsi;
  const halfIn = lengthIn / 2;
  let farIn = 0;
  let steelIn2 = 0;
  let squashKip = blockKsi * lengthIn * thicknessIn;
  const axialFyKsi = Math.min(fyKsi, rules.caps.fyAxialKsi * steelFactor);
  for (const layer of layers) {
    farIn = Math.max(farIn, layer.positionIn);
    steelIn2 += layer.areaIn2;
    if (layer.compression) squashKip += layer.areaIn2 * (axialFyKsi - blockKsi);
  }
  store.reserve(layers.length);
  const depths = breakpoints(section, yieldStrain, rules, beta1, farIn, store.depths);
  const count = depths.length - 1;
  const { pieces, layers: columns } = store;
  const columnsEnd = layers.length * layerWidth;
  layers.forEach(({ positionIn, areaIn2, compression }, index) => {
    columns[index * layerWidth] = positionIn;
    columns[index * layerWidth + 1] = areaIn2;
    columns[index * layerWidth + 2] = compression ? 1 : 0;
  });
  const compressionDepthIn = (farIn * ecu) / (ecu + yieldStrain);
  const tensionControlled = rules.tensionControlledStrain(yieldStrain);
  const tensionDepthIn = (farIn * ecu) / (ecu + tensionControlled);
  const elasticKsi = steelModulusKsi * ecu;

  for (let piece = 0; piece < count; piece += 1) {
    const from = depths[piece] as number;
    const to = depths[piece + 1] as number;
    const c = from + (to - from) / 2;
    let p1 = 0;
    let p0 = 0;
    let pm = 0;
    let m2 = 0;
    let m1 = 0;
    let m0 = 0;
    let mm = 0;
    if (beta1 * c < lengthIn) {
      p1 = blockKsi * thicknessIn * beta1;
      m1 = p1 * halfIn;
      m2 = (-p1 * beta1) / 2;
    } else {
      p0 = blockKsi * thicknessIn * lengthIn;
    }
    for (let layer = 0; layer < columnsEnd; layer += layerWidth) {
      const x = columns[layer] as number;
      const areaIn2 = columns[layer + 1] as number;
      const arm = halfIn - x;
      const strain = (ecu * (c - x)) / c;
      if (strain > 0 && columns[layer + 2] === 0) continue;
      let constantKip: number;
      if (strain >= yieldStrain) constantKip = areaIn2 * fyKsi;
      else if (strain <= -yieldStrain) constantKip = -areaIn2 * fyKsi;
      else {
        const elasticKip = areaIn2 * elasticKsi;
        constantKip = elasticKip;
        pm -= elasticKip * x;
        mm -= elasticKip * x * arm;
      }
      if (x < beta1 * c) constantKip -= areaIn2 * blockKsi;
      p0 += constantKip;
      m0 += constantKip * arm;
    }
    let a = rules.phiCompression;
    let b = 0;
    if (c < tensionDepthIn) a = rules.phiTension;
    else if (c < compressionDepthIn) {
      const slope = (rules.phiTension - rules.phiCompression) / (tensionControlled - yieldStrain);
      a = rules.phiCompression - slope * (ecu + yieldStrain);
      b = slope * ecu * farIn;
    }
    const at = piece * pieceWidth;
    pieces[at] = from;
    pieces[at + 1] = to;
    pieces[at + 2] = p1;
    pieces[at + 3] = p0;
    pieces[at + 4] = pm;
    pieces[at + 5] = m2;
    pieces[at + 6] = m1;
    pieces[at + 7] = m0;
    pieces[at + 8] = a;
    pieces[at + 9] = b;
    pieces[at + 10] = mm;
  }
  return {
    pieces,
    count,
    squashKip,
    phiAxialCapKip: rules.phiCompression * rules.axialCapFactor * squashKip,
    phiTensionKip: -rules.phiTension * steelIn2 * fyKsi,
    tensionKip: -steelIn2 * fyKsi,
    runs: { reduced: null, nominal: null },
  };
}
