import { createHash } from 'node:crypto';

import type { CookieOptions, Request, Response } from 'express';
import jwt from 'jsonwebtoken';

const sessionDays = 14;

/** The cookie: a signed token that carries a session's random id and nothing else. */
export class SessionTokens {
  readonly cookieName: string;

  constructor(
    private readonly secret: string,
    private readonly overTls: boolean,
  ) {
    this.cookieName = overTls ? '__Host-groundward' : 'groundward';
  }

  static hash(sessionKey: string): string {
    return createHash('sha256').update(sessionKey).digest('hex');
  }

  /** ISO text of the moment a session opened at `now` lapses. */
  static expiry(now: string): string {
    return new Date(Date.parse(now) + sessionDays * 86_400_000).toISOString();
  }

  /** Null for a missing, foreign or altered cookie. */
  hashOf(request: Request): string | null {
    const cookies = request.cookies as Readonly<Record<string, unknown>> | undefined;
    const token = cookies?.[this.cookieName];
    if (typeof token !== 'string') return null;
    try {
      const payload = jwt.verify(token, this.secret, { algorithms: ['HS256'], ignoreExpiration: true });
      if (typeof payload === 'string' || typeof payload.sid !== 'string') return null;
      return SessionTokens.hash(payload.sid);
    } catch {
      return null;
    }
  }

  set(response: Response, sessionKey: string): void {
    const token = jwt.sign({ sid: sessionKey }, this.secret, { algorithm: 'HS256' });
    response.cookie(this.cookieName, token, { ...this.options(), maxAge: sessionDays * 86_400_000 });
  }

  clear(response: Response): void {
    response.clearCookie(this.cookieName, this.options());
  }

  private options(): CookieOptions {
    return { httpOnly: true, sameSite: 'lax', secure: this.overTls, path: '/' };
  }
}
