import { pieceWidth } from './sectionCurve.ts';
import type { SectionCurve } from './sectionCurve.ts';

/** A state of a section at which it carries a given axial force. */
export interface FlexuralState {
  readonly phi: number;
  /** depth of the neutral axis */
  readonly cIn: number;
  readonly mnKipIn: number;
  readonly phiMnKipIn: number;
}

function axialAt(pieces: Float64Array, at: number, c: number): number {
  const pm = pieces[at + 4] as number;
  return (pieces[at + 2] as number) * c + (pieces[at + 3] as number) + (pm === 0 ? 0 : pm / c);
}

function momentAt(pieces: Float64Array, at: number, c: number): number {
  const mm = pieces[at + 10] as number;
  return (
    ((pieces[at + 5] as number) * c + (pieces[at + 6] as number)) * c +
    (pieces[at + 7] as number) +
    (mm === 0 ? 0 : mm / c)
  );
}

function phiAt(pieces: Float64Array, at: number, c: number): number {
  const b = pieces[at + 9] as number;
  return (pieces[at + 8] as number) + (b === 0 ? 0 : b / c);
}

/** Halves [low, high] until no number lies between; `rising` holds where the function grows. Throws where it does not close. */
export function bisect(value: (c: number) => number, low: number, high: number, target: number): number {
  const rising = value(high) >= value(low);
  let from = low;
  let to = high;
  for (let step = 0; step < 2200; step += 1) {
    const middle = from + (to - from) / 2;
    if (middle <= from || middle >= to) {
      return Math.abs(value(from) - target) <= Math.abs(value(to) - target) ? from : to;
    }
    const below = value(middle) < target;
    if (below === rising) from = middle;
    else to = middle;
  }
  throw new Error(`neutral axis did not close between ${String(low)} and ${String(high)} in`);
}

/**
 * Where phi Pn of a piece turns: (a + b/c)(p1 c + p0 + pm/c) has the derivative a p1 - (a pm + b p0)/c^2 - 2 b pm/c^3, whose cubic
 * a p1 c^3 - (a pm + b p0) c - 2 b pm is itself monotone on both sides of c* = sqrt((a pm + b p0)/(3 a p1)). At most two turns.
 */
function turningDepths(pieces: Float64Array, at: number, from: number, to: number): number[] {
  const [p1, p0, pm] = [pieces[at + 2] as number, pieces[at + 3] as number, pieces[at + 4] as number];
  const [a, b] = [pieces[at + 8] as number, pieces[at + 9] as number];
  const cubic = a * p1;
  const linear = a * pm + b * p0;
  const constant = 2 * b * pm;
  const slope = (c: number): number => (cubic * c * c - linear) * c - constant;
  const edges = [from];
  if (cubic !== 0 && linear / cubic > 0) {
    const star = Math.sqrt(linear / (3 * cubic));
    if (star > from && star < to) edges.push(star);
  }
  edges.push(to);
  const turns: number[] = [];
  for (let index = 0; index + 1 < edges.length; index += 1) {
    const [low, high] = [edges[index] as number, edges[index + 1] as number];
    if (slope(low) * slope(high) < 0) turns.push(bisect(slope, low, high, 0));
  }
  return turns;
}

/** Calls `found` with every c at which the curve carries the target. Pieces meet with jumps where the block reaches a bar, so each piece is searched by itself. */
function eachRoot(
  curve: SectionCurve,
  targetKip: number,
  reduced: boolean,
  found: (at: number, c: number) => void,
): void {
  const { pieces, count } = curve;
  for (let piece = 0; piece < count; piece += 1) {
    const at = piece * pieceWidth;
    const from = pieces[at] as number;
    const to = pieces[at + 1] as number;
    const varying = reduced && pieces[at + 9] !== 0;
    const value = reduced
      ? (c: number): number => phiAt(pieces, at, c) * axialAt(pieces, at, c)
      : (c: number): number => axialAt(pieces, at, c);
    const edges = varying ? [from, ...turningDepths(pieces, at, from, to), to] : [from, to];
    let low = from;
    let lowValue = value(low);
    for (let index = 1; index < edges.length; index += 1) {
      const high = edges[index] as number;
      const highValue = value(high);
      if (lowValue === targetKip) found(at, low);
      else if (highValue === targetKip) found(at, high);
      else if (lowValue < targetKip !== highValue < targetKip) found(at, bisect(value, low, high, targetKip));
      low = high;
      lowValue = highValue;
    }
  }
}

function smallest(curve: SectionCurve, targetKip: number, reduced: boolean): FlexuralState | null {
  let best: FlexuralState | null = null;
  eachRoot(curve, targetKip, reduced, (at, cIn) => {
    const phi = reduced ? phiAt(curve.pieces, at, cIn) : 1;
    const mnKipIn = momentAt(curve.pieces, at, cIn);
    const phiMnKipIn = phi * mnKipIn;
    if (!best || phiMnKipIn < best.phiMnKipIn) best = { phi, cIn, mnKipIn, phiMnKipIn };
  });
  return best;
}

/**
 * Design strength at a factored axial force: phi Pn(c) = Pu solved for c by exact pieces and bisection to the last bit; where several
 * c do, the smallest phi Mn (22.4, 21.2.2). Pu in kip, compression positive. Null outside phi Pn,max (22.4.2.1) and 0.90 As fy in tension.
 */
export function designStrength(curve: SectionCurve, axialKip: number): FlexuralState | null {
  if (axialKip > curve.phiAxialCapKip) return null;
  if (axialKip < curve.phiTensionKip * (1 + 1e-12)) return null;
  return smallest(curve, Math.max(axialKip, curve.phiTensionKip), true);
}

/**
 * Nominal strength at an axial force: Pn(c) = Pu with phi 1 (with a curve made at 1.25 fy: Mpr). Null where no c carries it.
 */
export function nominalStrength(curve: SectionCurve, axialKip: number): FlexuralState | null {
  if (axialKip > curve.squashKip || axialKip < curve.tensionKip) return null;
  return smallest(curve, axialKip, false);
}

/** Pn, Mn and phi at a depth of the neutral axis, for pictures and for checks against published points. */
export function stateAt(curve: SectionCurve, cIn: number): { axialKip: number; momentKipIn: number; phi: number } {
  const { pieces, count } = curve;
  let at = (count - 1) * pieceWidth;
  for (let piece = 0; piece < count; piece += 1) {
    if (cIn <= (pieces[piece * pieceWidth + 1] as number)) {
      at = piece * pieceWidth;
      break;
    }
  }
  return { axialKip: axialAt(pieces, at, cIn), momentKipIn: momentAt(pieces, at, cIn), phi: phiAt(pieces, at, cIn) };
}
