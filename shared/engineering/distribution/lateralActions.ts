import type { Model } from '../model/model.ts';

export type Variant = '0' | '+' | '-';

/**
 * One lateral case with one sense of accidental eccentricity. Level forces and story actions (sums over levels at and above),
 * all about the plan's origin; `[story]`, kip and kip-in.
 */
export interface LateralAction {
  readonly caseIndex: number;
  readonly case: string;
  readonly kind: 'wind' | 'seismic' | 'other';
  readonly variant: Variant;
  readonly storyFxKip: Float64Array;
  readonly storyFyKip: Float64Array;
  readonly storyTorqueKipIn: Float64Array;
}

/**
 * Every case as variant 0; seismic cases also as + and - where accidental eccentricity is asked for: mz gains plus or minus
 * accidental x (extent_x Fy - extent_y Fx), each level by its own extent (ASCE/SEI 7 12.8.4.2, with Ax = 1).
 */
export function lateralActions(model: Model): LateralAction[] {
  const { accidental } = model.settings;
  return model.cases.flatMap((loadCase, caseIndex) => {
    const variants: Variant[] = loadCase.kind === 'seismic' && accidental > 0 ? ['0', '+', '-'] : ['0'];
    return variants.map((variant) => {
      const sense = variant === '0' ? 0 : variant === '+' ? accidental : -accidental;
      const torque = loadCase.torqueKipIn.map((value, story) => {
        const level = model.stories[story];
        if (!level || sense === 0) return value;
        const lever = level.extentXIn * (loadCase.fyKip[story] ?? 0) - level.extentYIn * (loadCase.fxKip[story] ?? 0);
        return value + sense * lever;
      });
      return {
        caseIndex,
        case: loadCase.name,
        kind: loadCase.kind,
        variant,
        storyFxKip: sumFromTop(loadCase.fxKip),
        storyFyKip: sumFromTop(loadCase.fyKip),
        storyTorqueKipIn: sumFromTop(torque),
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
