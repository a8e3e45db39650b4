import type { EngineAnswer, EngineOutcome, EngineRequest } from './engineMessages.ts';

export interface EngineQueue {
  readonly take: (request: EngineRequest) => void;
}

/**
 * Keeps the newest question only: what waits when a newer one comes is answered as superseded. `later` lets the messages that
 * have already arrived in before the work begins.
 */
export function engineQueue(
  compute: (request: EngineRequest) => EngineOutcome,
  answer: (answer: EngineAnswer) => void,
  later: (work: () => void) => void,
): EngineQueue {
  let waiting: EngineRequest | null = null;
  const work = (): void => {
    const request = waiting;
    waiting = null;
    if (request) answer({ id: request.id, outcome: compute(request) });
  };
  return {
    take: (request) => {
      if (waiting) answer({ id: waiting.id, outcome: { kind: 'superseded' } });
      else later(work);
      waiting = request;
    },
  };
}
