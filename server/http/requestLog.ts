import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

import { errorForLog } from './errorForLog.ts';

/** One line a request: no headers, no cookies, no bodies, no query. */
export function requestLog(logger: Logger, newId: () => string): RequestHandler {
  return pinoHttp({
    logger,
    genReqId: (_request, response) => {
      const id = newId();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    serializers: {
      req: (request: { id: unknown; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        path: request.url.split('?')[0],
      }),
      err: errorForLog,
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
    customLogLevel: (_request, response, error) => {
      if (error !== undefined || response.statusCode >= 500) return 'error';
      return 'info';
    },
  });
}
