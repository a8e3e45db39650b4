import { readFileSync } from 'node:fs';
import { join } from 'node:path';

import { describe, expect, it } from 'vitest';

import { readTable } from './readTable.ts';

const root = join(import.meta.dirname, '../../fixtures/csv/encodings');
const files = JSON.parse(readFileSync(join(root, 'manifest.json'), 'utf8')) as {
  readonly file: string;
  readonly encoding: string;
  readonly delimiter: string;
}[];

describe('one table in every encoding, delimiter and line end', () => {
  it.each(files)('$file', ({ file, encoding, delimiter }) => {
    const reading = readTable('levels', readFileSync(join(root, file)), file, 'si');
    expect(reading.problems).toEqual([]);
    expect(reading.notices).toEqual([]);
    expect(reading).toMatchObject({ encoding, delimiter });
    const cells = reading.rows.map(({ level, height, weight, diaphragm }) => [level, height, weight, diaphragm]);
    expect(cells).toEqual([
      ['Café roof', 3.25, 1250.5, 'rigid'],
      ['Deck – west', 3.5, null, 'flexible'],
      ['L1', 4, 900, null],
    ]);
  });
});
