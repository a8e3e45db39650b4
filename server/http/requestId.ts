import type { Request } from 'express';

/** The id that pino-http has given to the request. */
export function requestId(request: Request): string {
  const { id } = request as Request & { readonly id?: unknown };
  return typeof id === 'string' ? id : '';
}
