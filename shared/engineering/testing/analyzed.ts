import type { BuildingInput } from '../input.ts';
import { chain } from '../stages.ts';
import type { Analysis, WallOutcome } from '../stages.ts';
import type { FactoredCombination } from '../combinations/expandCombinations.ts';

/** The chain on a hand-made building, for tests that look at its analysis; problems throw. */
export function analyzed(
  building: BuildingInput,
  combinations: readonly FactoredCombination[] = [],
): { readonly analysis: Analysis; readonly walls: readonly WallOutcome[] } {
  const stages = chain({ building, combinations, pinned: [] });
  let step = stages.next();
  while (step.done !== true) step = stages.next();
  if (!step.value.ok) throw new Error(step.value.problems.map(({ message }) => message).join('; '));
  return step.value;
}
