import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

import { sayLength, sayNames } from './sayAmount.ts';
import { heldStories, levelOf, sayRun, storyRuns } from './storyRuns.ts';
import { wallContacts, type WallContact } from './wallContacts.ts';
import { wallLoops } from './wallLoops.ts';

/**
 * `flanged`, `coupled`, `core` (engineering.md section 8): walls that act together and are computed as separate rectangles. Each wall that
 * meets others and each pair with a gap once, over the stories where the same holds.
 */
export function assemblyWarnings({ model }: Pick<Analysis, 'model'>): Warning[] {
  const { stories, walls } = model;
  const { units } = model.settings;
  const contacts = stories.map((_, story) => wallContacts(model, story));
  const name = (index: number): string => walls[index]?.name ?? '';
  const warnings: Warning[] = [];
  walls.forEach((wall, index) => {
    const runs = storyRuns(
      stories.length,
      (story) => {
        const others = metBy(contacts[story] ?? [], index).map(name);
        return others.length === 0 ? null : others;
      },
      (others) => others.join('\n'),
    );
    for (const run of runs) {
      const others = run.facts[0] ?? [];
      warnings.push({
        code: 'flanged',
        level: levelOf(stories, run),
        wall: wall.name,
        message: `${wall.name} meets or crosses ${sayNames(others)} at ${sayRun(stories, run)}, and each is computed as a rectangle by itself: the joined section is stiffer, draws more shear, and its flange adds compression or tension that no check here counts. Design the joined section, or show that the joint is cut.`,
        holds: { walls: [wall.name], ...heldStories(stories, run) },
      });
    }
  });
  const pairs = new Map<string, readonly [number, number]>();
  for (const { a, b, kind } of contacts.flat()) if (kind === 'gap') pairs.set(`${a} ${b}`, [a, b]);
  for (const [a, b] of pairs.values()) {
    const runs = storyRuns(
      stories.length,
      (story) => (contacts[story] ?? []).find((one) => one.kind === 'gap' && one.a === a && one.b === b) ?? null,
    );
    for (const run of runs) {
      const gap = run.facts.reduce((least, one) => Math.min(least, one.gapIn), Number.POSITIVE_INFINITY);
      warnings.push({
        code: 'coupled',
        level: levelOf(stories, run),
        wall: name(a),
        message: `${name(a)} and ${name(b)} stand on one line with a clear gap of ${sayLength(gap, units)} at ${sayRun(stories, run)}: beams or slabs across it couple them, which moves axial load between the two and can bring one into tension. They are computed as separate walls; design the coupling, or show that it is cut.`,
        holds: { walls: [name(a), name(b)], ...heldStories(stories, run) },
      });
    }
  }
  const loops = stories.map((_, story) => wallLoops(contacts[story] ?? []).map((loop) => loop.map(name)));
  const seen = new Map<string, readonly string[]>();
  for (const loop of loops.flat()) seen.set(loop.join('\n'), loop);
  for (const [key, loop] of seen) {
    const runs = storyRuns(stories.length, (story) =>
      (loops[story] ?? []).some((one) => one.join('\n') === key) ? key : null,
    );
    for (const run of runs) {
      warnings.push({
        code: 'core',
        level: levelOf(stories, run),
        wall: loop[0] ?? '',
        message: `${sayNames(loop)} close a loop at ${sayRun(stories, run)}, short gaps counted as closed: a core turns far less than its walls by themselves, so that the torsional shares of all walls are others than these. Compare with a model of the core.`,
        holds: { walls: loop, ...heldStories(stories, run) },
      });
    }
  }
  return warnings;
}

/** Walls that meet wall `index`, in order. */
const metBy = (contacts: readonly WallContact[], index: number): number[] =>
  contacts
    .filter(({ kind, a, b }) => kind === 'meet' && (a === index || b === index))
    .map(({ a, b }) => (a === index ? b : a))
    .sort((one, other) => one - other);
