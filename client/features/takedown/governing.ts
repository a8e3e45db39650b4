import type { ResultAction, ResultDocument } from '#shared/contracts/result';
import type { Basis } from '#shared/engineering/input';

export type Effect = 'Pmax' | 'Pmin' | 'moment' | 'shear';

export interface Governing {
  readonly effect: Effect;
  readonly value: number;
  readonly action: ResultAction;
}

type Actions = Pick<ResultDocument, 'actions'>;

const measures: Readonly<Record<Effect, (action: ResultAction) => number>> = {
  Pmax: (action) => action.axial,
  Pmin: (action) => -action.axial,
  moment: (action) => Math.abs(action.moment),
  shear: (action) => Math.abs(action.shear),
};

const values: Readonly<Record<Effect, (action: ResultAction) => number>> = {
  Pmax: (action) => action.axial,
  Pmin: (action) => action.axial,
  moment: (action) => action.moment,
  shear: (action) => action.shear,
};

/** The combination that governs each effect in one story of a wall, under one basis or (null) under all; ties by list order. */
export function governing(document: Actions, wall: string, level: string, basis: Basis | null): readonly Governing[] {
  const here = document.actions.filter(
    (one) => one.wall === wall && one.level === level && (basis === null || one.basis === basis),
  );
  return (['Pmax', 'Pmin', 'moment', 'shear'] as const).flatMap((effect): Governing[] => {
    const measure = measures[effect];
    const action = here.reduce<ResultAction | null>(
      (worst, one) => (worst === null || measure(one) > measure(worst) ? one : worst),
      null,
    );
    return action === null ? [] : [{ effect, value: values[effect](action), action }];
  });
}

/** Smallest and largest axial of every story over all listed combinations and bases; null where the wall does not stand. */
export function axialRange(
  document: Actions,
  wall: string,
  levels: readonly string[],
): readonly ({ readonly least: number; readonly most: number } | null)[] {
  const ranges = new Map<string, { least: number; most: number }>();
  for (const one of document.actions) {
    if (one.wall !== wall) continue;
    const range = ranges.get(one.level);
    ranges.set(one.level, {
      least: Math.min(one.axial, range?.least ?? one.axial),
      most: Math.max(one.axial, range?.most ?? one.axial),
    });
  }
  return levels.map((level) => ranges.get(level) ?? null);
}
