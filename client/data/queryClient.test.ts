import { describe, expect, it } from 'vitest';

import { ApiError } from './ApiError.ts';
import { keys } from './keys.ts';
import { makeQueryClient } from './queryClient.ts';

const refuse = (code: 'no-session' | 'forbidden', status: number) => () =>
  Promise.reject(new ApiError(code, status, 'no'));

describe('makeQueryClient', () => {
  it('forgets who is there when an answer says that the session has ended', async () => {
    const client = makeQueryClient();
    client.setQueryData(keys.session, { person: 'somebody' });
    await client.fetchQuery({ queryKey: keys.buildings, queryFn: refuse('forbidden', 403) }).catch(() => null);
    expect(client.getQueryData(keys.session)).toBeDefined();
    await client.fetchQuery({ queryKey: keys.buildings, queryFn: refuse('no-session', 401) }).catch(() => null);
    expect(client.getQueryData(keys.session)).toBeUndefined();
  });

  it('keeps to the answer of the question who is there', async () => {
    const client = makeQueryClient();
    await client.fetchQuery({ queryKey: keys.session, queryFn: refuse('no-session', 401) }).catch(() => null);
    expect(client.getQueryState(keys.session)?.status).toBe('error');
  });
});
