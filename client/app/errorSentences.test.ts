import { expect, it } from 'vitest';

import { errorCodes } from '#shared/contracts/errors';

import { ApiError } from '../data/ApiError.ts';
import { errorSentences, sentenceOf } from './errorSentences.ts';

it.each([...errorCodes, 'offline'] as const)('%s has a sentence of the house', (code) => {
  const { title, text } = errorSentences[code];
  expect(title.length).toBeGreaterThan(8);
  expect(`${title} ${text}`).not.toMatch(/!|please|successfully|oops|sorry/i);
  expect(text.endsWith('.')).toBe(true);
});

it('adds the words of the server only where they name a place', () => {
  expect(sentenceOf(new ApiError('cell-moved', 409, 'height of L3 is 12 now.'))).toContain('height of L3 is 12 now.');
  expect(sentenceOf(new ApiError('internal', 500, 'request 77'))).not.toContain('request 77');
});
