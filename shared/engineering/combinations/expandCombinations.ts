import type { LateralAction } from '../distribution/lateralActions.ts';
import type { Expansion } from '../wall-design/designTypes.ts';

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
}

export interface ExpandedCombination extends Expansion {
  /** lateral actions that take part, with their factors (signs included) */
  readonly lateral: readonly { readonly action: number; readonly factor: number }[];
}

interface LateralState {
  readonly label: string;
  readonly parts: readonly { readonly action: number; readonly factor: number }[];
}

/**
 * Every sign, case and variant of every combination, in list order: combinations, then cases as they stand in forces.csv, then
 * variants, then signs (engineering.md section 5). W and E act both ways; a seismic case with accidental eccentricity enters as
 * + and - only; each `other` case in turn is H with its own sign; a kind without a case counts 0.
 */
export function expandCombinations(
  combinations: readonly FactoredCombination[],
  actions: readonly LateralAction[],
): { readonly expansions: readonly ExpandedCombination[]; readonly gravitySetCount: number } {
  const wind = bothWays(actions, 'wind');
  const seismic = bothWays(actions, 'seismic');
  const other = actions.flatMap((action, index) =>
    action.kind === 'other' ? [{ label: `H = ${action.case}`, parts: [{ action: index, factor: 1 }] }] : [],
  );
  const expansions: ExpandedCombination[] = [];
  const gravitySets = new Map<string, number>();
  for (const combination of combinations) {
    const { D, L, Lr, S, W, E, H } = combination.factors;
    const key = [D, L, Lr, S].join(' ');
    const gravitySet = gravitySets.get(key) ?? gravitySets.size;
    gravitySets.set(key, gravitySet);
    for (const first of statesOf(W, wind)) {
      for (const second of statesOf(E, seismic)) {
        for (const third of statesOf(H, other)) {
          const states = [first, second, third].filter((state) => state !== null);
          const labels = states.map((state) => state.label);
          expansions.push({
            name: nameOf(combination, labels),
            wind: W !== 0,
            seismic: E !== 0,
            factors: { D, L, Lr, S },
            gravitySet,
            lateral: states.flatMap((state) => state.parts),
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

/** The states a term runs through, its factor applied; one empty state where the term is absent or has no case. */
function statesOf(factor: number, states: readonly LateralState[]): (LateralState | null)[] {
  if (factor === 0 || states.length === 0) return [null];
  return states.map((state) => ({
    label: state.label,
    parts: state.parts.map((part) => ({ action: part.action, factor: part.factor * factor })),
  }));
}

function bothWays(actions: readonly LateralAction[], kind: 'wind' | 'seismic'): LateralState[] {
  const symbol = kind === 'wind' ? 'W' : 'E';
  return actions.flatMap((action, index) => {
    if (action.kind !== kind) return [];
    const hasSenses = actions.some((other) => other.caseIndex === action.caseIndex && other.variant !== '0');
    if (hasSenses && action.variant === '0') return [];
    const at = action.variant === '0' ? '' : ` at ${action.variant === '+' ? '+' : '−'}e`;
    return [
      { label: `${symbol} = +${action.case}${at}`, parts: [{ action: index, factor: 1 }] },
      { label: `${symbol} = −${action.case}${at}`, parts: [{ action: index, factor: -1 }] },
    ];
  });
}
