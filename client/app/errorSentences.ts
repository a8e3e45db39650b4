import type { ApiError, ClientErrorCode } from '../data/ApiError.ts';

interface Sentence {
  readonly title: string;
  /** what is so, what was kept, and the way on */
  readonly text: string;
}

/** Every error code in words. The server's own message stands beneath where it names a place or a value. */
export const errorSentences: Readonly<Record<ClientErrorCode, Sentence>> = {
  offline: {
    title: 'The server did not answer',
    text: 'What is stored stays as it is. Check the connection and ask again.',
  },
  unreadable: {
    title: 'The request could not be read',
    text: 'Nothing was stored. Reload the page and repeat the step.',
  },
  'too-large': {
    title: 'The file is too large',
    text: 'Nothing was stored. A table may have up to 8 MB; split it or leave out columns that are not needed.',
  },
  csrf: {
    title: 'The request did not come from this page',
    text: 'Nothing was stored. Reload the page and repeat the step.',
  },
  'no-session': { title: 'You are signed out', text: 'Sign in again; what is stored stays as it is.' },
  'wrong-credentials': {
    title: 'Email and password do not belong together',
    text: 'Check both; capitals count in the password. Your office admin can set you up again.',
  },
  'not-found': {
    title: 'Nothing stands at this address',
    text: 'The building may have been removed, or it belongs to people you are not listed with.',
  },
  forbidden: {
    title: 'This is not open to your role',
    text: 'Engineers edit, checkers and admins read, drafters take issued revisions.',
  },
  invalid: { title: 'That was not taken', text: 'What is stored now stays as it is.' },
  problems: { title: 'That was not taken', text: 'What is stored now stays as it is. Each place is listed below.' },
  'not-designed-yet': {
    title: 'This is not available yet',
    text: 'The setting names work that this version does not do, so it is refused rather than ignored. What is stored now stays as it is.',
  },
  'does-not-compute': {
    title: 'The tables do not fit together yet',
    text: 'Everything is stored. Correct the places below in Inputs, and the figures follow.',
  },
  'input-cell': {
    title: 'This cell is an input',
    text: 'Thickness, strength and levels of a row come from the walls table; change them in Inputs.',
  },
  'no-such-warning': {
    title: 'This warning does not stand any more',
    text: 'What it was about has changed since it was shown. Nothing was stored; read the warnings again.',
  },
  'already-settled': { title: 'This warning is settled', text: 'Somebody has given a reason before; read it there.' },
  'if-match-missing': { title: 'The table was not replaced', text: 'Reload the page and repeat the step.' },
  version: {
    title: 'This was changed while you edited it',
    text: 'Nothing was overwritten. Both values stand side by side; choose which one holds.',
  },
  'cell-moved': {
    title: 'A cell was changed while you edited it',
    text: 'Nothing was overwritten; the cell now shows what is stored.',
  },
  'units-fixed': {
    title: 'Units stay once a table has rows',
    text: 'Stored numbers are never converted. Make a new building for the other units.',
  },
  'nothing-to-undo': {
    title: 'Nothing to undo',
    text: 'You have made no edit in this building that could be taken back.',
  },
  'moved-on': {
    title: 'That edit can no longer be undone',
    text: 'Someone changed the same cell since. Nothing was overwritten.',
  },
  'too-many-requests': {
    title: 'Too many attempts',
    text: 'Wait a minute, then try again.',
  },
  busy: { title: 'The server is busy', text: 'Nothing was lost. Ask again in a moment.' },
  'storage-full': { title: 'The disk of the server is full', text: 'Nothing was stored. Tell your office admin.' },
  'read-only': {
    title: 'The server takes no changes now',
    text: 'What is stored can be read. Tell your office admin.',
  },
  internal: {
    title: 'The server met a fault of its own',
    text: 'It is in the log. What is stored stays as it is; ask again, and tell your office admin if it stays.',
  },
};

/** Codes whose message from the server names a place or a value worth reading. */
const telling: ReadonlySet<ClientErrorCode> = new Set([
  'invalid',
  'not-designed-yet',
  'input-cell',
  'cell-moved',
  'moved-on',
  'does-not-compute',
  'no-such-warning',
]);

/** One line for a notice beside the place where it happened. */
export function sentenceOf(error: ApiError): string {
  const { title, text } = errorSentences[error.code];
  const own = telling.has(error.code) && error.message !== '' ? ` ${error.message}` : '';
  return `${title}.${own} ${text}`;
}

export const tells = (error: ApiError): boolean => telling.has(error.code) && error.message !== '';
