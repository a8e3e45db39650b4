import type { RequestHandler } from 'express';

import { HttpError } from './HttpError.ts';

/** A body that is neither JSON nor a form would be passed over in silence: it is unreadable instead. */
export const refuseOtherBodies: RequestHandler = (request, _response, next) => {
  const sent = request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length'] ?? 0) > 0;
  if (sent && request.body === undefined && !request.is('multipart/form-data')) {
    throw new HttpError(400, 'unreadable', 'The body is of a type that is not read. Expected: application/json.');
  }
  next();
};
