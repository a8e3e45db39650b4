import type { Request } from 'express';

import type { BuildingRecord } from '../db/repositories/BuildingRepository.ts';
import type { Caller } from '../db/repositories/PersonRepository.ts';
import type { Gate } from '../db/gate.ts';
import type { Store } from '../db/Store.ts';

import type { SessionTokens } from './SessionTokens.ts';

export interface PersonAccess {
  readonly sessionId: string;
  readonly caller: Caller;
}
export interface BuildingAccess extends PersonAccess {
  readonly building: BuildingRecord | null;
}

const idPattern = /^[0-9a-f-]{36}$/;

/** Who asks, read from the database in every request, so that sign-out and a change of role act at once. */
export class Access {
  constructor(
    private readonly gate: Gate,
    private readonly tokens: SessionTokens,
    private readonly now: () => string,
  ) {}

  person(request: Request): Promise<PersonAccess | null> {
    const hash = this.tokens.hashOf(request);
    if (hash === null) return Promise.resolve(null);
    return this.gate.read((store) => this.find(store, hash));
  }

  building(request: Request, buildingId: string): Promise<BuildingAccess | null> {
    const hash = this.tokens.hashOf(request);
    if (hash === null) return Promise.resolve(null);
    return this.gate.read(async (store) => {
      const person = await this.find(store, hash);
      if (person === null) return null;
      // no id of ours looks otherwise, and some texts are more than a database takes
      const known = idPattern.test(buildingId);
      return { ...person, building: known ? await store.buildings.of(person.caller).find(buildingId) : null };
    });
  }

  private async find(store: Store, hash: string): Promise<PersonAccess | null> {
    const session = await store.sessions.personOf(hash, this.now());
    if (session === null) return null;
    const caller = await store.people.caller(session.personId);
    return caller === null ? null : { sessionId: session.sessionId, caller };
  }
}
