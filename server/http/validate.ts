import type { z } from 'zod';

import type { ApiProblem } from '#shared/contracts/errors';

import { HttpError } from './HttpError.ts';

/** The body by its contract, or 422 with every place that does not fit. */
export function validate<S extends z.ZodType>(schema: S, body: unknown): z.infer<S> {
  const read = schema.safeParse(body ?? {});
  if (read.success) return read.data;
  const problems: ApiProblem[] = read.error.issues.slice(0, 500).map((issue) => ({
    row: null,
    column: issue.path.map(String).join('.') || null,
    message: issue.message,
  }));
  throw new HttpError(422, 'invalid', 'The request does not fit the contract of this address.', { problems });
}
