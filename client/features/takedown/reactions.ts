import type { ResultDocument, ResultLevel } from '#shared/contracts/result';
import type { WallRow } from '#shared/engineering/input';

import type { ResultChoice } from '../../components/drawing/resultChoice.ts';
import type { Reaction } from './ReactionTable.tsx';
import { gravityCases, wallBases, type GravityCase } from './wallStories.ts';

/** Forces at the foot of every wall for the case and variant in view. */
export function baseReactions(
  document: ResultDocument,
  down: readonly ResultLevel[],
  names: readonly string[],
  chosen: ResultChoice,
): readonly Reaction[] {
  const lowest = down.at(-1)?.level;
  return wallBases(document, down, names).map(({ wall, level }) => {
    const gravity = { D: 0, L: 0, Lr: 0, S: 0 } satisfies Record<GravityCase, number>;
    for (const one of document.gravity) {
      const name = gravityCases.find((candidate) => candidate === one.case);
      if (one.wall === wall && one.level === level && name) gravity[name] += one.axial;
    }
    const lateral = document.lateral.find(
      (one) =>
        one.wall === wall &&
        one.level === level &&
        one.case === chosen.case &&
        one.variant === chosen.variant &&
        one.basis === chosen.basis,
    );
    return {
      wall,
      level,
      atBase: level === lowest,
      gravity,
      shear: lateral?.shear ?? 0,
      moment: lateral?.moment ?? 0,
    };
  });
}

/** Sum of the base shears along the story shear of the lowest story: it is the base shear of the case. */
export function baseShearSum(
  document: ResultDocument,
  down: readonly ResultLevel[],
  reactions: readonly Reaction[],
  walls: readonly WallRow[],
  caseName: string,
): number {
  const lowest = down.at(-1);
  const { vx = 0, vy = 0 } = lowest?.shear[caseName] ?? {};
  const size = Math.sqrt(vx * vx + vy * vy);
  if (size === 0 || !lowest) return 0;
  return reactions.reduce((sum, { wall, atBase, shear }) => {
    const row = walls.find((one) => one.wall === wall && one.from_level === lowest.level);
    if (!atBase || !row) return sum;
    const [dx, dy] = [row.x2 - row.x1, row.y2 - row.y1];
    return sum + (shear * (dx * vx + dy * vy)) / Math.sqrt(dx * dx + dy * dy) / size;
  }, 0);
}
