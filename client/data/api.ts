import { errorBodySchema } from '#shared/contracts/errors';

import { ApiError } from './ApiError.ts';

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

export interface Sent {
  /** sent as JSON */
  readonly body?: unknown;
  /** sent as multipart; excludes `body` */
  readonly form?: FormData;
  readonly headers?: Readonly<Record<string, string>>;
  readonly signal?: AbortSignal;
}

async function toError(response: Response): Promise<ApiError> {
  let read: unknown;
  try {
    read = await response.json();
  } catch {
    read = null;
  }
  const parsed = errorBodySchema.safeParse(read);
  if (!parsed.success) return new ApiError('internal', response.status, `The server answered ${response.status}.`);
  const { code, message, problems, current } = parsed.data.error;
  return new ApiError(code, response.status, message, problems ?? [], current);
}

/** Asks the server; answers the resource or throws an ApiError. */
export async function api<T>(method: Method, path: string, sent: Sent = {}): Promise<T> {
  const headers: Record<string, string> = { Accept: 'application/json', ...sent.headers };
  if (method !== 'GET') headers['X-Requested-With'] = 'groundward';
  if (sent.body !== undefined) headers['Content-Type'] = 'application/json';
  const request: RequestInit = { method, headers, credentials: 'same-origin' };
  if (sent.form !== undefined) request.body = sent.form;
  else if (sent.body !== undefined) request.body = JSON.stringify(sent.body);
  if (sent.signal !== undefined) request.signal = sent.signal;
  let response: Response;
  try {
    response = await fetch(path, request);
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new ApiError('offline', 0, 'The server did not answer.');
  }
  if (!response.ok) throw await toError(response);
  if (response.status === 204) return undefined as T;
  return (await response.json()) as T;
}
