import type { Role } from '#shared/contracts/session';

export interface TestPerson {
  readonly key: TestKey;
  readonly role: Role;
  readonly office: 'ours' | 'theirs';
}

export type TestKey = 'admin' | 'engineer' | 'colleague' | 'checker' | 'drafter' | 'stranger';

/** One account a role in our office, a second engineer, and an engineer of another office. */
export const testPeople: readonly TestPerson[] = [
  { key: 'admin', role: 'admin', office: 'ours' },
  { key: 'engineer', role: 'engineer', office: 'ours' },
  { key: 'colleague', role: 'engineer', office: 'ours' },
  { key: 'checker', role: 'checker', office: 'ours' },
  { key: 'drafter', role: 'drafter', office: 'ours' },
  { key: 'stranger', role: 'engineer', office: 'theirs' },
];

export const testPassword = 'a password of the tests';
export const addressOf = (key: TestKey): string => `${key}@test.example`;
