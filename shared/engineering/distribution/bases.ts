import { amplification, fullAmplification } from '../drift/amplification.ts';
import type { StoryDrift } from '../drift/storyDrifts.ts';
import { storyDrifts } from '../drift/storyDrifts.ts';
import type { Basis, Problem, Warning } from '../input.ts';
import type { Model } from '../model/model.ts';

import { applyShares } from './applyShares.ts';
import { flexibleBasis } from './flexibleBasis.ts';
import type { LateralAction } from './lateralActions.ts';
import { lateralActions } from './lateralActions.ts';
import { rigidBasis, storyStiffnesses } from './rigidBasis.ts';
import type { BasisShares } from './rigidBasis.ts';
import type { StoryStiffness } from './storyStiffness.ts';
import type { WholeHeight, WholeHeightSolution } from './wholeHeight.ts';
import { assembleWholeHeight, solveWholeHeight } from './wholeHeight.ts';

/** Wall shears of one basis; `alongX`, `alongY` only in `flexible`, whose balance is struck in each direction by itself. */
export interface BasisShears {
  readonly basis: Basis;
  readonly shares: BasisShares;
  readonly along: { readonly xKip: Float64Array; readonly yKip: Float64Array } | null;
  /** what an engineer's shares leave open, `[action * stories + story]`; null without them */
  readonly openTorqueKipIn: Float64Array | null;
}

export interface Distribution {
  readonly actions: readonly LateralAction[];
  readonly stiffness: readonly StoryStiffness[];
  readonly bases: readonly BasisShears[];
  readonly drifts: readonly StoryDrift[];
  readonly displacements: { readonly whole: WholeHeight; readonly solutions: readonly WholeHeightSolution[] } | null;
  readonly warnings: readonly Warning[];
}

/**
 * Every basis that is asked for, on the same actions, and the displacements of the whole-height solution, made for this purpose
 * whatever the bases say. A basis that can't be made is left out with a warning, or refused where it is the only one.
 */
export function distribute(
  model: Model,
  rigidities: Float64Array,
): { readonly problems: readonly Problem[] } | Distribution {
  const stories = storyStiffnesses(model, rigidities);
  if ('problems' in stories) return stories;
  const wanted = model.settings.basis.filter((basis) => basis !== 'envelope');
  const warnings: Warning[] = [];
  const assembled = assembleWholeHeight(model, model.settings.baseSprings);
  const whole = 'factor' in assembled ? assembled : null;
  const plain = lateralActions(model);
  const solve = (actions: readonly LateralAction[]) =>
    whole ? actions.map((action) => solveWholeHeight(model, whole, action)) : [];
  const first = solve(plain);
  const firstDisplacements = first.map(({ displacement }) => displacement);
  const factors = whole ? amplification(model, whole, plain, firstDisplacements) : new Map<number, Float64Array>();
  const amplified = model.settings.amplify && model.settings.accidental > 0;
  const actions = amplified ? lateralActions(model, whole ? factors : fullAmplification(model)) : plain;
  const solutions = amplified ? solve(actions) : first;
  const displacements = solutions.map(({ displacement }) => displacement);

  const bases: Omit<BasisShears, 'openTorqueKipIn'>[] = [];
  const missing: { readonly basis: Basis; readonly why: string; readonly wall: string | null }[] = [];
  for (const basis of wanted) {
    if (basis === 'rigid') {
      bases.push({ basis, shares: rigidBasis(model, rigidities, stories.stiffness, actions), along: null });
    } else if (basis === 'compatible') {
      if (whole) {
        const size = model.stories.length * model.walls.length;
        const totalKip = new Float64Array(actions.length * size);
        solutions.forEach(({ shearKip }, index) => totalKip.set(shearKip, index * size));
        bases.push({ basis, shares: { directKip: null, torsionalKip: null, totalKip }, along: null });
      } else {
        const walls = 'walls' in assembled ? assembled.walls : null;
        const wall = walls?.[0] ?? null;
        const why = walls
          ? `${walls.join(', ')} ${walls.length === 1 ? 'starts' : 'start'} above the base and can't be in the whole-height solution`
          : 'a floor can move freely in the whole-height solution';
        missing.push({ basis, why, wall });
      }
    } else {
      const outcome = flexibleBasis(model, rigidities, actions);
      if ('lack' in outcome) {
        missing.push({
          basis,
          why: [outcome.wall, outcome.lack].filter((part) => part !== null).join(' '),
          wall: outcome.wall,
        });
      } else {
        const { totalKip, alongXKip, alongYKip } = outcome;
        bases.push({
          basis,
          shares: { directKip: null, torsionalKip: null, totalKip },
          along: { xKip: alongXKip, yKip: alongYKip },
        });
      }
    }
  }
  if (bases.length === 0) {
    return {
      problems: missing.map(({ basis, why }) => ({
        table: 'building',
        row: null,
        column: 'basis',
        message: `The basis ${basis} can't be used: ${why}. Choose another basis.`,
      })),
    };
  }
  for (const { basis, why, wall } of missing) {
    warnings.push({
      code: 'basis-unavailable',
      ...(wall === null ? {} : { wall }),
      message: `The basis ${basis} is left out: ${why}. The others stand.`,
    });
  }
  const shared = bases.map((basis) => {
    const shears = { totalKip: basis.shares.totalKip, along: basis.along };
    return { ...basis, openTorqueKipIn: applyShares(model, rigidities, actions, shears) };
  });
  if (!whole) {
    warnings.push({
      code: 'drift-not-available',
      message: `Drift, torsion ratio and stability come from the whole-height solution, which can't be made here${amplified ? ', so that Ax is taken as 3' : ''}. Nothing that needs them reads ok.`,
    });
  }
  const drifts = whole ? storyDrifts(model, whole, actions, displacements, firstDisplacements, factors) : [];
  return {
    actions,
    stiffness: stories.stiffness,
    bases: shared,
    drifts,
    displacements: whole ? { whole, solutions: displacements } : null,
    warnings,
  };
}
