import type { IncomingMessage, ServerResponse } from 'node:http';

import { HttpError } from './HttpError.ts';

/** PostgreSQL stores no NUL in text, and nobody types one: such a body is unreadable on both engines. */
export function refuseNullCharacters(_request: IncomingMessage, _response: ServerResponse, body: Buffer): void {
  if (body.includes('\\u0000') || body.includes(0)) {
    throw new HttpError(400, 'unreadable', 'The request holds a null character. Expected: text without it.');
  }
}
