import { runTask, workbookTask } from './doTask.ts';
import type { RunAnswer, RunTask, WorkbookTask } from './Runner.ts';

/** Entry of a pool thread. */
export default function work(task: RunTask | WorkbookTask): RunAnswer | Promise<Uint8Array> {
  return task.kind === 'run' ? runTask(task) : workbookTask(task);
}
