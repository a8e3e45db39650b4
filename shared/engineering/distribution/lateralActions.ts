import type { Model } from '../model/model.ts';

export type Variant = '0' | '+' | '-';

/**
 * One lateral case with one sense of accidental eccentricity, as level forces and as story actions (sums over levels at and
 * above), all about the plan's origin; `[story]`, kip and kip-in.
 */
export interface LateralAction {
  readonly caseIndex: number;
  readonly case: string;
  readonly kind: 'wind' | 'seismic' | 'other';
  readonly direction: 'x' | 'y';
  /** `torsion`: no force, the case's own extent lever as torque; combinations build wind cases from it, results don't list it */
  readonly variant: Variant | 'torsion';
  readonly levelFxKip: Float64Array;
  readonly levelFyKip: Float64Array;
  readonly levelTorqueKipIn: Float64Array;
  readonly storyFxKip: Float64Array;
  readonly storyFyKip: Float64Array;
  readonly storyTorqueKipIn: Float64Array;
}

/** Ax of every seismic case at every level, by case index; 1 where none is given (ASCE/SEI 7 12.8.4.3). */
export type Amplification = ReadonlyMap<number, Float64Array>;

/**
 * Every case as variant 0; seismic cases also as + and - where accidental eccentricity is asked for: mz gains plus or minus
 * Ax x accidental x (extent_x Fy - extent_y Fx), each level by its own extent and Ax (ASCE/SEI 7 12.8.4.2). With wind cases asked
 * for, each wind case also as the torque of a unit eccentricity.
 */
export function lateralActions(model: Model, amplification: Amplification = new Map()): LateralAction[] {
  const { accidental, windCases } = model.settings;
  return model.cases.flatMap((loadCase, caseIndex) => {
    const { kind } = loadCase;
    const variants: LateralAction['variant'][] =
      kind === 'seismic' && accidental > 0 ? ['0', '+', '-'] : kind === 'wind' && windCases ? ['0', 'torsion'] : ['0'];
    const lever = model.stories.map(
      ({ extentXIn, extentYIn }, story) =>
        extentXIn * (loadCase.fyKip[story] ?? 0) - extentYIn * (loadCase.fxKip[story] ?? 0),
    );
    const ax = amplification.get(caseIndex);
    return variants.map((variant): LateralAction => {
      const sense = variant === '+' ? accidental : variant === '-' ? -accidental : 0;
      const pure = variant === 'torsion';
      const levelFxKip = pure ? new Float64Array(lever.length) : loadCase.fxKip;
      const levelFyKip = pure ? new Float64Array(lever.length) : loadCase.fyKip;
      const levelTorqueKipIn = Float64Array.from(lever, (value, story) =>
        pure ? value : (loadCase.torqueKipIn[story] ?? 0) + (sense === 0 ? 0 : sense * (ax?.[story] ?? 1) * value),
      );
      return {
        caseIndex,
        case: loadCase.name,
        kind,
        direction: loadCase.direction,
        variant,
        levelFxKip,
        levelFyKip,
        levelTorqueKipIn,
        storyFxKip: sumFromTop(levelFxKip),
        storyFyKip: sumFromTop(levelFyKip),
        storyTorqueKipIn: sumFromTop(levelTorqueKipIn),
      };
    });
  });
}

/** Running sum from the highest story down. */
export function sumFromTop(levels: Float64Array): Float64Array {
  const sums = new Float64Array(levels.length);
  let sum = 0;
  for (let story = levels.length - 1; story >= 0; story -= 1) {
    sum += levels[story] ?? 0;
    sums[story] = sum;
  }
  return sums;
}
