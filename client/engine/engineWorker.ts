import { computeRequest } from './computeRequest.ts';
import type { EngineRequest } from './engineMessages.ts';
import { engineQueue } from './engineQueue.ts';

const queue = engineQueue(
  computeRequest,
  (answer) => self.postMessage(answer),
  (work) => setTimeout(work, 0),
);

self.onmessage = (event: MessageEvent<EngineRequest>) => queue.take(event.data);
