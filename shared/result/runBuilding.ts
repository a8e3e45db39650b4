import type { ResultDocument } from '../contracts/result.ts';
import type { BuildingInput, Problem } from '../engineering/input.ts';
import type { DesignRow, PinnedBand } from '../engineering/wall-design/designTypes.ts';

export interface RunOptions {
  /** milliseconds of any steady clock; without it `timing` reads 0 */
  readonly now?: () => number;
  /** every expanded combination in `actions`, not only those that govern */
  readonly allActions?: boolean;
  /** stories that carry an engineer's own cells */
  readonly pinned?: readonly PinnedBand[];
}

export type RunOutcome =
  | {
      readonly ok: true;
      readonly document: ResultDocument;
      /** the rows behind `document.schedule`, in the same order, with what automatic choice says beside what stands */
      readonly rows: readonly DesignRow[];
    }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** The whole chain from what was typed to the result document: the one entry of command, server and page. */
export function runBuilding(_input: BuildingInput, _options: RunOptions = {}): RunOutcome {
  throw new Error('the chain is being built');
}
