import { availableParallelism } from 'node:os';

import { Piscina } from 'piscina';

import { HttpError } from '../http/HttpError.ts';

import { runTask, workbookTask } from './doTask.ts';
import type { RunAnswer, Runner } from './Runner.ts';

/** In this thread: for tests and for a server that runs from its sources. */
export function inlineRunner(): Runner {
  return {
    run: (task) => Promise.resolve().then(() => runTask(task)),
    workbook: workbookTask,
    close: () => Promise.resolve(),
  };
}

export interface PoolLimits {
  readonly threads: number;
  /** waiting computations beyond this many are turned away with 503 */
  readonly longestQueue: number;
  /** a computation that runs longer is stopped, and its thread with it */
  readonly longestRunSeconds: number;
  /** memory of one thread, so that a building beyond all measure ends its computation and not the server */
  readonly mostMegabytes: number;
}

/** Two at least: a long workbook must not stand in the way of a short check. */
const productionLimits = (): PoolLimits => ({
  threads: Math.max(2, availableParallelism() - 1),
  longestQueue: 64,
  longestRunSeconds: 120,
  mostMegabytes: 2048,
});

/** A run that was stopped for its time or memory, in our words. */
function stoppedRun(error: unknown): HttpError | null {
  const name = error instanceof Error ? error.name : '';
  const code = error instanceof Error && 'code' in error ? error.code : '';
  if (name !== 'AbortError' && name !== 'TimeoutError' && code !== 'ERR_WORKER_OUT_OF_MEMORY') return null;
  const message = 'The building takes more time or memory than a computation may; make it smaller.';
  return new HttpError(422, 'does-not-compute', message, {
    problems: [{ table: 'building', row: null, column: null, message }],
  });
}

/** In threads, so that one large building does not stop everybody else. */
export function pooledRunner(workerFile: string, limits: PoolLimits = productionLimits()): Runner {
  const pool = new Piscina({
    filename: workerFile,
    minThreads: 1,
    maxThreads: limits.threads,
    maxQueue: limits.longestQueue,
    idleTimeout: 600_000,
    resourceLimits: { maxOldGenerationSizeMb: limits.mostMegabytes },
  });
  const inPool = async <T>(task: unknown): Promise<T> => {
    if (pool.queueSize >= limits.longestQueue) {
      throw new HttpError(503, 'busy', 'Too many computations are waiting.', { retryAfterSeconds: 2 });
    }
    try {
      const answer: T = await pool.run(task, { signal: AbortSignal.timeout(limits.longestRunSeconds * 1000) });
      return answer;
    } catch (error) {
      throw stoppedRun(error) ?? error;
    }
  };
  return {
    run: (task) => inPool<RunAnswer>(task),
    workbook: (task) => inPool<Uint8Array>(task),
    close: () => pool.destroy(),
  };
}
