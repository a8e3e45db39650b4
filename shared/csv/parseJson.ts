import { nestsTooDeep } from '../contracts/nestsTooDeep.ts';

import { decodeText } from './decodeText.ts';

export type JsonReading =
  | { readonly ok: true; readonly json: unknown }
  | { readonly ok: false; readonly row: number | null; readonly message: string };

/** Bytes of a JSON file to its value, by the encodings that tables may have too. */
export function parseJson(bytes: Uint8Array): JsonReading {
  const decoded = decodeText(bytes);
  if (!decoded.ok) return decoded;
  try {
    const json: unknown = JSON.parse(decoded.text);
    if (nestsTooDeep(json)) {
      const message =
        'the file nests lists or objects deeper than 32 levels, expected one object; take the inner ones out';
      return { ok: false, row: null, message };
    }
    return { ok: true, json };
  } catch (error) {
    const reason = error instanceof Error ? error.message.replace(/\s+/g, ' ') : 'not JSON';
    return { ok: false, row: null, message: `the file is no JSON (${reason}), expected an object; correct the place` };
  }
}
