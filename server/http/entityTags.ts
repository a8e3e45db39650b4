import type { Request, Response } from 'express';

import { HttpError } from './HttpError.ts';

/** Sets the tag; true where the caller holds this state already and 304 was answered. */
export function answeredByTag(request: Request, response: Response, tag: string): boolean {
  const quoted = `"${tag}"`;
  response.setHeader('ETag', quoted);
  response.setHeader('Cache-Control', 'private, no-cache');
  const held = request.get('If-None-Match');
  if (held === undefined) return false;
  const tags = held.split(',').map((one) => one.trim().replace(/^W\//, ''));
  if (!tags.includes(quoted) && !tags.includes('*')) return false;
  response.status(304).end();
  return true;
}

/** The table version of If-Match: `"12"` or `12`. */
export function ifMatchVersion(request: Request): number {
  const given = request.get('If-Match')?.trim().replace(/^W\//, '').replaceAll('"', '');
  if (given === undefined || !/^\d{1,15}$/.test(given)) {
    throw new HttpError(422, 'if-match-missing', 'The header If-Match is missing. Expected: the version of the table.');
  }
  return Number(given);
}
