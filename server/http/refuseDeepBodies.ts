import type { RequestHandler } from 'express';

import { nestsTooDeep } from '#shared/contracts/nestsTooDeep';

import { HttpError } from './HttpError.ts';

/** A body that nests without end is unreadable: nothing behind this line has to fear for its stack. */
export const refuseDeepBodies: RequestHandler = (request, _response, next) => {
  if (nestsTooDeep(request.body)) {
    throw new HttpError(
      400,
      'unreadable',
      'The request nests too deep. Expected: lists and objects of at most 32 levels.',
    );
  }
  next();
};
