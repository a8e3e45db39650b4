/** A reason why a file is refused: `row` is the physical line on which the record starts, the first line of the file being 1. */
export interface FileProblem {
  readonly file: string;
  readonly row: number | null;
  /** our own column name where it is known, else the header as typed; for building.json the path of the key */
  readonly column: string | null;
  readonly message: string;
  readonly code?: 'not-designed-yet';
}

/** Nobody reads further than this; the last line then counts the rest. */
export const problemLimit = 500;

/** The first 500 problems and, where there are more, a last one that counts them. */
export function limitProblems(problems: readonly FileProblem[], total: number, file: string): FileProblem[] {
  const kept = problems.slice(0, problemLimit);
  const rest = total - kept.length;
  if (rest <= 0) return kept;
  return [
    ...kept,
    { file, row: null, column: null, message: `and ${rest} more ${rest === 1 ? 'problem' : 'problems'}` },
  ];
}
