import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';

import { HttpError } from '../http/HttpError.ts';

export interface SignInLimit {
  readonly windowSeconds: number;
  /** failed attempts for one account from one address */
  readonly perAccount: number;
  /** failed attempts from one address, whatever the account */
  readonly perAddress: number;
}

export const productionSignInLimit: SignInLimit = { windowSeconds: 900, perAccount: 10, perAddress: 100 };

const address = (request: Request): string => ipKeyGenerator(request.ip ?? '');
const account = (request: Request): string => {
  const body = request.body as { email?: unknown } | undefined;
  return typeof body?.email === 'string' ? body.email.trim().toLowerCase().slice(0, 254) : '';
};

/** Failed sign-ins only: a signed-in office behind one address is never slowed down. */
export function signInLimiter(limit: SignInLimit): RequestHandler[] {
  const limiter = (most: number, key: (request: Request) => string): RequestHandler =>
    rateLimit({
      windowMs: limit.windowSeconds * 1000,
      limit: most,
      keyGenerator: key,
      skipSuccessfulRequests: true,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      handler: () => {
        throw new HttpError(429, 'too-many-requests', 'Too many failed sign-ins. Wait, then try again.', {
          retryAfterSeconds: limit.windowSeconds,
        });
      },
    });
  return [
    limiter(limit.perAddress, address),
    limiter(limit.perAccount, (request) => `${account(request)}|${address(request)}`),
  ];
}
