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

  it('reads on in pieces, with cells that run over their ends', () => {
    const long = `a,"${'x\n'.repeat(20_000)}"\n`;
    const records = readRecords(`"b" c\n${long}d,e\n${'f,g\n'.repeat(9_000)}"h" i\n${long}j,k\n`, ',');
    expect(records).toHaveLength(2 + 2 * 2 + 9_000);
    expect(records.filter(({ brokenQuote }) => brokenQuote !== null).map(({ line }) => line)).toEqual([1, 29_004]);
    expect(records.at(-1)).toMatchObject({ cells: ['j', 'k'], line: 49_006 });
  });

  it('ends soon on a file of nothing but broken quotes', () => {
    const start = performance.now();
    const records = readRecords('L1,"W"x,3\n'.repeat(50_000), ',');
    expect(records).toHaveLength(600);
    expect(records.every(({ brokenQuote }, index) => brokenQuote === 1 && records[index]?.line === index + 1)).toBe(
      true,
    );
    expect(performance.now() - start).toBeLessThan(5000);
  });
});

describe('isQuoted', () => {
  it('tells quoted cells from plain ones', () => {
    const [record] = readRecords('"a;""b";3,500;"3,500";x"y;\n', ';');
    if (!record) throw new Error('no record');
    expect([0, 1, 2, 3, 4].map((index) => isQuoted(record, index, ';'))).toEqual([true, false, true, false, false]);
  });
});
