import { gravityBalance } from './balance/balanceLines.ts';
import { lateralBalance } from './balance/lateralBalance.ts';
import type { BalanceEntry } from './balance/balanceLines.ts';
import { expandCombinations } from './combinations/expandCombinations.ts';
import type { FactoredCombination } from './combinations/expandCombinations.ts';
import type { BasisForces } from './combinations/wallDemand.ts';
import { wallDemand } from './combinations/wallDemand.ts';
import { distribute } from './distribution/bases.ts';
import type { Distribution } from './distribution/bases.ts';
import type { LateralAction } from './distribution/lateralActions.ts';
import type { BasisShares } from './distribution/rigidBasis.ts';
import type { StoryStiffness } from './distribution/storyStiffness.ts';
import type { StoryDrift } from './drift/storyDrifts.ts';
import type { BuildingInput, Problem, Warning } from './input.ts';
import type { Model } from './model/model.ts';
import { toModel } from './model/toModel.ts';
import { storyRigidities } from './rigidity/storyRigidities.ts';
import { designWall } from './schedule/designWall.ts';
import { gravityTakedown } from './takedown/gravityTakedown.ts';
import type { GravityTakedown } from './takedown/gravityTakedown.ts';
import { lateralMoments } from './takedown/lateralMoments.ts';
import { transferEffects } from './takedown/transferEffects.ts';
import type { TransferEffects } from './takedown/transferEffects.ts';
import { transferPoints } from './takedown/transferred.ts';
import type { TransferPoint } from './takedown/transferred.ts';
import type { PinnedBand, WallDemand, WallDesign } from './wall-design/designTypes.ts';

/** Shares, shears, moments and combinations of one basis. */
export interface BasisResult extends BasisForces {
  readonly shares: BasisShares;
  readonly along: { readonly xKip: Float64Array; readonly yKip: Float64Array } | null;
  readonly openTorqueKipIn: Float64Array | null;
}

/** Everything before design, as columns. */
export interface Analysis {
  readonly model: Model;
  readonly rigidities: Float64Array;
  readonly stiffness: readonly StoryStiffness[];
  readonly actions: readonly LateralAction[];
  readonly bases: readonly BasisResult[];
  readonly gravity: GravityTakedown;
  readonly transfers: readonly TransferPoint[];
  readonly effects: TransferEffects | null;
  readonly drifts: readonly StoryDrift[];
  readonly displacements: Distribution['displacements'];
  /** one list per basis, in the order of `bases` */
  readonly balance: readonly (readonly BalanceEntry[])[];
  readonly gravitySetCount: number;
  /** what the distribution had to leave out */
  readonly warnings: readonly Warning[];
}

export interface ChainInput {
  readonly building: BuildingInput;
  readonly combinations: readonly FactoredCombination[];
  readonly pinned: readonly PinnedBand[];
}

export interface WallOutcome {
  readonly demand: WallDemand;
  readonly design: WallDesign;
}

/** What the chain says while it runs: which stage has just ended. Design speaks once a wall. */
export type StageName = 'geometry' | 'rigidity' | 'distribution' | 'takedown' | 'balance' | 'combinations' | 'design';

export type ChainOutcome =
  | { readonly ok: false; readonly problems: readonly Problem[] }
  | { readonly ok: true; readonly analysis: Analysis; readonly walls: readonly WallOutcome[] };

/**
 * The pipeline from typed tables to designed walls, one stage after the other: model, rigidity, distribution per basis,
 * takedown, balance, combinations, then design wall by wall. It hands over after every stage, so that the caller can time it
 * with its own clock, let a newer edit supersede it, or stop. Assumes tables that passed `checkTables`; a building that can't be
 * distributed is answered with problems.
 */
export function* chain(input: ChainInput): Generator<StageName, ChainOutcome, void> {
  const model = toModel(input.building);
  yield 'geometry';

  const rigidities = storyRigidities(model);
  yield 'rigidity';

  const distribution = distribute(model, rigidities);
  if ('problems' in distribution) return { ok: false, problems: distribution.problems };
  const { actions } = distribution;
  yield 'distribution';

  const gravity = gravityTakedown(model);
  const transfers = transferPoints(model);
  const effects = transferEffects(model, actions);
  const eccentric = expandCombinations(input.combinations, actions, model.settings, true);
  const plain = expandCombinations(input.combinations, actions, model.settings, false);
  const bases = distribution.bases.map(({ basis, shares, along, openTorqueKipIn }) => {
    const shearKip = plus(shares.totalKip, effects?.shearKip ?? null);
    const momentKipIn = plus(lateralMoments(model, shares.totalKip, actions.length), effects?.momentKipIn ?? null);
    const { expansions } = along ? plain : eccentric;
    const axialKip = effects?.axialKip ?? null;
    return { basis, shares, along, openTorqueKipIn, shearKip, momentKipIn, axialKip, expansions };
  });
  yield 'takedown';

  const vertical = gravityBalance(model, gravity, transfers);
  const balance = bases.map((basis) => [
    ...actions.flatMap((action, index) =>
      listed(action, basis.along !== null) ? lateralBalance(model, action, index, basis, effects, transfers) : [],
    ),
    ...vertical,
  ]);
  yield 'balance';

  const { gravitySetCount } = eccentric;
  const analysis: Analysis = {
    model,
    rigidities,
    stiffness: distribution.stiffness,
    actions,
    bases,
    gravity,
    transfers,
    effects,
    drifts: distribution.drifts,
    displacements: distribution.displacements,
    balance,
    gravitySetCount,
    warnings: distribution.warnings,
  };
  yield 'combinations';

  const walls: WallOutcome[] = [];
  for (let index = 0; index < model.walls.length; index += 1) {
    const demand = wallDemand(model, gravity, bases, gravitySetCount, index);
    walls.push({ demand, design: designWall(demand, model.settings, input.pinned) });
    yield 'design';
  }
  return { ok: true, analysis, walls };
}

/** Whether results list an action in a basis: flexible floors know no accidental eccentricity, and torques of wind cases are parts only. */
export function listed(action: LateralAction, flexible: boolean): boolean {
  return flexible ? action.variant === '0' : action.variant !== 'torsion';
}

function plus(column: Float64Array, more: Float64Array | null): Float64Array {
  return more === null ? column : column.map((value, index) => value + (more[index] ?? 0));
}
