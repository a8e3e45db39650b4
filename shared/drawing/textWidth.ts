/** Advance widths of IBM Plex Sans in parts of an em, measured in a browser with the shipped font; glyphs of like width together. */
const widths: readonly (readonly [glyphs: string, em: number])[] = [
  ['\u2009', 0.13],
  [" .,:;ijl|'′’!", 0.27],
  ['ftrI()[]-', 0.38],
  ['MWmw@%', 0.92],
  ['aceksvxyz', 0.55],
  ['EFLSTJP', 0.6],
];
const byGlyph = new Map(widths.flatMap(([glyphs, em]) => [...glyphs].map((glyph) => [glyph, em] as const)));
const capital = 0.67;
const other = 0.6;

/** About how wide a text is, so that labels can be kept apart without a browser; a little wide rather than narrow. */
export function textWidth(text: string, size: number, weight: 400 | 500 | 600 = 400): number {
  let em = 0;
  for (const glyph of text) em += byGlyph.get(glyph) ?? (glyph >= 'A' && glyph <= 'Z' ? capital : other);
  return em * size * (weight === 400 ? 1 : 1.03);
}

/** The text, or its beginning and an ellipsis where it is wider than `width`. */
export function fitText(text: string, width: number, size: number, weight: 400 | 500 | 600 = 400): string {
  if (textWidth(text, size, weight) <= width) return text;
  const glyphs = [...text];
  while (glyphs.length > 1 && textWidth(`${glyphs.join('')}…`, size, weight) > width) glyphs.pop();
  return `${glyphs.join('').trimEnd()}…`;
}
