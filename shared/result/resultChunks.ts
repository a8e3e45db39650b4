import type { ResultAction, ResultDocument } from '../contracts/result.ts';

const rowsAChunk = 2_000;

/**
 * The document as JSON text, piece by piece: no single string has to hold a large building (a JavaScript string ends near 537 million
 * characters). `actions` replaces the document's own, a wall at a time.
 */
export function* resultChunks(
  document: ResultDocument,
  actions: Iterable<readonly ResultAction[]> | null = null,
): Generator<string> {
  let before = '{';
  for (const [key, value] of Object.entries(document)) {
    yield `${before}${JSON.stringify(key)}:`;
    before = ',';
    if (key === 'actions' && actions) yield* arrayChunks(actions);
    else if (Array.isArray(value)) yield* arrayChunks(pieces(value));
    else yield JSON.stringify(value);
  }
  yield '}\n';
}

function* pieces(rows: readonly unknown[]): Generator<readonly unknown[]> {
  for (let start = 0; start < rows.length; start += rowsAChunk) yield rows.slice(start, start + rowsAChunk);
}

function* arrayChunks(lists: Iterable<readonly unknown[]>): Generator<string> {
  let before = '[';
  for (const list of lists) {
    for (const rows of pieces(list)) {
      yield before + rows.map((row) => JSON.stringify(row)).join(',');
      before = ',';
    }
  }
  yield before === '[' ? '[]' : ']';
}
