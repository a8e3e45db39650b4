import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { Settings } from '#shared/engineering/input';

/** Everything a workbook is made of. */
export interface WorkbookContent {
  readonly document: ResultDocument;
  readonly settings: Settings;
  readonly rows: readonly ScheduleResourceRow[];
  /** as it is to be printed, for example `2026-03-04 15:20 UTC` */
  readonly printedAt: string;
}
