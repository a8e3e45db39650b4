import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { Settings } from '#shared/engineering/input';

/** Everything a workbook is made of. */
export interface WorkbookContent {
  readonly document: ResultDocument;
  readonly settings: Settings;
  readonly rows: readonly ScheduleResourceRow[];
  /** ISO time in UTC, or text that is printed as it is */
  readonly printedAt: string;
}
