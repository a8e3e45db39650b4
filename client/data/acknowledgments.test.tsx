import { QueryClientProvider } from '@tanstack/react-query';
import { renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { expect, it } from 'vitest';

import { fakeServer, refusal } from '../app/testing/fakeServer.ts';
import { useAcknowledge } from './mutations.ts';
import { useAcknowledgments } from './queries.ts';
import { makeQueryClient } from './queryClient.ts';

const row = {
  id: 'k1',
  code: 'opening-solid',
  level: 'L2',
  wall: 'A',
  reason: 'piers designed apart',
  factsHash: '0'.repeat(32),
  by: { id: 'p1', name: 'R. Vane' },
  at: '2026-11-30T09:00:00.000Z',
  stands: true,
};
const address = '/api/buildings/b1/acknowledgments';
function wrapper() {
  const client = makeQueryClient();
  return ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  );
}

it('lists what is settled and asks again once one is added', async () => {
  let rows: readonly object[] = [];
  const server = fakeServer({
    [`GET ${address}`]: () => ({ body: { rows, seq: 7 } }),
    [`POST ${address}`]: () => {
      rows = [row];
      return { status: 201, body: row };
    },
  });
  const useBoth = () => ({ list: useAcknowledgments('b1'), settle: useAcknowledge('b1') });
  const { result } = renderHook(useBoth, { wrapper: wrapper() });
  await waitFor(() => expect(result.current.list.data?.rows).toEqual([]));
  result.current.settle.mutate({ code: 'opening-solid', level: 'L2', wall: 'A', reason: 'piers designed apart' });
  await waitFor(() => expect(result.current.list.data?.rows).toEqual([row]));
  expect(server.of(`POST ${address}`)[0]?.body).toEqual({
    code: 'opening-solid',
    level: 'L2',
    wall: 'A',
    reason: 'piers designed apart',
  });
});

it('passes on why a warning can not be settled', async () => {
  fakeServer({ [`POST ${address}`]: refusal(409, 'no-such-warning') });
  const { result } = renderHook(() => useAcknowledge('b1'), { wrapper: wrapper() });
  result.current.mutate({ code: 'core', reason: 'modeled apart' });
  await waitFor(() => expect(result.current.error?.code).toBe('no-such-warning'));
});
