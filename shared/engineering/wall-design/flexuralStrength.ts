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

/** phi Pn (or Pn) of a piece at c. */
function valueAt(pieces: Float64Array, at: number, reduced: boolean, c: number): number {
  return reduced ? phiAt(pieces, at, c) * axialAt(pieces, at, c) : axialAt(pieces, at, c);
}

/**
 * The sign of the slope of phi Pn within a piece: (a + b/c)(p1 c + p0 + pm/c) has the derivative
 * a p1 - (a pm + b p0)/c^2 - 2 b pm/c^3; this is that times c^3.
 */
function slopeAt(pieces: Float64Array, at: number, c: number): number {
  const pm = pieces[at + 4] as number;
  const a = pieces[at + 8] as number;
  const b = pieces[at + 9] as number;
  const linear = a * pm + b * (pieces[at + 3] as number);
  return (a * (pieces[at + 2] as number) * c * c - linear) * c - 2 * b * pm;
}

type PieceFunction = (pieces: Float64Array, at: number, c: number) => number;
const reducedAt: PieceFunction = (pieces, at, c) => valueAt(pieces, at, true, c);

/**
 * Closes on the target between low and high, where the function takes it: false position with the Illinois halving of the end that stays,
 * always inside the bracket, and plain halving where that stalls. Ends where the value meets the target to its last bits (1e-15 of the
 * magnitudes involved) or no number lies between. Throws where it does not close.
 */
function close(
  value: PieceFunction,
  pieces: Float64Array,
  at: number,
  low: number,
  high: number,
  target: number,
): number {
  let [from, to] = [low, high];
  let fromGap = value(pieces, at, from) - target;
  let toGap = value(pieces, at, to) - target;
  const enough = 1e-15 * (Math.abs(fromGap) + Math.abs(toGap) + Math.abs(target));
  for (let step = 0; step < 2200; step += 1) {
    const middle = from + (to - from) / 2;
    if (middle <= from || middle >= to) return Math.abs(fromGap) <= Math.abs(toGap) ? from : to;
    const secant = from - (fromGap * (to - from)) / (toGap - fromGap);
    const c = step < 40 && secant > from && secant < to ? secant : middle;
    const gap = value(pieces, at, c) - target;
    if (Math.abs(gap) <= enough) return c;
    if (gap < 0 === fromGap < 0) {
      from = c;
      fromGap = gap;
      toGap /= step < 40 ? 2 : 1;
    } else {
      to = c;
      toGap = gap;
      fromGap /= step < 40 ? 2 : 1;
    }
  }
  throw new Error(`neutral axis did not close between ${String(low)} and ${String(high)} in`);
}

const noTurns: readonly number[] = [];

/**
 * Where phi Pn of a piece turns. The cubic of `slopeAt` is monotone on both sides of c* = sqrt((a pm + b p0)/(3 a p1)), so there are at
 * most two turns and each is bracketed.
 */
function turningDepths(pieces: Float64Array, at: number, from: number, to: number): readonly number[] {
  const cubic = (pieces[at + 8] as number) * (pieces[at + 2] as number);
  const linear =
    (pieces[at + 8] as number) * (pieces[at + 4] as number) + (pieces[at + 9] as number) * (pieces[at + 3] as number);
  const square = cubic === 0 ? -1 : linear / (3 * cubic);
  const star = square > from * from && square < to * to ? Math.sqrt(square) : from;
  const first = star > from ? turnBetween(pieces, at, from, star) : null;
  const second = turnBetween(pieces, at, star, to);
  if (first === null) return second === null ? noTurns : [second];
  return second === null ? [first] : [first, second];
}

function turnBetween(pieces: Float64Array, at: number, low: number, high: number): number | null {
  if (!(slopeAt(pieces, at, low) * slopeAt(pieces, at, high) < 0)) return null;
  return close(slopeAt, pieces, at, low, high, 0);
}

/** Stretches of a curve in which phi Pn (or Pn) only grows or only falls: piece, from, to and the values at both, five numbers a run. */
const runWidth = 5;
type Runs = readonly number[];

function monotoneRuns({ pieces, count }: SectionCurve, reduced: boolean): Runs {
  const value = reduced ? reducedAt : axialAt;
  const runs: number[] = [];
  for (let piece = 0; piece < count; piece += 1) {
    const at = piece * pieceWidth;
    const from = pieces[at] as number;
    const to = pieces[at + 1] as number;
    const turns = reduced && pieces[at + 9] !== 0 ? turningDepths(pieces, at, from, to) : noTurns;
    let low = from;
    let lowValue = value(pieces, at, low);
    for (let index = 0; index <= turns.length; index += 1) {
      const high = index < turns.length ? (turns[index] as number) : to;
      const highValue = value(pieces, at, high);
      runs.push(at, low, high, lowValue, highValue);
      low = high;
      lowValue = highValue;
    }
  }
  return runs;
}

function runsOf(curve: SectionCurve, reduced: boolean): Runs {
  const { runs } = curve;
  if (reduced) return (runs.reduced ??= monotoneRuns(curve, true));
  return (runs.nominal ??= monotoneRuns(curve, false));
}

/**
 * Calls `found` with every c at which the curve carries the target. Pieces meet with jumps where the block reaches a bar, so each
 * piece is searched by itself, and between its turns.
 */
function eachRoot(
  curve: SectionCurve,
  targetKip: number,
  reduced: boolean,
  found: (at: number, c: number) => void,
): void {
  const { pieces } = curve;
  const value = reduced ? reducedAt : axialAt;
  const runs = runsOf(curve, reduced);
  for (let run = 0; run < runs.length; run += runWidth) {
    const lowValue = runs[run + 3] as number;
    const highValue = runs[run + 4] as number;
    if (lowValue < targetKip ? highValue < targetKip : highValue > targetKip && lowValue > targetKip) continue;
    const at = runs[run] as number;
    const low = runs[run + 1] as number;
    const high = runs[run + 2] as number;
    if (lowValue === targetKip) found(at, low);
    else if (highValue === targetKip) found(at, high);
    else found(at, close(value, pieces, at, low, high, targetKip));
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
 * Design strength at a factored axial force: phi Pn(c) = Pu solved for c by exact pieces, bracketed to the last bits; where several
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
