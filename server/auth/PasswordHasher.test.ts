import { describe, expect, it } from 'vitest';

import { PasswordHasher } from './PasswordHasher.ts';

const hasher = new PasswordHasher({ memoryKib: 1024, passes: 1 });

describe('PasswordHasher', () => {
  it('knows the password of a hash, made by argon2id at the cost asked for', async () => {
    const hash = await hasher.hash('some words');
    expect(hash).toMatch(/^\$argon2id\$v=19\$m=1024,(t=1,p=1|p=1,t=1)\$/);
    expect(await hasher.verify(hash, 'some words')).toBe(true);
    expect(await hasher.verify(hash, 'other words')).toBe(false);
  });

  it('lets nobody in without a hash, not even with the words of the stand-in', async () => {
    expect(await hasher.verify(null, 'nobody has this one')).toBe(false);
  });
});
