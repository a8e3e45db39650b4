import type { RequestHandler } from 'express';

import { HttpError } from './HttpError.ts';

/** A foreign page can't set this header without asking first, and it is never allowed to. */
export const csrf: RequestHandler = (request, _response, next) => {
  const harmless = request.method === 'GET' || request.method === 'HEAD';
  if (harmless || request.get('X-Requested-With') === 'groundward') {
    next();
    return;
  }
  throw new HttpError(403, 'csrf', 'The request lacks the header X-Requested-With: groundward.');
};
