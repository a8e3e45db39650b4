/** Holds one array of a result against own rows: missing, surplus and differing ones, by the tolerance of the contract. */
export class Comparison {
  constructor() {
    this.lines = [];
    this.compared = 0;
    this.largest = 0;
  }

  number(where, theirs, own, scale) {
    this.compared += 1;
    if (typeof theirs !== 'number' || !Number.isFinite(theirs)) {
      this.lines.push(`${where}: ${String(theirs)} in the result, ${String(own)} here`);
      return;
    }
    const difference = Math.abs(theirs - own);
    const size = Math.max(Math.abs(theirs), Math.abs(own));
    this.largest = Math.max(this.largest, difference / Math.max(size, Math.abs(scale), 1e-300));
    // turned round on purpose: a number that is not known here compares as NaN and must not pass
    if (!(difference <= 0.001 * size + 1e-5 * Math.abs(scale))) {
      this.lines.push(`${where}: ${String(theirs)} in the result, ${String(own)} here`);
    }
  }

  /** Rows matched by key; own rows that are all but zero may be missing. */
  rows(name, theirs, own, keyOf, numbers) {
    const mine = new Map(own.map((row) => [keyOf(row), row]));
    const seen = new Set();
    for (const row of theirs) {
      const key = keyOf(row);
      const match = mine.get(key);
      if (seen.has(key)) this.lines.push(`${name} ${key}: twice in the result`);
      seen.add(key);
      if (match === undefined) {
        if (numbers.some((column) => Math.abs(row[column] ?? 0) > 1e-9))
          this.lines.push(`${name} ${key}: not expected`);
        continue;
      }
      for (const column of numbers)
        this.number(`${name} ${key} ${column}`, row[column], match[column], match.scale[column]);
    }
    for (const [key, row] of mine) {
      if (seen.has(key)) continue;
      if (numbers.some((column) => Math.abs(row[column]) > 1e-9 * Math.max(1, Math.abs(row.scale[column])))) {
        this.lines.push(`${name} ${key}: missing in the result`);
      }
    }
  }
}
