import { expect, it } from 'vitest';

import { carriedSearch } from './useChoice.ts';

it('carries story, wall, case and variant, and nothing of the page', () => {
  expect(carriedSearch('?level=L5&row=abc&wall=W3&case=EY&variant=%2B')).toBe('?level=L5&wall=W3&case=EY&variant=%2B');
  expect(carriedSearch('?row=abc')).toBe('');
});
