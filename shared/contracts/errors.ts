import { z } from 'zod';

/** Every code a failing answer can carry; the client's sentences hang on the code. */
export const errorCodes = [
  'unreadable',
  'too-large',
  'csrf',
  'no-session',
  'wrong-credentials',
  'not-found',
  'forbidden',
  'invalid',
  'problems',
  'not-designed-yet',
  'does-not-compute',
  'input-cell',
  'if-match-missing',
  'version',
  'cell-moved',
  'units-fixed',
  'nothing-to-undo',
  'moved-on',
  'no-such-warning',
  'already-settled',
  'too-many-requests',
  'busy',
  'storage-full',
  'read-only',
  'internal',
] as const;
export type ErrorCode = (typeof errorCodes)[number];

/** A problem as it leaves the house: file and row as in the uploaded file, or table and row id of what is stored. */
export const problemSchema = z.object({
  file: z.string().optional(),
  table: z.string().optional(),
  row: z.number().int().nullable(),
  column: z.string().nullable(),
  rowId: z.string().optional(),
  /** what was read and what was expected are both in the sentence */
  message: z.string(),
  code: z.string().optional(),
});
export type ApiProblem = z.infer<typeof problemSchema>;

export const errorBodySchema = z.object({
  error: z.object({
    code: z.enum(errorCodes),
    message: z.string(),
    problems: z.array(problemSchema).optional(),
    current: z.unknown().optional(),
  }),
});
export type ErrorBody = z.infer<typeof errorBodySchema>;
