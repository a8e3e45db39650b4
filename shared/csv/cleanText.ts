/** What neither a workbook nor a drawing can carry: control characters, halves of a pair, code points that are no characters. */
const unusable = /[\p{Cc}\p{Cs}\p{Noncharacter_Code_Point}]/u;

/**
 * Text as it is stored: trimmed, line breaks and tabs inside turned into one space, accents composed (so that a name typed on
 * one system equals the same name from another). Null where a character is left that no output could carry.
 */
export function cleanText(cell: string): string | null {
  const text = cell.trim();
  if (/^[\x20-\x7e]*$/.test(text)) return text;
  const cleaned = text.replace(/\s*[\t\n\v\f\r\u0085\u2028\u2029]+\s*/g, ' ').normalize('NFC');
  return unusable.test(cleaned) ? null : cleaned;
}
