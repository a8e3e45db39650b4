import { pieceWidth } from './sectionCurve.ts';
import type { SectionCurve } from './sectionCurve.ts';
import { stateAt } from './flexuralStrength.ts';

export interface InteractionPoint {
  readonly phiPnKip: number;
  readonly phiMnKipIn: number;
}

/**
 * Points of the design interaction curve for a picture, from pure tension to the axial cap (22.4.2.1): four a piece, those
 * above phi Pn,max cut off level. Not used for checks: they solve the strength at each axial force exactly.
 */
export function interactionCurve(curve: SectionCurve): InteractionPoint[] {
  const points: InteractionPoint[] = [];
  for (let piece = 0; piece < curve.count; piece += 1) {
    const from = curve.pieces[piece * pieceWidth] as number;
    const to = curve.pieces[piece * pieceWidth + 1] as number;
    for (let quarter = 1; quarter <= 4; quarter += 1) {
      const state = stateAt(curve, from + ((to - from) * quarter) / 4);
      const phiPnKip = state.phi * state.axialKip;
      if (phiPnKip >= curve.phiAxialCapKip) {
        points.push(
          { phiPnKip: curve.phiAxialCapKip, phiMnKipIn: state.phi * state.momentKipIn },
          { phiPnKip: curve.phiAxialCapKip, phiMnKipIn: 0 },
        );
        return points;
      }
      points.push({ phiPnKip, phiMnKipIn: state.phi * state.momentKipIn });
    }
  }
  return points;
}
