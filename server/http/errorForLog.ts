export interface LoggedError {
  readonly type: string;
  readonly message: string;
  readonly stack: string;
}

/** Name, message and stack only: a database error also carries the bound values, and those may be hashes and addresses. */
export function errorForLog(error: unknown): LoggedError {
  if (!(error instanceof Error)) return { type: typeof error, message: String(error), stack: '' };
  return { type: error.name, message: error.message, stack: error.stack ?? '' };
}
