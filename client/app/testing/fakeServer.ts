import { vi } from 'vitest';

export interface Asked {
  readonly method: string;
  readonly path: string;
  readonly body: unknown;
  readonly headers: Headers;
}

export interface Answer {
  readonly status?: number;
  readonly body?: unknown;
  /** the answer comes once this is over */
  readonly after?: Promise<unknown>;
}

export type Answers = Readonly<Record<string, Answer | ((asked: Asked) => Answer)>>;

export interface FakeServer {
  readonly asked: Asked[];
  /** requests of one kind, for example `PATCH /api/buildings/b1/levels` */
  readonly of: (route: string) => readonly Asked[];
}

/** Answers of the API by `METHOD path`; anything else is 404. Page tests run against it instead of a server. */
export function fakeServer(answers: Answers): FakeServer {
  const asked: Asked[] = [];
  vi.stubGlobal('fetch', (path: string, sent: RequestInit = {}) => {
    const method = sent.method ?? 'GET';
    const body: unknown = typeof sent.body === 'string' ? JSON.parse(sent.body) : sent.body;
    const one: Asked = { method, path, body, headers: new Headers(sent.headers) };
    asked.push(one);
    const known = answers[`${method} ${path}`];
    const answer = typeof known === 'function' ? known(one) : (known ?? refusal(404, 'not-found'));
    const status = answer.status ?? 200;
    return Promise.resolve(answer.after).then(
      () =>
        new Response(status === 204 ? null : JSON.stringify(answer.body), {
          status,
          headers: { 'Content-Type': 'application/json' },
        }),
    );
  });
  return { asked, of: (route) => asked.filter((one) => `${one.method} ${one.path}` === route) };
}

export const refusal = (status: number, code: string, rest: Readonly<Record<string, unknown>> = {}): Answer => ({
  status,
  body: { error: { code, message: '', ...rest } },
});
