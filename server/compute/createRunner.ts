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
}

/** Two at least: a long workbook must not stand in the way of a short check. */
const productionLimits = (): PoolLimits => ({ threads: Math.max(2, availableParallelism() - 1), longestQueue: 64 });

/** In threads, so that one large building does not stop everybody else. */
export function pooledRunner(workerFile: string, limits: PoolLimits = productionLimits()): Runner {
  const pool = new Piscina({
    filename: workerFile,
    minThreads: 1,
    maxThreads: limits.threads,
    maxQueue: limits.longestQueue,
    idleTimeout: 600_000,
  });
  const inPool = async <T>(task: unknown): Promise<T> => {
    if (pool.queueSize >= limits.longestQueue) {
      throw new HttpError(503, 'busy', 'Too many computations are waiting.', { retryAfterSeconds: 2 });
    }
    const answer: T = await pool.run(task);
    return answer;
  };
  return {
    run: (task) => inPool<RunAnswer>(task),
    workbook: (task) => inPool<Uint8Array>(task),
    close: () => pool.destroy(),
  };
}
