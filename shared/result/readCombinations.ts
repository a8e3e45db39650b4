import { placedMessage } from '../combination-text/checkExpression.ts';
import { defaultCombinations } from '../combination-text/defaultCombinations.ts';
import { parseCombination } from '../combination-text/parseCombination.ts';
import type { FactoredCombination } from '../engineering/combinations/expandCombinations.ts';
import type { BuildingInput, Problem } from '../engineering/input.ts';

export interface CombinationSet {
  readonly combinations: readonly FactoredCombination[];
  /** loads with a factor that no table brings in: R, F, T */
  readonly zeroLoads: readonly string[];
}

/**
 * The combinations of a building: those typed, else the standard's strength combinations. Problems carry the row and the place
 * in the text.
 */
export function readCombinations(building: BuildingInput): CombinationSet | { readonly problems: readonly Problem[] } {
  const { settings, tables } = building;
  const typed = tables.combinations.length > 0;
  const list = typed ? tables.combinations : defaultCombinations(settings.loads, settings.liveFactor);
  const constants = { SDS: settings.sds, rho: settings.rho, Omega0: settings.omega0 };
  const combinations: FactoredCombination[] = [];
  const problems: Problem[] = [];
  const zeroLoads = new Set<string>();
  list.forEach((row, index) => {
    const reading = parseCombination(row.expression, constants);
    if (!reading.ok) {
      problems.push({
        table: 'combinations',
        row: index + 1,
        column: 'expression',
        message: placedMessage(reading.message, reading.position, row.expression),
      });
      return;
    }
    for (const { text, factors } of reading.alternatives) {
      combinations.push({ name: row.name, text, factors, standard: !typed });
      for (const load of ['R', 'F', 'T'] as const) if (factors[load] !== 0) zeroLoads.add(load);
    }
  });
  return problems.length > 0 ? { problems } : { combinations, zeroLoads: [...zeroLoads] };
}
