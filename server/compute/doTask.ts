import { gunzipSync, gzipSync } from 'node:zlib';

import type { ResultDocument } from '#shared/contracts/result';
import { runBuilding } from '#shared/result/runBuilding';

import type { RunAnswer, RunTask, WorkbookTask } from './Runner.ts';

/** The whole chain on one building; runs in a pool thread, or in line. */
export function runTask({ input, pinned, acknowledged = [] }: RunTask): RunAnswer {
  const outcome = runBuilding(input, { pinned, acknowledged, now: () => performance.now() });
  if (!outcome.ok) return { ok: false, problems: outcome.problems };
  const result = gzipSync(JSON.stringify(outcome.document), { level: 4 });
  const { schedule, warnings } = outcome.document;
  return { ok: true, result: new Uint8Array(result), schedule, rows: outcome.rows, warnings };
}

/** The workbook library takes most of a second to load, so it is loaded where and when it is needed. */
export async function workbookTask({ result, settings, rows, printedAt }: WorkbookTask): Promise<Uint8Array> {
  const { writeWorkbook } = await import('../workbook/writeWorkbook.ts');
  const document = JSON.parse(gunzipSync(result).toString('utf8')) as ResultDocument;
  return new Uint8Array(await writeWorkbook({ document, settings, rows, printedAt }));
}
