import type { ForceRow, LoadKind, Settings } from '#shared/engineering/input';
import {
  otherStates,
  seismicStates,
  windStates,
  type StateAction,
} from '#shared/engineering/combinations/lateralStates';
import { defaultCombinations } from '#shared/combination-text/defaultCombinations';
import { parseCombination } from '#shared/combination-text/parseCombination';

export interface LateralCase {
  readonly name: string;
  readonly kind: LoadKind;
  /** that of the larger total force */
  readonly direction: 'x' | 'y';
}

export interface CountedCombination {
  readonly name: string;
  readonly expression: string;
  /** with every alternative, case, sense of eccentricity and sign */
  readonly count: number;
}

type Criteria = Pick<
  Settings,
  'loads' | 'liveFactor' | 'sds' | 'rho' | 'omega0' | 'accidental' | 'windCases' | 'orthogonal'
>;

/** The cases as the engine's expansion sees them: seismic ones at +e and -e, wind cases with their torque. */
function stateActions(cases: readonly LateralCase[], criteria: Criteria): StateAction[] {
  return cases.flatMap(({ name, kind, direction }, caseIndex) => {
    const variants: StateAction['variant'][] =
      kind === 'seismic' && criteria.accidental > 0
        ? ['0', '+', '-']
        : kind === 'wind' && criteria.windCases
          ? ['0', 'torsion']
          : ['0'];
    return variants.map((variant) => ({ caseIndex, case: name, kind, direction, variant }));
  });
}

/** The load standard's combinations, which stand as long as a building brings none of its own, with the engine's own count of states. */
export function countedCombinations(criteria: Criteria, cases: readonly LateralCase[]): readonly CountedCombination[] {
  const constants = { SDS: criteria.sds, rho: criteria.rho, Omega0: criteria.omega0 };
  const actions = stateActions(cases, criteria);
  const settings = { ...criteria, strengthFactor: { wind: 1, seismic: 1 } };
  const states = {
    W: Math.max(1, windStates(actions, settings, true).length),
    E: Math.max(1, seismicStates(actions, settings, true).length),
    H: Math.max(1, otherStates(actions).length),
  };
  return defaultCombinations(criteria.loads, criteria.liveFactor).map(({ name, expression }) => {
    const reading = parseCombination(expression, constants);
    const alternatives = reading.ok ? reading.alternatives : [];
    const count = alternatives.reduce((sum, { factors }) => {
      const ways = (['W', 'E', 'H'] as const).filter((symbol) => factors[symbol] !== 0);
      return sum + ways.reduce((product, symbol) => product * states[symbol], 1);
    }, 0);
    return { name, expression, count };
  });
}

/** Each lateral case of the forces once, with its kind and direction. */
export function lateralCases(forces: readonly Pick<ForceRow, 'case' | 'kind' | 'fx' | 'fy'>[]): readonly LateralCase[] {
  const sums = new Map<string, { kind: LoadKind; fx: number; fy: number }>();
  for (const row of forces) {
    const sum = sums.get(row.case) ?? { kind: row.kind, fx: 0, fy: 0 };
    sum.fx += row.fx;
    sum.fy += row.fy;
    sums.set(row.case, sum);
  }
  return [...sums].map(([name, { kind, fx, fy }]) => ({
    name,
    kind,
    direction: Math.abs(fy) > Math.abs(fx) ? 'y' : 'x',
  }));
}
