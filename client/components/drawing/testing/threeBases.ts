import type { ResultDocument } from '#shared/contracts/result';
import type { BuildingInput } from '#shared/engineering/input';
import { runBuilding } from '#shared/result/runBuilding';

import { sampleInput } from '../../../engine/testing/sampleBuilding.ts';

export const threeBasesInput: BuildingInput = {
  ...sampleInput,
  settings: { ...sampleInput.settings, basis: ['rigid', 'flexible', 'compatible'] },
};

function compute(): ResultDocument {
  const outcome = runBuilding(threeBasesInput);
  if (!outcome.ok) throw new Error(outcome.problems.map((problem) => problem.message).join('; '));
  return outcome.document;
}

/** The sample building under rigid, flexible and compatible. */
export const threeBases = compute();
