import { randomBytes } from 'node:crypto';

import type { Session, SignIn } from '#shared/contracts/session';

import type { PasswordHasher } from '../../auth/PasswordHasher.ts';
import { SessionTokens } from '../../auth/SessionTokens.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';

export const sessionOf = (caller: Caller): Session => ({
  person: { id: caller.id, name: caller.name, email: caller.email, role: caller.role },
  office: caller.office,
});

export class SessionService {
  constructor(
    private readonly context: Context,
    private readonly hasher: PasswordHasher,
  ) {}

  /** A new random id at every sign-in; the same refusal, after the same work, for unknown addresses and wrong passwords. */
  async signIn({ email, password }: SignIn): Promise<{ sessionKey: string; session: Session }> {
    const { gate, now, newId } = this.context;
    const known = await gate.read((store) => store.people.credentials(email));
    const stands = await this.hasher.verify(known?.passwordHash ?? null, password);
    const sessionKey = randomBytes(32).toString('base64url');
    const caller =
      known === null || !stands
        ? null
        : await gate.write(async (store) => {
            const person = await store.people.caller(known.id);
            if (person === null) return null;
            const createdAt = now();
            await store.sessions.add({
              id: newId(),
              hash: SessionTokens.hash(sessionKey),
              personId: person.id,
              createdAt,
              expiresAt: SessionTokens.expiry(createdAt),
            });
            return person;
          });
    if (caller === null) {
      throw new HttpError(401, 'wrong-credentials', 'Address and password do not fit an account of this office.');
    }
    return { sessionKey, session: sessionOf(caller) };
  }

  async signOut(sessionId: string): Promise<void> {
    await this.context.gate.write((store) => store.sessions.revoke(sessionId, this.context.now()));
  }
}
