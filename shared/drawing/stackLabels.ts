import type { HeightScale } from './heightScale.ts';
import type { StackInput } from './stackTypes.ts';

/** How much of a story's cell is written: name and elevation, the name alone, or a name at some stories. */
export type LabelDensity = 'full' | 'name' | 'sparse';

export function labelDensity(typicalCell: number): LabelDensity {
  if (typicalCell >= 34) return 'full';
  return typicalCell >= 16 ? 'name' : 'sparse';
}

const apart = 15;

/**
 * Levels that carry a name and a value where cells are under 16 px: every fifth from the base, the first, the last, every one
 * over a limit and the chosen one; what stands within 15 px of the chosen one gives way to it, and of two others the later.
 */
export function sparseLabels(input: StackInput, scale: HeightScale): ReadonlySet<string> {
  const { stories, chosen } = input;
  const middle = (index: number): number => {
    const box = scale.boxes[index];
    return box ? (box.top + box.bottom) / 2 : 0;
  };
  const last = stories.length - 1;
  const rank = (index: number): number => {
    const story = stories[index];
    if (story?.level === chosen) return 0;
    if (story?.over) return 1;
    if (index === 0 || index === last) return 2;
    return (last - index) % 5 === 0 ? 3 : 4;
  };
  const order = stories.map((_, index) => index).filter((index) => rank(index) < 4);
  order.sort((a, b) => rank(a) - rank(b) || b - a);
  const kept: number[] = [];
  for (const index of order) {
    if (kept.every((other) => Math.abs(middle(other) - middle(index)) >= apart)) kept.push(index);
  }
  return new Set(kept.flatMap((index) => stories[index]?.level ?? []));
}
