import { expect, it } from 'vitest';

import { carriedSearch } from './useChoice.ts';

it('carries story, wall, case, variant and basis, and nothing of the page', () => {
  expect(carriedSearch('?level=L5&row=abc&wall=W3&case=EY&variant=%2B&basis=compatible')).toBe(
    '?level=L5&wall=W3&case=EY&variant=%2B&basis=compatible',
  );
  expect(carriedSearch('?row=abc')).toBe('');
});
