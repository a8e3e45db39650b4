import type { ResultRow } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { BuildingInput, Problem, Settings, Warning } from '#shared/engineering/input';
import type { DesignRow, PinnedBand } from '#shared/engineering/wall-design/designTypes';
import type { Acknowledged } from '#shared/result/warningFacts';

export interface RunTask {
  readonly kind: 'run';
  readonly input: BuildingInput;
  readonly pinned: readonly PinnedBand[];
  readonly acknowledged?: readonly Acknowledged[];
}

export interface WorkbookTask {
  readonly kind: 'workbook';
  /** result.json, gzip */
  readonly result: Uint8Array;
  readonly settings: Settings;
  readonly rows: readonly ScheduleResourceRow[];
  readonly printedAt: string;
}

/** What the server keeps of a run: the document as it is sent, and the schedule beside it. */
export interface Computed {
  readonly ok: true;
  /** result.json, gzip */
  readonly result: Uint8Array;
  readonly schedule: readonly ResultRow[];
  readonly rows: readonly DesignRow[];
  readonly warnings: readonly Warning[];
}

export type RunAnswer = Computed | { readonly ok: false; readonly problems: readonly Problem[] };

/** Where the chain and the workbook are computed: threads in production, in line in tests. */
export interface Runner {
  run(task: RunTask): Promise<RunAnswer>;
  workbook(task: WorkbookTask): Promise<Uint8Array>;
  close(): Promise<void>;
}
