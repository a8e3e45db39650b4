import { decodeText } from '#shared/csv/decodeText';
import { normalizeLineEnds, readRecords, type Delimiter } from '#shared/csv/readRecords';

const rowsRead = 200;
const shown = 3;

/** The first different values under each head of a file, and how many cells stand empty: what a column is told by. */
export function columnSamples(bytes: Uint8Array, delimiter: Delimiter): readonly string[] {
  const decoded = decodeText(bytes);
  if (!decoded.ok) return [];
  const [header, ...records] = readRecords(normalizeLineEnds(decoded.text), delimiter);
  if (header === undefined) return [];
  const rows = records.slice(0, rowsRead);
  return header.cells.map((_, index) => {
    const values = rows.map((record) => (record.cells[index] ?? '').trim());
    const different = [...new Set(values.filter((value) => value !== ''))];
    const blanks = values.filter((value) => value === '').length;
    const words = different.slice(0, shown).join('  ') + (different.length > shown ? ' …' : '');
    return [words, blanks === 0 ? '' : `${blanks} blank`].filter((part) => part !== '').join(', ');
  });
}
