import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';

import { errorForLog } from './errorForLog.ts';
import { HttpError } from './HttpError.ts';
import { requestId } from './requestId.ts';

function textOf(error: unknown, key: string): string | number | undefined {
  if (typeof error !== 'object' || error === null || !(key in error)) return undefined;
  const value: unknown = (error as Record<string, unknown>)[key];
  return typeof value === 'string' || typeof value === 'number' ? value : undefined;
}

/** What other parts of the chain throw, in our own words. */
export function toHttpError(error: unknown): HttpError | null {
  if (error instanceof HttpError) return error;
  const type = textOf(error, 'type');
  const code = textOf(error, 'code');
  if (type === 'entity.too.large' || code === 'LIMIT_FILE_SIZE') {
    return new HttpError(
      413,
      'too-large',
      'The request is too large. Expected: a file of at most 8 MB, JSON of at most 16 MB.',
    );
  }
  const status = textOf(error, 'status') ?? textOf(error, 'statusCode');
  if (typeof status === 'number' && status >= 400 && status < 500) {
    return new HttpError(400, 'unreadable', 'The request could not be read. Expected: well-formed JSON or a form.');
  }
  if (
    error instanceof Error &&
    (error.name === 'MulterError' ||
      error.message.startsWith('Multipart:') ||
      error.message === 'Malformed part header' ||
      error.message === 'Unexpected end of form')
  ) {
    return new HttpError(400, 'unreadable', 'The form could not be read. Expected: one file in the field "file".');
  }
  const driverCode = textOf(
    typeof error === 'object' && error !== null && 'driverError' in error ? error.driverError : error,
    'code',
  );
  if (driverCode === 'SQLITE_FULL' || driverCode === '53100') {
    return new HttpError(507, 'storage-full', 'The disk is full: nothing of this request was stored.');
  }
  if (driverCode === 'SQLITE_READONLY' || driverCode === '25006') {
    return new HttpError(503, 'read-only', 'The database takes no changes at the moment.', { retryAfterSeconds: 30 });
  }
  return null;
}

/** The one place where refusals become answers. */
export function errorHandler(logger: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const known = toHttpError(error);
    if (known === null) {
      const reference = requestId(request);
      logger.error({ err: errorForLog(error), requestId: reference }, 'request failed');
      response.status(500).json({
        error: { code: 'internal', message: `The server failed on this request. Reference: ${reference}.` },
      });
      return;
    }
    const { problems, current, retryAfterSeconds } = known.details;
    if (retryAfterSeconds !== undefined) response.setHeader('Retry-After', String(retryAfterSeconds));
    response.status(known.status).json({
      error: { code: known.code, message: known.message, problems, current },
    });
  };
}
