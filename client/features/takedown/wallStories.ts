import type { ResultDocument, ResultLevel, Variant } from '#shared/contracts/result';
import type { Basis } from '#shared/engineering/input';

export const gravityCases = ['D', 'L', 'Lr', 'S'] as const;
export type GravityCase = (typeof gravityCases)[number];

export interface Force {
  readonly shear: number;
  readonly moment: number;
}

export interface Gravity {
  readonly axial: number;
  readonly moment: number;
}

/** One story of a wall: lateral by case at the variant in view, gravity by case; null where the wall does not stand. */
export interface WallStory {
  readonly level: string;
  readonly lateral: ReadonlyMap<string, Force>;
  readonly gravity: ReadonlyMap<string, Gravity>;
}

export interface LateralChoice {
  readonly basis: Basis;
  readonly variant: Variant;
}

const none: ReadonlyMap<string, never> = new Map<string, never>();

/** The chosen variant where a case has it, else the case as built. */
export function variantOf(document: ResultDocument, caseName: string, wanted: Variant): Variant {
  const has = document.lateral.some((one) => one.case === caseName && one.variant === wanted);
  return has ? wanted : '0';
}

/** A wall's stories from the top down; levels in which it does not stand have no entries. */
export function wallStories(
  document: ResultDocument,
  down: readonly ResultLevel[],
  wall: string,
  choice: LateralChoice,
): readonly WallStory[] {
  const cases = [...new Set(document.lateral.map((one) => one.case))];
  const variants = new Map(cases.map((name) => [name, variantOf(document, name, choice.variant)]));
  const lateral = new Map<string, Map<string, Force>>();
  for (const one of document.lateral) {
    if (one.wall !== wall || one.basis !== choice.basis || one.variant !== variants.get(one.case)) continue;
    const story = lateral.get(one.level) ?? new Map<string, Force>();
    lateral.set(one.level, story.set(one.case, { shear: one.shear, moment: one.moment }));
  }
  const gravity = new Map<string, Map<string, Gravity>>();
  for (const one of document.gravity) {
    if (one.wall !== wall) continue;
    const story = gravity.get(one.level) ?? new Map<string, Gravity>();
    gravity.set(one.level, story.set(one.case, { axial: one.axial, moment: one.moment }));
  }
  return down.map(({ level }) => ({
    level,
    lateral: lateral.get(level) ?? none,
    gravity: gravity.get(level) ?? none,
  }));
}

/** Least and largest of a case over bases and variants, story by story. */
export function caseEnvelope(
  document: ResultDocument,
  down: readonly ResultLevel[],
  wall: string,
  caseName: string,
  pick: (force: Force) => number,
): readonly ({ readonly least: number; readonly most: number } | null)[] {
  return down.map(({ level }) => {
    const values = document.lateral
      .filter((one) => one.wall === wall && one.case === caseName && one.level === level)
      .map(pick);
    return values.length === 0 ? null : { least: Math.min(...values), most: Math.max(...values) };
  });
}

/** Walls in the order of their names, each with the lowest story that it stands in. */
export function wallBases(
  document: ResultDocument,
  down: readonly ResultLevel[],
  names: readonly string[],
): readonly { readonly wall: string; readonly level: string }[] {
  const place = new Map(down.map((level, index) => [level.level, index]));
  const lowest = new Map<string, string>();
  for (const { wall, level } of document.gravity) {
    const before = lowest.get(wall);
    if (before === undefined || (place.get(level) ?? 0) > (place.get(before) ?? 0)) lowest.set(wall, level);
  }
  return names.flatMap((wall) => {
    const level = lowest.get(wall);
    return level === undefined ? [] : [{ wall, level }];
  });
}
