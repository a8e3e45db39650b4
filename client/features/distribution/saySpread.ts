import { formatShare } from '#shared/format/force';

import type { StoryBases } from './storyBases.ts';

const why: Readonly<Record<string, string>> = {
  'rigid flexible':
    'Rigid floors share by rigidity and torsion, flexible ones by the width that hangs on a wall: the floor decides which is nearer.',
  'rigid compatible':
    'Rigid takes each story by itself; compatible bends the walls together over the whole height, so that long walls gather load toward the base.',
  'flexible compatible':
    'Flexible floors share by the width that hangs on a wall; compatible bends the walls together over the whole height.',
};

/** The wall whose bases lie farthest apart, what the two outermost give it, and why that matters. */
export function saySpread(bases: StoryBases): { readonly lead: string; readonly rest: string } | null {
  const { widest, size } = bases;
  if (widest === null || size === 0) return null;
  const known = bases.bases.flatMap((basis, index) => {
    const value = widest.values[index];
    return value === null || value === undefined ? [] : [{ basis, value }];
  });
  const ranked = [...known].sort((a, b) => b.value - a.value);
  const [high, low] = [ranked[0], ranked.at(-1)];
  if (!high || !low) return null;
  const pair = known.filter((one) => one === high || one === low).map((one) => one.basis);
  const say = (value: number): string => formatShare(value / size);
  return {
    lead: `${widest.wall} spreads most:`,
    rest: `${high.basis} gives it ${say(high.value)} of the story shear, ${low.basis} ${say(low.value)}. ${why[pair.join(' ')] ?? ''}`,
  };
}
