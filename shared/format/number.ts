/** U+2212, as wide as a plus sign. */
export const minusSign = '−';
/** U+2009, before a percent sign. */
export const thinSpace = ' ';

/** Fixed decimals, thousands commas, true minus; a value that rounds to zero has no sign. `formatNumber(-1234.5, 1)` = `−1,234.5`. */
export function formatNumber(value: number, decimals: number): string {
  const digits = Math.abs(value).toFixed(decimals);
  const [whole = '0', fraction] = digits.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, ',');
  const text = fraction === undefined ? grouped : `${grouped}.${fraction}`;
  return value < 0 && /[1-9]/.test(digits) ? minusSign + text : text;
}

/** Up to `most` decimals, none that are zero at the end: 3.5 stays 3.5, 12 stays 12. */
export function formatAsListed(value: number, most = 2): string {
  const text = formatNumber(value, most);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** Reads what `formatNumber` prints and what a person types; null where it is no number. A decimal comma is not read. */
export function parseNumber(text: string): number | null {
  const plain = text.trim().replace(/[−–]/g, '-').replace(/\s/g, '');
  if (/^[+-]?\d{1,3}(,\d{3})+(\.\d*)?$/.test(plain)) return Number(plain.replace(/,/g, ''));
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : null;
}
