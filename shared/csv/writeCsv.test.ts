import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { tableColumns } from '../contracts/tableColumns.ts';

import { cleanText } from './cleanText.ts';
import { readTable } from './readTable.ts';
import { templateCsv, writeCsv } from './writeCsv.ts';

import type { Column } from '../contracts/tableColumns.ts';
import type { TableName, Tables } from '../engineering/input.ts';

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);

/** Names as they are stored: trimmed, not empty, as cleanText gives them. */
const nameText = fc
  .oneof(
    fc.string({ minLength: 1, maxLength: 12 }),
    fc.string({ unit: 'grapheme', minLength: 1, maxLength: 6 }),
    fc.constantFrom(
      '-1',
      '+2',
      '=A1',
      '@x',
      "'=1",
      "'-3",
      "''+",
      '"',
      'a,b',
      'a;b',
      '1,000',
      'x\ny',
      '0x1',
      '-a',
      '−1',
    ),
  )
  .map((text) => cleanText(text) ?? '')
  .filter((text) => text !== '');

function valueFor(column: Column): fc.Arbitrary<string | number | null> {
  const filled: fc.Arbitrary<string | number> =
    column.name === 'expression'
      ? fc.constantFrom('1.4D', '1.2D + 1.6L + 0.5(Lr or S or R)', '-0.9D + 1.0W', '+1.2D')
      : column.type === 'text'
        ? nameText
        : column.type === 'choice'
          ? fc.constantFrom(...(column.choices ?? []))
          : fc
              .double({
                min: column.min ?? column.above ?? -1e9,
                max: column.max ?? 1e9,
                minExcluded: column.above !== undefined,
                noNaN: true,
              })
              .map((value) => (value === 0 ? 0 : value));
  return column.required ? filled : fc.option(filled, { nil: null });
}

describe('writeCsv', () => {
  it('names units in the header, in the building’s own system', () => {
    expect(templateCsv('gravity', 'us')).toBe(
      'level,wall,dead (kip),live (kip),roof_live (kip),snow (kip),tributary_area (ft2),eccentricity (ft),live_class\r\n',
    );
    expect(templateCsv('walls', 'si')).toContain('thickness (mm),from_level,to_level,fc (MPa),share_x,');
  });

  it('guards text that a spreadsheet would run, and leaves numbers alone', () => {
    const rows = ['-1', '+2.5', '=SUM(A1)', '@home', '-a', "'=x"].map((expression) => ({ name: null, expression }));
    expect(writeCsv('combinations', rows, 'us').split('\r\n').slice(1, -1)).toEqual([
      ',-1',
      ',+2.5',
      ",'=SUM(A1)",
      ",'@home",
      ",'-a",
      ",''=x",
    ]);
  });

  it.each(['levels', 'walls', 'forces', 'gravity', 'combinations', 'overrides'] as const)(
    'round trip of %s',
    (table: TableName) => {
      const columns: readonly Column[] = tableColumns[table];
      const row = fc.record(Object.fromEntries(columns.map((column) => [column.name, valueFor(column)])));
      fc.assert(
        fc.property(
          fc.array(row, { minLength: 1, maxLength: 5 }),
          fc.constantFrom('us' as const, 'si' as const),
          (rows, units) => {
            const text = writeCsv(table, rows as unknown as Tables[TableName], units);
            const reading = readTable(table, bytes(text), 'x.csv', units);
            expect(reading.problems).toEqual([]);
            expect(reading.rows).toEqual(rows.map((own) => ({ ...own })));
            expect(reading.notices).toEqual([]);
          },
        ),
      );
    },
  );

  it('gives templates that only lack rows', () => {
    for (const table of ['levels', 'walls', 'forces'] as const) {
      expect(readTable(table, bytes(templateCsv(table, 'si')), 'x.csv', 'si').problems).toHaveLength(1);
    }
    expect(readTable('gravity', bytes(templateCsv('gravity', 'us')), 'x.csv', 'us').problems).toEqual([]);
  });
});
