import { describe, expect, it } from 'vitest';

import { newId } from './newId.ts';

describe('newId', () => {
  it('writes the time, the version and the variant where RFC 9562 wants them', () => {
    // 2026-12-01T00:00:00Z = 1796083200000 ms = 0x01a22fc70400... counted by hand: 1796083200000 in hex
    const milliseconds = 1_796_083_200_000;
    const id = newId(milliseconds, new Uint8Array(10).fill(0xff));
    expect(id.replaceAll('-', '').slice(0, 12)).toBe(milliseconds.toString(16).padStart(12, '0'));
    expect(id.slice(13)).toBe('-7fff-bfff-ffffffffffff'.slice(0));
  });

  it('sorts by time and does not repeat', () => {
    const ids = Array.from({ length: 1000 }, (_, place) => newId(1_800_000_000_000 + place));
    expect([...ids].sort()).toEqual(ids);
    expect(new Set(Array.from({ length: 1000 }, () => newId())).size).toBe(1000);
  });
});
