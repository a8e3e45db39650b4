/** A rectangle that a text or a mark takes on paper. */
export interface LabelBox {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export const overlaps = (a: LabelBox, b: LabelBox): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** px2 that a box shares with all that is taken. */
export function overlapArea(box: LabelBox, taken: readonly LabelBox[]): number {
  let area = 0;
  for (const other of taken) {
    const width = Math.min(box.right, other.right) - Math.max(box.left, other.left);
    const height = Math.min(box.bottom, other.bottom) - Math.max(box.top, other.top);
    if (width > 0 && height > 0) area += width * height;
  }
  return area;
}

export function boxAround(points: readonly { readonly x: number; readonly y: number }[], pad = 0): LabelBox {
  const xs = points.map((point) => point.x);
  const ys = points.map((point) => point.y);
  return {
    left: Math.min(...xs) - pad,
    right: Math.max(...xs) + pad,
    top: Math.min(...ys) - pad,
    bottom: Math.max(...ys) + pad,
  };
}
