import type { CellValue } from '#shared/contracts/tables';
import { parseNumber } from '#shared/csv/parseNumber';
import type { LevelRow } from '#shared/engineering/input';
import { levelOrder } from '#shared/engineering/model/check-tables/levelOrder';
import { equivalentForces, heightExponent, type StoryForce } from '#shared/story-forces/equivalentForces';

export interface StoryForceDraft {
  readonly case: string;
  readonly direction: 'x' | 'y';
  readonly baseShear: string;
  readonly period: string;
}

export type StoryForceAnswer =
  | { readonly ok: true; readonly exponent: number; readonly forces: readonly StoryForce[] }
  /** `field` null: the levels are to blame */
  | { readonly ok: false; readonly field: keyof StoryForceDraft | null; readonly message: string };

/** Forces of the equivalent lateral force procedure for a new case, or what stands in their way. A case with rows keeps them. */
export function storyForces(
  draft: StoryForceDraft,
  levels: readonly LevelRow[],
  cases: readonly string[],
): StoryForceAnswer {
  const refuse = (field: keyof StoryForceDraft | null, message: string): StoryForceAnswer => ({
    ok: false,
    field,
    message,
  });
  const name = draft.case.trim();
  if (name === '') return refuse('case', 'read nothing, expected a name for the case');
  if (cases.includes(name)) {
    return refuse('case', `${name} has forces of its own, which stay; name another case or delete its rows first`);
  }
  const baseShear = parseNumber(draft.baseShear);
  if (!baseShear.ok || !(baseShear.value > 0)) {
    return refuse('baseShear', `read ${draft.baseShear || 'nothing'}, expected a force above 0`);
  }
  const period = parseNumber(draft.period);
  if (!period.ok || !(period.value > 0)) {
    return refuse('period', `read ${draft.period || 'nothing'}, expected the period in seconds, above 0`);
  }
  const bare = levels.filter(({ weight }) => weight === null).map(({ level }) => level);
  if (levels.length === 0 || bare.length > 0) {
    const names = bare.slice(0, 6).join(', ');
    const more = bare.length > 6 ? ` and ${bare.length - 6} more` : '';
    return refuse(null, `expected a weight for every level of the levels table; ${names}${more} have none`);
  }
  let height = 0;
  const weighted = levelOrder(levels).flatMap((index) => {
    const row = levels[index];
    if (!row) return [];
    height += row.height;
    return [{ level: row.level, weight: row.weight ?? 0, height }];
  });
  const forces = equivalentForces(weighted.reverse(), baseShear.value, period.value);
  if (forces === null) return refuse(null, 'the weights of all levels are 0, expected some weight');
  return { ok: true, exponent: heightExponent(period.value), forces };
}

/** Rows of the forces table, from the top down: level forces, or story shears where the table holds those. */
export function storyForceRows(
  { case: name, direction }: StoryForceDraft,
  forces: readonly StoryForce[],
  forcesAre: 'level-force' | 'story-shear',
): Readonly<Record<string, CellValue>>[] {
  return forces.map(({ level, force, shear }) => {
    const value = forcesAre === 'story-shear' ? shear : force;
    return {
      level,
      case: name.trim(),
      kind: 'seismic',
      fx: direction === 'x' ? value : 0,
      fy: direction === 'y' ? value : 0,
    };
  });
}
