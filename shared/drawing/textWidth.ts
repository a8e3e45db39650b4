/** Glyphs by width, in parts of an em: narrow 0.33, wide 0.9, capitals 0.64, digits 0.6 (as IBM Plex Sans has them), others 0.57. */
const narrow = new Set([...".,:;ijl|′'’!I[]()ft-−–  "]);
const wide = new Set([...'MWmw@%Σ']);

/** About how wide a text is, so that labels can be kept apart without a browser; a little wide rather than narrow. */
export function textWidth(text: string, size: number, weight: 400 | 500 | 600 = 400): number {
  let em = 0;
  for (const glyph of text) {
    if (narrow.has(glyph)) em += 0.33;
    else if (wide.has(glyph)) em += 0.9;
    else if (glyph >= 'A' && glyph <= 'Z') em += 0.64;
    else em += glyph >= '0' && glyph <= '9' ? 0.6 : 0.57;
  }
  return em * size * (weight === 400 ? 1 : 1.03);
}

/** The text, or its beginning and an ellipsis where it is wider than `width`. */
export function fitText(text: string, width: number, size: number, weight: 400 | 500 | 600 = 400): string {
  if (textWidth(text, size, weight) <= width) return text;
  const glyphs = [...text];
  while (glyphs.length > 1 && textWidth(`${glyphs.join('')}…`, size, weight) > width) glyphs.pop();
  return `${glyphs.join('').trimEnd()}…`;
}
