export type NumberReading =
  { readonly ok: true; readonly value: number } | { readonly ok: false; readonly remedy: string };

/** Larger numbers are slips of the keyboard in every unit of the product and would not stay finite further on. */
export const largestNumber = 1e12;

const plain = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d{1,3})?$/;
const commaGroups = /^[+-]?[1-9]\d{0,2}(?:,\d{3})+(?:\.\d*)?(?:[eE][+-]?\d{1,3})?$/;
const spaceGroups = /^[+-]?[1-9]\d{0,2}(?: \d{3})+(?:\.\d*)?(?:[eE][+-]?\d{1,3})?$/;
const decimalComma = /^[+-]?(?:\d+|\d{1,3}(?:[. ]\d{3})+)?,\d+$/;
const withUnit = /^[+-]?[\d.,\s]*\d\s*(?:[A-Za-z'"][A-Za-z0-9'"/.·-]*)$/;

/** Spaces that spreadsheets and word processors put between digits. */
const spaces = /[\u00a0\u2007\u2009\u202f]/g;
const minusSigns = /^[\u2212\u2013\uff0d]/;

function remedyFor(text: string): string {
  if (decimalComma.test(text)) {
    const comma = text.lastIndexOf(',');
    const whole = text.slice(0, comma).replace(/[. ]/g, '');
    return `a decimal comma is not read; write ${whole === '' || whole === '-' || whole === '+' ? `${whole}0` : whole}.${text.slice(comma + 1)}`;
  }
  if (text.endsWith('%')) return 'write a fraction such as 0.25 instead of a percentage';
  if (/^\(.*\)$/.test(text)) return 'write a negative number with a minus sign in front';
  if (/^[+-]?0[xXbBoO]/.test(text)) return 'write decimal digits such as 12.5';
  if (/^[+-]?(?:nan|inf|infinity)$/i.test(text)) return 'write a finite number such as 12.5, or leave the cell empty';
  if (text.includes(',')) return 'commas may stand between groups of exactly three digits only, as in 12,500.5';
  if (withUnit.test(text)) return 'write the number alone; the unit belongs in the header, as in height (ft)';
  return 'write digits with a decimal point, such as 12.5';
}

/**
 * A number as the contract has it: decimal point, groups of exactly three digits parted by commas or spaces, a minus of either
 * form. `loneCommaIsAmbiguous` is set for unquoted cells of semicolon and tab files, where `3,500` may be meant either way.
 */
export function parseNumber(cell: string, loneCommaIsAmbiguous = false): NumberReading {
  const text = cell.trim().replace(spaces, ' ').replace(minusSigns, '-');
  const groupedByComma = commaGroups.test(text);
  if (groupedByComma && loneCommaIsAmbiguous && /^[+-]?\d+,\d+$/.test(text)) {
    return {
      ok: false,
      remedy: `in a semicolon or tab file one comma can be read two ways; write ${text.replace(',', '')} or ${text.replace(',', '.')}`,
    };
  }
  if (!groupedByComma && !plain.test(text) && !spaceGroups.test(text)) return { ok: false, remedy: remedyFor(text) };
  const value = Number(text.replace(/[, ]/g, ''));
  if (!(Math.abs(value) <= largestNumber)) return { ok: false, remedy: 'write a number below 1e12' };
  return { ok: true, value: value === 0 ? 0 : value };
}
