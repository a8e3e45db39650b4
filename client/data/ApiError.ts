import type { ApiProblem, ErrorCode } from '#shared/contracts/errors';

/** `offline`: no answer came. The sentences hang on the code (client/app/errorSentences.ts). */
export type ClientErrorCode = ErrorCode | 'offline';

export class ApiError extends Error {
  readonly code: ClientErrorCode;
  readonly status: number;
  readonly problems: readonly ApiProblem[];
  readonly current: unknown;

  constructor(
    code: ClientErrorCode,
    status: number,
    message: string,
    problems: readonly ApiProblem[] = [],
    current: unknown = undefined,
  ) {
    super(message);
    this.name = 'ApiError';
    this.code = code;
    this.status = status;
    this.problems = problems;
    this.current = current;
  }
}
