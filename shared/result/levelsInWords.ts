import type { Story } from '../engineering/model/model.ts';

/** The limits of a band in words: `base to L3`, `top of L3 to Roof`. */
export function levelsInWords(stories: readonly Story[], from: string, to: string): string {
  const index = stories.findIndex((story) => story.level === from);
  const below = stories[index - 1];
  return `${below ? `top of ${below.level}` : 'base'} to ${to}`;
}
