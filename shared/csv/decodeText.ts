export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';

export type Decoded =
  | { readonly ok: true; readonly text: string; readonly encoding: Encoding }
  | { readonly ok: false; readonly row: number | null; readonly message: string };

/**
 * Code points of the bytes 0x80 to 0x9F in Windows-1252 (the five unused bytes keep their own number), as the WHATWG
 * Encoding Standard lists them. Written out because TextDecoder('windows-1252') of some Node 20 builds returns Latin-1 (seen).
 */
const windows1252High = [
  0x20ac, 0x81, 0x201a, 0x0192, 0x201e, 0x2026, 0x2020, 0x2021, 0x02c6, 0x2030, 0x0160, 0x2039, 0x0152, 0x8d, 0x017d,
  0x8f, 0x90, 0x2018, 0x2019, 0x201c, 0x201d, 0x2022, 0x2013, 0x2014, 0x02dc, 0x2122, 0x0161, 0x203a, 0x0153, 0x9d,
  0x017e, 0x0178,
];

function decodeWindows1252(bytes: Uint8Array): string {
  const parts: string[] = [];
  for (let start = 0; start < bytes.length; start += 8192) {
    const codes = Array.from(bytes.subarray(start, start + 8192), (byte) =>
      byte >= 0x80 && byte <= 0x9f ? (windows1252High[byte - 0x80] ?? byte) : byte,
    );
    parts.push(String.fromCharCode(...codes));
  }
  return parts.join('');
}

/** UTF-16 without a byte order mark shows in mostly Latin text as a zero in every other byte. */
function guessUtf16(bytes: Uint8Array): 'utf-16le' | 'utf-16be' | null {
  const sample = bytes.subarray(0, 512);
  let zerosAtEven = 0;
  let zerosAtOdd = 0;
  sample.forEach((byte, index) => {
    if (byte !== 0) return;
    if (index % 2 === 0) zerosAtEven += 1;
    else zerosAtOdd += 1;
  });
  const pairs = Math.floor(sample.length / 2);
  if (pairs < 2) return null;
  if (zerosAtOdd > pairs * 0.6 && zerosAtEven === 0) return 'utf-16le';
  if (zerosAtEven > pairs * 0.6 && zerosAtOdd === 0) return 'utf-16be';
  return null;
}

function accept(text: string, encoding: Encoding): Decoded {
  if (text.includes('\0')) {
    return {
      ok: false,
      row: null,
      message: 'the file holds zero bytes, so it is no text; save the sheet as CSV and take that file',
    };
  }
  return { ok: true, text: text.startsWith('\uFEFF') ? text.slice(1) : text, encoding };
}

/** Bytes to text: UTF-8 with or without its mark, UTF-16 of either byte order, and Windows-1252 for what is no UTF-8. */
export function decodeText(bytes: Uint8Array): Decoded {
  if (bytes[0] === 0x50 && bytes[1] === 0x4b && bytes[2] === 0x03 && bytes[3] === 0x04) {
    return {
      ok: false,
      row: null,
      message: 'the file is a workbook or another archive, expected CSV text; save the sheet as CSV and take that file',
    };
  }
  const marked =
    bytes[0] === 0xff && bytes[1] === 0xfe ? 'utf-16le' : bytes[0] === 0xfe && bytes[1] === 0xff ? 'utf-16be' : null;
  const utf16 = marked ?? guessUtf16(bytes);
  if (utf16) return accept(new TextDecoder(utf16).decode(bytes), utf16);
  try {
    return accept(new TextDecoder('utf-8', { fatal: true }).decode(bytes), 'utf-8');
  } catch {
    const hasMark = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
    if (!hasMark) return accept(decodeWindows1252(bytes), 'windows-1252');
    const before = new TextDecoder('utf-8').decode(bytes).split('\uFFFD', 1)[0] ?? '';
    return {
      ok: false,
      row: before.split(/\r\n|\r|\n/).length,
      message: 'the file begins with the mark of UTF-8 but holds bytes that are none; save it again as UTF-8',
    };
  }
}
