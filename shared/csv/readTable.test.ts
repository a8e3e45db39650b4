import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { readTable } from './readTable.ts';

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);
const places = (text: string) =>
  readTable('forces', bytes(text), 'forces.csv', 'us').problems.map(({ row, column }) => [row, column]);

describe('readTable', () => {
  it('fills columns that the file does not have with null', () => {
    const reading = readTable('forces', bytes('level,case,kind,fx,fy\nL1,WX,wind,3,0\n'), 'a.csv', 'us');
    expect(reading.rows).toEqual([{ level: 'L1', case: 'WX', kind: 'wind', fx: 3, fy: 0, x: null, y: null, mz: null }]);
    expect(reading.lines).toEqual([2]);
  });

  it('converts a column once, by its header, and says which unit it had', () => {
    const reading = readTable(
      'forces',
      bytes('level,case,kind,fx (kN),fy [lb],mz (kip-in)\nL1,WX,wind,4.4482216152605,500,24\n'),
      'a.csv',
      'us',
    );
    expect(reading.rows[0]?.fx).toBeCloseTo(1, 12);
    expect(reading.rows[0]).toMatchObject({ fy: 0.5, mz: 2 });
    expect(reading.headerUnits).toEqual({ fx: 'kN', fy: 'lb', mz: 'kip-in' });
  });

  it('sorts problems by row, then by the columns of the contract rather than of the file', () => {
    expect(places('fy,kind,fx,case,level\nx,quake,y,,\n1,wind,z,A,L1\n')).toEqual([
      [2, 'level'],
      [2, 'case'],
      [2, 'kind'],
      [2, 'fx'],
      [2, 'fy'],
      [3, 'fx'],
    ]);
  });

  it('still reads the cells of the columns it has where one is missing, and gives no rows', () => {
    const reading = readTable('forces', bytes('level,case,kind,fx\nL1,WX,wind,a\n'), 'f.csv', 'us');
    expect(reading.problems.map(({ row, column }) => [row, column])).toEqual([
      [1, 'fy'],
      [2, 'fx'],
    ]);
    expect(reading.rows).toEqual([]);
  });

  it('gives the header its own line behind blank lines', () => {
    expect(places('\n\nlevel,case,kind,fx,fx,fy\nL1,WX,wind,1,1,x\n')).toEqual([
      [3, 'fx'],
      [4, 'fy'],
    ]);
  });

  it('takes short rows and trailing separators as empty cells', () => {
    const reading = readTable('gravity', bytes('level,wall,dead,live,snow,\nL1,W1,3\nL2,W1,3,,,,,\n'), 'g.csv', 'us');
    expect(reading.problems).toEqual([]);
    expect(reading.rows.map(({ dead, live }) => [dead, live])).toEqual([
      [3, null],
      [3, null],
    ]);
  });

  it('says that cells under no header were left out, and is silent where such a column is empty', () => {
    const notices = (text: string) => readTable('gravity', bytes(text), 'g.csv', 'us').notices;
    expect(notices('level,wall,dead,,\nL1,W1,3,,\n')).toEqual([]);
    expect(notices('level,wall,dead,,\nL1,W1,3,,x\n')).toEqual(['column number 5 has no header and was left out']);
  });

  it('refuses names with control characters and joins names over two lines', () => {
    const reading = readTable('levels', bytes('level,height\n"L1\nlower",9\nL\u00012,9\n'), 'l.csv', 'us');
    expect(reading.rows[0]?.level).toBe('L1 lower');
    expect(reading.problems.map(({ row, column }) => [row, column])).toEqual([[4, 'level']]);
  });

  it('stops at 500 problems and counts the rest', () => {
    const reading = readTable(
      'forces',
      bytes('level,case,kind,fx,fy\n' + 'L1,WX,wind,a,b\n'.repeat(300)),
      'f.csv',
      'us',
    );
    expect(reading.problems).toHaveLength(501);
    expect(reading.problems[499]).toMatchObject({ row: 251, column: 'fy' });
    expect(reading.problems[500]).toEqual({ file: 'f.csv', row: null, column: null, message: 'and 100 more problems' });
    expect(reading.problemCount).toBe(600);
  });

  it('counts nothing where there are exactly 500', () => {
    const reading = readTable(
      'forces',
      bytes('level,case,kind,fx,fy\n' + 'L1,WX,wind,a,b\n'.repeat(250)),
      'f.csv',
      'us',
    );
    expect(reading.problems).toHaveLength(500);
  });

  it('marks what it could not read, so that later checks pass over it', () => {
    const reading = readTable('levels', bytes('level,height,elevation\n,3,x\n'), 'l.csv', 'us');
    expect(reading.rows[0]).toMatchObject({ level: '', height: 3, elevation: Number.NaN });
  });

  it('does not compare numbers whose unit it does not know', () => {
    const reading = readTable('levels', bytes('level,height (yd)\nL1,4\n'), 'l.csv', 'us');
    expect(reading.problems).toHaveLength(1);
    expect(reading.rows[0]?.height).toBeNaN();
  });

  it('reads names as they are, numbers among them', () => {
    const reading = readTable('levels', bytes('level,height\n-1,9\n+2,9\n1,9\n01,9\n'), 'l.csv', 'us');
    expect(reading.rows.map(({ level }) => level)).toEqual(['-1', '+2', '1', '01']);
  });

  it('takes any bytes without throwing, and never both rows for use and silence', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), fc.constantFrom('us' as const, 'si' as const), (data, units) => {
        const reading = readTable('walls', data, 'w.csv', units);
        expect(reading.lines).toHaveLength(reading.rows.length);
        expect(reading.problems.length).toBeGreaterThan(0);
      }),
    );
  });

  it('takes any text behind a good header without throwing, and names a line of the file for each problem', () => {
    const cell = fc.oneof(
      fc.string({ maxLength: 12 }),
      fc.constantFrom('"', ',', '\n', '\r', ';', '\t', '"a\nb"', '1,5', 'L1', '3', "'", '\u2212'),
    );
    fc.assert(
      fc.property(fc.array(cell, { maxLength: 60 }), (cells) => {
        const text = 'level,height\n' + cells.join('');
        const lineCount = text.split(/\r\n|\r|\n/).length;
        const reading = readTable('levels', bytes(text), 'l.csv', 'us');
        let last = 0;
        for (const { row } of reading.problems) {
          if (row === null) continue;
          expect(row).toBeGreaterThanOrEqual(Math.max(1, last));
          expect(row).toBeLessThanOrEqual(lineCount);
          last = row;
        }
        expect([...reading.lines].sort((a, b) => a - b)).toEqual(reading.lines);
      }),
      { numRuns: 300 },
    );
  });

  it('reads 50,000 rows of gravity well under a second', () => {
    const text = 'level,wall,dead,live,snow,tributary_area\n' + 'L12,W7,"1,012.5",24,,480\n'.repeat(50_000);
    const data = bytes(text);
    // the best of three, since other work may share the machine
    const times: number[] = [];
    for (let run = 0; run < 3; run += 1) {
      const start = performance.now();
      const reading = readTable('gravity', data, 'gravity.csv', 'us');
      times.push(performance.now() - start);
      expect(reading.rows).toHaveLength(50_000);
      expect(reading.lines.at(-1)).toBe(50_001);
    }
    expect(Math.min(...times)).toBeLessThan(1000);
  });
});
