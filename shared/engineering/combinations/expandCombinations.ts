import type { LateralAction } from '../distribution/lateralActions.ts';
import type { ModelSettings } from '../model/model.ts';
import type { Expansion } from '../wall-design/designTypes.ts';

import type { LateralState } from './lateralStates.ts';
import { otherStates, seismicStates, windStates } from './lateralStates.ts';

/** Linear factors of one written alternative of a combination. */
export interface CombinationFactors {
  readonly D: number;
  readonly L: number;
  readonly Lr: number;
  readonly S: number;
  readonly W: number;
  readonly E: number;
  readonly H: number;
}

export interface FactoredCombination {
  /** as the engineer named it, or null */
  readonly name: string | null;
  /** the alternative written out: `1.2D + 1.0W + 1.0L + 0.5S` */
  readonly text: string;
  readonly factors: CombinationFactors;
  /** one of the load standard's own, not typed by the engineer */
  readonly standard: boolean;
}

export interface ExpandedCombination extends Expansion {
  /** factor on live load that may not take the reduced factor on L */
  readonly fullL: number;
  /** lateral actions that take part, with their factors (signs included) */
  readonly lateral: readonly { readonly action: number; readonly factor: number }[];
}

/**
 * Every sign, case and variant of every combination, in list order: combinations, then the states of W, E and H (engineering.md section 5).
 * W and E act both ways; a kind without a case counts 0. `eccentric` false: no accidental eccentricity (flexible basis).
 */
export function expandCombinations(
  combinations: readonly FactoredCombination[],
  actions: readonly LateralAction[],
  settings: ModelSettings,
  eccentric = true,
): { readonly expansions: readonly ExpandedCombination[]; readonly gravitySetCount: number } {
  const wind = windStates(actions, settings, eccentric);
  const seismic = seismicStates(actions, settings, eccentric);
  const other = otherStates(actions);
  const expansions: ExpandedCombination[] = [];
  const gravitySets = new Map<string, number>();
  const statesFor = { W: factoredStates(wind), E: factoredStates(seismic), H: factoredStates(other) };
  for (const combination of combinations) {
    const { D, L, Lr, S, W, E, H } = combination.factors;
    // live load that keeps its full value: the standard's reduced factor on L is not for it
    const fullL = combination.standard && L !== 0 ? Math.max(L, 1) : L;
    const key = [D, L, Lr, S, fullL].join(' ');
    const gravitySet = gravitySets.get(key) ?? gravitySets.size;
    gravitySets.set(key, gravitySet);
    for (const first of statesFor.W(W)) {
      for (const second of statesFor.E(E)) {
        for (const third of statesFor.H(H)) {
          const states = [first, second, third].filter((state) => state !== null);
          const labels = states.map((state) => state.label);
          expansions.push({
            name: nameOf(combination, labels),
            wind: W !== 0,
            seismic: E !== 0,
            factors: { D, L, Lr, S },
            fullL,
            gravitySet,
            // one and the same list wherever one state acts alone, so that its forces are added up once
            lateral: states.length === 1 && states[0] ? states[0].parts : states.flatMap((state) => state.parts),
          });
        }
      }
    }
  }
  return { expansions, gravitySetCount: gravitySets.size };
}

function nameOf(combination: FactoredCombination, labels: readonly string[]): string {
  const named = combination.name === null ? combination.text : `${combination.name}: ${combination.text}`;
  return labels.length === 0 ? named : `${named}; ${labels.join(', ')}`;
}

/** The states a term runs through, its factor applied, made once a factor; one empty state where the term is absent or has no case. */
function factoredStates(states: readonly LateralState[]): (factor: number) => readonly (LateralState | null)[] {
  const made = new Map<number, readonly LateralState[]>();
  return (factor) => {
    if (factor === 0 || states.length === 0) return [null];
    const known =
      made.get(factor) ??
      states.map((state) => ({
        label: state.label,
        parts: state.parts.map((part) => ({ action: part.action, factor: part.factor * factor })),
      }));
    made.set(factor, known);
    return known;
  };
}
