import type { Story } from '../model/model.ts';

/** Stories one above the other of which the same can be said. */
export interface StoryRun<Fact> {
  readonly from: number;
  readonly to: number;
  /** lowest first */
  readonly facts: readonly Fact[];
}

/**
 * Runs of successive stories with the same key, so that one warning with a range stands for many equal ones. `factOf` null: nothing to
 * say there. Facts of one run may differ in their figures; what makes them one is `keyOf`.
 */
export function storyRuns<Fact>(
  stories: number,
  factOf: (story: number) => Fact | null,
  keyOf: (fact: Fact) => string = () => '',
): StoryRun<Fact>[] {
  const runs: { from: number; to: number; facts: Fact[] }[] = [];
  for (let story = 0; story < stories; story += 1) {
    const fact = factOf(story);
    if (fact === null) continue;
    const last = runs[runs.length - 1];
    const first = last?.facts[0];
    if (last && first !== undefined && last.to === story - 1 && keyOf(first) === keyOf(fact)) {
      last.to = story;
      last.facts.push(fact);
    } else runs.push({ from: story, to: story, facts: [fact] });
  }
  return runs;
}

/** `L2`, or `L2 to L9`. */
export function sayRun(stories: readonly Story[], run: { readonly from: number; readonly to: number }): string {
  const from = stories[run.from]?.level ?? '';
  return run.from === run.to ? from : `${from} to ${stories[run.to]?.level ?? ''}`;
}

/** The lowest level of a run: where its warning stands. */
export const levelOf = (stories: readonly Story[], run: { readonly from: number }): string =>
  stories[run.from]?.level ?? '';

/** Levels of a run, for the rows that wait. */
export const heldStories = (
  stories: readonly Story[],
  run: { readonly from: number; readonly to: number },
): { readonly from: string; readonly to: string } => ({
  from: stories[run.from]?.level ?? '',
  to: stories[run.to]?.level ?? '',
});
