import type { Settings } from '#shared/engineering/input';
import { defaultCombinations } from '#shared/combination-text/defaultCombinations';
import { parseCombination, type CombinationAlternative } from '#shared/combination-text/parseCombination';

export interface LateralCase {
  readonly name: string;
  readonly kind: string;
}

export interface CountedCombination {
  readonly name: string;
  readonly expression: string;
  /** with every alternative, case, sense of eccentricity and sign */
  readonly count: number;
}

type Criteria = Pick<Settings, 'loads' | 'liveFactor' | 'sds' | 'rho' | 'omega0' | 'accidental'>;

/**
 * How many states one alternative runs through: W and E act both ways, a seismic case with accidental eccentricity at +e and at -e,
 * each other case in turn as H; a kind without a case counts once, as 0 (engineering.md section 5).
 */
function statesOf({ factors }: CombinationAlternative, cases: readonly LateralCase[], accidental: number): number {
  const of = (kind: string): number => cases.filter((one) => one.kind === kind).length;
  const wind = factors.W === 0 ? 1 : Math.max(1, 2 * of('wind'));
  const seismic = factors.E === 0 ? 1 : Math.max(1, 2 * (accidental > 0 ? 2 : 1) * of('seismic'));
  const other = factors.H === 0 ? 1 : Math.max(1, of('other'));
  return wind * seismic * other;
}

/** The load standard's combinations, which stand as long as a building brings none of its own. */
export function countedCombinations(criteria: Criteria, cases: readonly LateralCase[]): readonly CountedCombination[] {
  const constants = { SDS: criteria.sds, rho: criteria.rho, Omega0: criteria.omega0 };
  return defaultCombinations(criteria.loads, criteria.liveFactor).map(({ name, expression }) => {
    const reading = parseCombination(expression, constants);
    const alternatives = reading.ok ? reading.alternatives : [];
    const count = alternatives.reduce((sum, one) => sum + statesOf(one, cases, criteria.accidental), 0);
    return { name, expression, count };
  });
}

/** Each lateral case of the forces once, with its kind. */
export function lateralCases(
  forces: readonly { readonly case: string; readonly kind: string }[],
): readonly LateralCase[] {
  return [...new Map(forces.map((row) => [row.case, { name: row.case, kind: row.kind }])).values()];
}
