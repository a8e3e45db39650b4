import { runBuilding } from '#shared/result/runBuilding';

import type { EngineOutcome, EngineRequest } from './engineMessages.ts';

/** The whole chain on the page, as the server runs it. */
export function computeRequest({ input, options }: Pick<EngineRequest, 'input' | 'options'>): EngineOutcome {
  try {
    const outcome = runBuilding(input, options);
    if (!outcome.ok) return { kind: 'refused', problems: outcome.problems };
    return { kind: 'computed', document: outcome.document, rows: outcome.rows };
  } catch (error) {
    return { kind: 'failed', message: error instanceof Error ? error.message : 'the engine stopped' };
  }
}
