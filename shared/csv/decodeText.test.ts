import { describe, expect, it } from 'vitest';

import { decodeText } from './decodeText.ts';

const bytes = (...values: number[]): Uint8Array => new Uint8Array(values);

describe('decodeText', () => {
  it('reads UTF-8 and drops its mark', () => {
    expect(decodeText(bytes(0xef, 0xbb, 0xbf, 0x43, 0xc3, 0xa9))).toEqual({ ok: true, text: 'Cé', encoding: 'utf-8' });
    expect(decodeText(bytes(0x43, 0xc3, 0xa9))).toEqual({ ok: true, text: 'Cé', encoding: 'utf-8' });
    expect(decodeText(bytes())).toEqual({ ok: true, text: '', encoding: 'utf-8' });
  });

  it('reads Windows-1252 where the bytes are no UTF-8, with its own characters from 0x80 to 0x9F', () => {
    // by the table of the WHATWG Encoding Standard: 0x80 euro, 0x93 and 0x94 quotes, 0x96 en dash, 0xE9 e acute
    expect(decodeText(bytes(0x80, 0x93, 0x41, 0x94, 0x96, 0xe9))).toEqual({
      ok: true,
      text: '\u20ac\u201cA\u201d\u2013\u00e9',
      encoding: 'windows-1252',
    });
  });

  it('reads UTF-16 of both byte orders, marked or plain', () => {
    expect(decodeText(bytes(0xff, 0xfe, 0x41, 0, 0x13, 0x20))).toEqual({
      ok: true,
      text: 'A\u2013',
      encoding: 'utf-16le',
    });
    expect(decodeText(bytes(0xfe, 0xff, 0, 0x41, 0x20, 0x13))).toEqual({
      ok: true,
      text: 'A\u2013',
      encoding: 'utf-16be',
    });
    expect(decodeText(bytes(0x41, 0, 0x42, 0, 0x43, 0))).toMatchObject({ text: 'ABC', encoding: 'utf-16le' });
    expect(decodeText(bytes(0, 0x41, 0, 0x42, 0, 0x43))).toMatchObject({ text: 'ABC', encoding: 'utf-16be' });
  });

  it('refuses what is no text', () => {
    expect(decodeText(bytes(0x50, 0x4b, 3, 4, 20, 0))).toMatchObject({ ok: false, row: null });
    expect(decodeText(bytes(0x41, 0, 0, 0, 0x42, 1, 2, 3))).toMatchObject({ ok: false, row: null });
  });

  it('names the line where marked UTF-8 breaks', () => {
    expect(decodeText(bytes(0xef, 0xbb, 0xbf, 0x41, 0x0d, 0x0a, 0x42, 0x0d, 0xff))).toMatchObject({
      ok: false,
      row: 3,
    });
  });
});
