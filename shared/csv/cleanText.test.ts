import { describe, expect, it } from 'vitest';

import { cleanText } from './cleanText.ts';

describe('cleanText', () => {
  it.each([
    ['  L1 ', 'L1'],
    ['Roof\n deck', 'Roof deck'],
    ['a\t\tb', 'a b'],
    ['two  spaces', 'two  spaces'],
    ['E\u0301tage', '\u00c9tage'],
    ['', ''],
  ])('%j is stored as %j', (typed, stored) => {
    expect(cleanText(typed)).toBe(stored);
  });

  it.each(['a\u0001b', 'a\u0000', 'a\ud800b', 'a\uffffb', 'x\u008dy'])('refuses %j', (typed) => {
    expect(cleanText(typed)).toBeNull();
  });
});
