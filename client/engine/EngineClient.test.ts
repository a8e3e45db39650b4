import { expect, it } from 'vitest';

import { EngineClient, type EnginePort } from './EngineClient.ts';
import type { EngineRequest } from './engineMessages.ts';
import { sampleInput } from './testing/sampleBuilding.ts';

function port(): EnginePort & { sent: EngineRequest[] } {
  const sent: EngineRequest[] = [];
  return { sent, onmessage: null, onerror: null, postMessage: (request) => sent.push(request) };
}

it('hands each answer to who asked, whatever their order', async () => {
  const stand = port();
  const client = new EngineClient(stand);
  const first = client.run(sampleInput, { pinned: [] });
  const second = client.run(sampleInput, { pinned: [] });
  const [a, b] = stand.sent;
  stand.onmessage?.(
    new MessageEvent('message', { data: { id: b?.id ?? 0, outcome: { kind: 'failed', message: 'b' } } }),
  );
  stand.onmessage?.(new MessageEvent('message', { data: { id: a?.id ?? 0, outcome: { kind: 'superseded' } } }));
  expect(await first).toEqual({ kind: 'superseded' });
  expect(await second).toEqual({ kind: 'failed', message: 'b' });
});

it('answers all that is open when the worker breaks', async () => {
  const stand = port();
  const answer = new EngineClient(stand).run(sampleInput, { pinned: [] });
  stand.onerror?.(new ErrorEvent('error', { message: 'no such file' }));
  expect(await answer).toEqual({ kind: 'failed', message: 'no such file' });
});
