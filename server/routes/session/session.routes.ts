import type { RequestHandler } from 'express';

import { signInSchema } from '#shared/contracts/session';

import type { SessionTokens } from '../../auth/SessionTokens.ts';
import type { ApiRouter } from '../../http/ApiRouter.ts';
import { csrf } from '../../http/csrf.ts';
import { validate } from '../../http/validate.ts';
import type { Services } from '../../services/Services.ts';
import { sessionOf } from '../../services/session/SessionService.ts';

export function sessionRoutes(
  api: ApiRouter,
  { session }: Services,
  tokens: SessionTokens,
  limiter: RequestHandler[],
): void {
  api.open(
    'POST',
    '/api/session',
    async ({ request, response }) => {
      const opened = await session.signIn(validate(signInSchema, request.body));
      tokens.set(response, opened.sessionKey);
      response.json(opened.session);
    },
    [csrf, ...limiter],
  );
  api.person('GET', '/api/session', async ({ response, signedIn }) => {
    response.json(sessionOf(signedIn.caller));
  });
  api.person('DELETE', '/api/session', async ({ response, signedIn }) => {
    await session.signOut(signedIn.sessionId);
    tokens.clear(response);
    response.status(204).end();
  });
}
