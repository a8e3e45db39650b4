import { afterEach, expect, it, vi } from 'vitest';

import { ApiError } from './ApiError.ts';
import { api } from './api.ts';

afterEach(() => {
  vi.unstubAllGlobals();
});

const answer = (response: Response) => vi.stubGlobal('fetch', vi.fn().mockResolvedValue(response));

async function failureOf(work: Promise<unknown>): Promise<ApiError> {
  const failure: unknown = await work.catch((error: unknown) => error);
  if (!(failure instanceof ApiError)) throw new Error('no ApiError was thrown');
  return failure;
}

it('throws code, problems and the stored value of a refusal', async () => {
  const problems = [{ table: 'levels', row: 2, column: 'height', message: 'height reads 0' }];
  const body = { error: { code: 'problems', message: 'refused', problems, current: { version: 4 } } };
  answer(new Response(JSON.stringify(body), { status: 422 }));
  const failure = await failureOf(api('PATCH', '/api/x', { body: {} }));
  expect(failure).toMatchObject({ code: 'problems', status: 422, problems, current: { version: 4 } });
});

it('calls an answer that is none of ours internal', async () => {
  answer(new Response('<html>', { status: 502 }));
  expect(await failureOf(api('GET', '/api/x'))).toMatchObject({ code: 'internal', status: 502 });
});

it('calls no answer offline', async () => {
  vi.stubGlobal('fetch', vi.fn().mockRejectedValue(new TypeError('failed')));
  expect(await failureOf(api('GET', '/api/x'))).toMatchObject({ code: 'offline' });
});

it('answers nothing for 204', async () => {
  answer(new Response(null, { status: 204 }));
  expect(await api('DELETE', '/api/session')).toBeUndefined();
});
