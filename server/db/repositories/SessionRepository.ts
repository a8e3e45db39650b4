import { IsNull, type EntityManager } from 'typeorm';

import { Session } from '../entities/Session.ts';

export interface NewSession {
  readonly id: string;
  readonly hash: string;
  readonly personId: string;
  readonly createdAt: string;
  readonly expiresAt: string;
}

export class SessionRepository {
  constructor(private readonly manager: EntityManager) {}

  async add(session: NewSession): Promise<void> {
    await this.manager.insert(Session, { ...session, seenAt: session.createdAt, revokedAt: null });
  }

  /** The person behind a live session; null once it is revoked or has lapsed. */
  async personOf(hash: string, now: string): Promise<{ sessionId: string; personId: string } | null> {
    const session = await this.manager.findOneBy(Session, { hash, revokedAt: IsNull() });
    if (session === null || session.expiresAt <= now) return null;
    return { sessionId: session.id, personId: session.personId };
  }

  async revoke(id: string, now: string): Promise<void> {
    await this.manager.update(Session, { id, revokedAt: IsNull() }, { revokedAt: now });
  }
}
