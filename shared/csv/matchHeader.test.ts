import { describe, expect, it } from 'vitest';

import { tableColumns } from '../contracts/tableColumns.ts';

import { detectDelimiter } from './detectDelimiter.ts';
import { knownHeaders, matchHeader, splitHeader } from './matchHeader.ts';

const columnsOf = (headers: string[], choices = {}) =>
  matchHeader('walls', headers, 'us', choices).columns.map(({ column }) => column);

describe('matchHeader', () => {
  it('does not mind case, spaces and underscores', () => {
    expect(columnsOf(['WALL', ' From Level', 'TO_LEVEL', 'sharex', 'Flexure_ Factor'])).toEqual([
      'wall',
      'from_level',
      'to_level',
      'share_x',
      'flexure_factor',
    ]);
  });

  it('parts a header from its unit', () => {
    expect(splitHeader(' height (ft) ')).toEqual({ name: 'height', unit: 'ft' });
    expect(splitHeader('height[mm]')).toEqual({ name: 'height', unit: 'mm' });
    expect(splitHeader('height')).toEqual({ name: 'height', unit: null });
  });

  it('leaves unknown columns out with a notice each', () => {
    const match = matchHeader('combinations', ['expression', 'Source', ''], 'us');
    expect(match.problems).toEqual([]);
    expect(match.notices).toHaveLength(1);
    expect(match.notices[0]).toContain('"Source"');
  });

  it('names missing columns in the order of the contract, with a near header where there is one', () => {
    const match = matchHeader('forces', ['fy', 'level', 'cas', 'kind'], 'us');
    expect(match.problems.map(({ column }) => column)).toEqual(['case', 'fx']);
    expect(match.problems[0]?.message).toContain('"cas" may be meant');
    expect(match.problems[1]?.message).toContain('add a column fx');
  });

  it('lets the engineer match own headers, and leave columns out', () => {
    const match = matchHeader('gravity', ['Geschoss', 'Scheibe', 'G [kN]', 'live'], 'si', {
      Geschoss: 'level',
      Scheibe: 'wall',
      'G [kN]': 'dead',
      live: null,
    });
    expect(match.problems).toEqual([]);
    expect(match.columns.map(({ column }) => column)).toEqual(['level', 'wall', 'dead', null]);
    expect(match.headerUnits).toEqual({ dead: 'kN' });
  });

  it('refuses a match to a column that is none', () => {
    const match = matchHeader('combinations', ['expression', 'Nr'], 'us', { Nr: 'number' });
    expect(match.problems).toHaveLength(1);
    expect(match.problems[0]).toMatchObject({ column: 'Nr' });
  });

  it('knows every column of every table under its own name', () => {
    for (const table of ['levels', 'walls', 'forces', 'gravity', 'combinations', 'overrides'] as const) {
      const names = tableColumns[table].map(({ name }) => name);
      const match = matchHeader(table, names, 'us');
      expect(match.matched.map(({ column, index }) => [column.name, index])).toEqual(
        names.map((name, at) => [name, at]),
      );
    }
  });
});

describe('detectDelimiter', () => {
  const known = knownHeaders('forces');
  it.each([
    ['level,case,kind', ','],
    ['level;case;kind', ';'],
    ['level\tcase\tkind', '\t'],
    ['\n\nlevel;case, of loading;kind\n', ';'],
    ['level', ','],
    ['', ','],
    ['a;b;c', ';'],
    ['"level, of floor";case;kind\n1,2,3,4,5,6', ';'],
  ])('reads %j as parted by %j', (text, delimiter) => {
    expect(detectDelimiter(text, known)).toBe(delimiter);
  });
});
