import type { EntityManager } from 'typeorm';

import type { Role } from '#shared/contracts/session';

import { Office } from '../entities/Office.ts';
import { Person } from '../entities/Person.ts';

/** Who asks, with the office; the scope of every repository that could show something of another office. */
export interface Caller {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly office: { readonly id: string; readonly name: string };
}

export interface NewPerson {
  readonly id: string;
  readonly officeId: string;
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly passwordHash: string;
}

export class PersonRepository {
  constructor(private readonly manager: EntityManager) {}

  /** The hash to compare with; null for unknown, inactive and not yet invited people alike. */
  async credentials(email: string): Promise<{ id: string; passwordHash: string } | null> {
    const person = await this.manager.findOneBy(Person, { email, active: true });
    return person?.passwordHash ? { id: person.id, passwordHash: person.passwordHash } : null;
  }

  async caller(id: string): Promise<Caller | null> {
    const person = await this.manager.findOneBy(Person, { id, active: true });
    if (person === null) return null;
    const office = await this.manager.findOneByOrFail(Office, { id: person.officeId });
    return {
      id: person.id,
      name: person.name,
      email: person.email,
      role: person.role as Role,
      office: { id: office.id, name: office.name },
    };
  }

  async officeCount(): Promise<number> {
    return this.manager.count(Office);
  }

  async addOffice(id: string, name: string): Promise<void> {
    await this.manager.insert(Office, { id, name, standards: {}, version: 1 });
  }

  async add(person: NewPerson): Promise<void> {
    await this.manager.insert(Person, { ...person, active: true, version: 1 });
  }

  async setRole(id: string, role: Role): Promise<void> {
    await this.manager.update(Person, { id }, { role });
  }
}
