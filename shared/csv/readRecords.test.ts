import { describe, expect, it } from 'vitest';

import { isQuoted, normalizeLineEnds, readRecords } from './readRecords.ts';

const lines = (text: string) => readRecords(normalizeLineEnds(text), ',').map(({ line, cells }) => [line, ...cells]);

describe('readRecords', () => {
  it('counts physical lines over CRLF, CR and LF in one file', () => {
    expect(lines('a,b\r\nc,d\re,f\n\ng,h')).toEqual([
      [1, 'a', 'b'],
      [2, 'c', 'd'],
      [3, 'e', 'f'],
      [5, 'g', 'h'],
    ]);
  });

  it('gives the line on which a record starts, whatever breaks its cells hold', () => {
    expect(lines('"a\n\nb",c\nd,"e\r\nf"\ng,h\n')).toEqual([
      [1, 'a\n\nb', 'c'],
      [4, 'd', 'e\nf'],
      [6, 'g', 'h'],
    ]);
  });

  it('leaves out blank lines and lines of empty cells, and counts them', () => {
    expect(lines('\n , \na,b\n,,\n\n\nc,d\n')).toEqual([
      [3, 'a', 'b'],
      [7, 'c', 'd'],
    ]);
  });

  it('goes on with the next line after a quote that does not close', () => {
    const records = readRecords('a,b\nc,"d\ne,f\ng,h\n', ',');
    expect(records.map(({ line, brokenQuote }) => [line, brokenQuote])).toEqual([
      [1, null],
      [2, 1],
      [3, null],
      [4, null],
    ]);
    expect(records[3]?.cells).toEqual(['g', 'h']);
  });

  it('finds the cell with the broken quote behind cells that are quoted', () => {
    const records = readRecords('x,"a,a",b,"c" d,e\nf,g\n', ',');
    expect(records.map(({ brokenQuote }) => brokenQuote)).toEqual([3, null]);
  });

  it('ends on a file of nothing but broken quotes', () => {
    const records = readRecords('"a\n'.repeat(1000).slice(0, -1) + 'x"y', ',');
    expect(records.length).toBeGreaterThan(0);
    expect(records.length).toBeLessThanOrEqual(1000);
  });
});

describe('isQuoted', () => {
  it('tells quoted cells from plain ones', () => {
    const [record] = readRecords('"a;""b";3,500;"3,500";x"y;\n', ';');
    if (!record) throw new Error('no record');
    expect([0, 1, 2, 3, 4].map((index) => isQuoted(record, index, ';'))).toEqual([true, false, true, false, false]);
  });
});
