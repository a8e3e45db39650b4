import type { EngineAnswer, EngineOutcome, EngineRequest } from './engineMessages.ts';

/** The part of a worker that is used, so that tests can stand in for it. */
export interface EnginePort {
  onmessage: ((event: MessageEvent<EngineAnswer>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
  postMessage(request: EngineRequest): void;
}

/** Asks the worker and hands each answer to who asked. */
export class EngineClient {
  private readonly port: EnginePort;
  private readonly open = new Map<number, (outcome: EngineOutcome) => void>();
  private nextId = 1;

  constructor(port: EnginePort) {
    this.port = port;
    port.onmessage = ({ data }) => {
      this.open.get(data.id)?.(data.outcome);
      this.open.delete(data.id);
    };
    port.onerror = (event) => {
      for (const settle of this.open.values()) settle({ kind: 'failed', message: event.message });
      this.open.clear();
    };
  }

  run(input: EngineRequest['input'], options: EngineRequest['options']): Promise<EngineOutcome> {
    const id = this.nextId;
    this.nextId += 1;
    return new Promise((resolve) => {
      this.open.set(id, resolve);
      this.port.postMessage({ id, input, options });
    });
  }
}
