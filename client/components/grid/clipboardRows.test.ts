import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { fromClipboard, toClipboard } from './clipboardRows.ts';

describe('clipboardRows', () => {
  it('reads what spreadsheets write', () => {
    expect(fromClipboard('L2\t12\r\nL3\t11\r\n')).toEqual([
      ['L2', '12'],
      ['L3', '11'],
    ]);
    expect(fromClipboard('"a\tb"\t"say ""x"""')).toEqual([['a\tb', 'say "x"']]);
    expect(fromClipboard('a\t\tc')).toEqual([['a', '', 'c']]);
  });

  it('reads nothing from nothing', () => {
    expect(fromClipboard('')).toEqual([]);
  });

  it('reads back what it wrote', () => {
    const cell = fc.string().map((text) => text.replaceAll('\r', ''));
    fc.assert(
      fc.property(fc.array(fc.array(cell, { minLength: 2, maxLength: 4 }), { minLength: 1, maxLength: 5 }), (rows) => {
        expect(fromClipboard(toClipboard(rows))).toEqual(rows);
      }),
    );
  });
});
