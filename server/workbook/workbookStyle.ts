import type { Alignment, Border, Fill, Font } from 'exceljs';

const argb = (hex: string): { argb: string } => ({ argb: `FF${hex}` });

/** Light values of the design tokens; paper is white, as in print. */
export const colors = {
  ink: argb('20242A'),
  graphite: argb('5B6067'),
  line: argb('817B6C'),
  rule: argb('D9D3C5'),
  well: argb('F0EBDF'),
  oxide: argb('A33F1E'),
  ochre: argb('745608'),
} as const;

const family = 'Arial';
const notationFamily = 'Consolas';

const font = (size: number, more: Partial<Font> = {}): Partial<Font> => ({
  name: family,
  size,
  color: colors.ink,
  ...more,
});

export const fonts = {
  title: font(18, { bold: true }),
  mark: font(11, { bold: true }),
  data: font(9),
  firm: font(9, { bold: true }),
  quiet: font(8, { color: colors.graphite }),
  head: font(9, { bold: true }),
  notation: font(10, { name: notationFamily }),
  overwritten: font(10, { name: notationFamily, underline: true, color: colors.ink }),
  over: font(9, { bold: true, color: colors.oxide }),
  caution: font(8, { italic: true, color: colors.graphite }),
} as const;

export const hatch: Fill = { type: 'pattern', pattern: 'lightUp', fgColor: colors.oxide, bgColor: argb('FFFFFF') };
export const headFill: Fill = { type: 'pattern', pattern: 'solid', fgColor: colors.well };

export const hairline: Partial<Border> = { style: 'thin', color: colors.rule };
export const inkRule: Partial<Border> = { style: 'medium', color: colors.ink };
export const fineRule: Partial<Border> = { style: 'thin', color: colors.line };
export const ochreBar: Partial<Border> = { style: 'thick', color: colors.ochre };

const middle: Partial<Alignment> = { vertical: 'middle' };
export const alignments = {
  text: { ...middle, horizontal: 'left', wrapText: true },
  line: { ...middle, horizontal: 'left' },
  number: { ...middle, horizontal: 'right', indent: 1 },
  center: { ...middle, horizontal: 'center' },
} satisfies Record<string, Partial<Alignment>>;
