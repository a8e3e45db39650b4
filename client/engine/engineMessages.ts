import type { ResultDocument } from '#shared/contracts/result';
import type { BuildingInput, Problem } from '#shared/engineering/input';
import type { DesignRow, PinnedBand } from '#shared/engineering/wall-design/designTypes';
import type { Acknowledged } from '#shared/result/warningFacts';

/** What the page asks of its worker; functions do not cross, so the clock stays out of it. */
export interface EngineRequest {
  readonly id: number;
  readonly input: BuildingInput;
  readonly options: { readonly pinned: readonly PinnedBand[]; readonly acknowledged?: readonly Acknowledged[] };
}

export type EngineOutcome =
  | { readonly kind: 'computed'; readonly document: ResultDocument; readonly rows: readonly DesignRow[] }
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] }
  /** a newer question came before this one was begun */
  | { readonly kind: 'superseded' }
  /** the engine threw */
  | { readonly kind: 'failed'; readonly message: string };

export interface EngineAnswer {
  readonly id: number;
  readonly outcome: EngineOutcome;
}
