import Papa from 'papaparse';

import { foldHeader, splitHeader } from './matchHeader.ts';

import type { Delimiter } from './readRecords.ts';

const candidates: readonly Delimiter[] = [',', ';', '\t'];

/** The delimiter under which most headers are known; without any known one, that which makes most cells. Comma first. */
export function detectDelimiter(text: string, known: ReadonlySet<string>): Delimiter {
  const start = text.search(/[^\s,;]/);
  if (start === -1) return ',';
  const lineStart = text.lastIndexOf('\n', start) + 1;
  const lineEnd = text.indexOf('\n', start);
  const header = text.slice(lineStart, lineEnd === -1 ? undefined : lineEnd);
  let best: Delimiter = ',';
  let bestScore = -1;
  for (const delimiter of candidates) {
    const cells = Papa.parse<string[]>(header, { delimiter, newline: '\n' }).data[0] ?? [];
    const hits = cells.filter((cell) => known.has(foldHeader(splitHeader(cell).name))).length;
    const score = hits * 100_000 + Math.min(cells.length, 99_999);
    if (score > bestScore) {
      best = delimiter;
      bestScore = score;
    }
  }
  return best;
}
