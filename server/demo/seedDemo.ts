import { roles, type Role } from '#shared/contracts/session';

import type { PasswordHasher } from '../auth/PasswordHasher.ts';
import type { Context } from '../services/Context.ts';

const names: Readonly<Record<Role, string>> = {
  admin: 'Demo admin',
  engineer: 'Demo engineer',
  checker: 'Demo checker',
  drafter: 'Demo drafter',
};

/** The demo office with one account a role, in an empty database only. Gives the engineer's id, or null where nothing was done. */
export async function seedDemo(context: Context, hasher: PasswordHasher, password: string): Promise<string | null> {
  const { gate, newId } = context;
  if ((await gate.read((store) => store.people.officeCount())) > 0) return null;
  const people = await Promise.all(
    roles.map(async (role) => ({ id: newId(), role, passwordHash: await hasher.hash(password) })),
  );
  const officeId = newId();
  await gate.write(async (store) => {
    await store.people.addOffice(officeId, 'Demo office');
    for (const { id, role, passwordHash } of people) {
      await store.people.add({ id, officeId, email: `${role}@demo.example`, name: names[role], role, passwordHash });
    }
  });
  return people.find((person) => person.role === 'engineer')?.id ?? null;
}
