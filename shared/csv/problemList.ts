import { problemLimit } from './fileProblem.ts';

import type { FileProblem } from './fileProblem.ts';

/** Keeps the first 500 and counts the others. */
export class ProblemList {
  readonly kept: FileProblem[] = [];
  count = 0;
  private readonly file: string;
  constructor(file: string) {
    this.file = file;
  }
  add(row: number | null, column: string | null, message: string): void {
    this.count += 1;
    if (this.kept.length <= problemLimit) this.kept.push({ file: this.file, row, column, message });
  }
}
