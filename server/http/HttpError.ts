import type { ApiProblem, ErrorCode } from '#shared/contracts/errors';

export interface ErrorDetails {
  readonly problems?: readonly ApiProblem[];
  readonly current?: unknown;
  readonly retryAfterSeconds?: number;
}

/** A refusal with a code; anything else that is thrown answers 500. */
export class HttpError extends Error {
  constructor(
    readonly status: number,
    readonly code: ErrorCode,
    message: string,
    readonly details: ErrorDetails = {},
  ) {
    super(message);
    this.name = 'HttpError';
  }
}

export const notFound = (): HttpError => new HttpError(404, 'not-found', 'Nothing stands at this address.');
