import { gravityBalance, lateralBalance } from './balance/balanceLines.ts';
import type { BalanceEntry } from './balance/balanceLines.ts';
import { expandCombinations } from './combinations/expandCombinations.ts';
import type { ExpandedCombination, FactoredCombination } from './combinations/expandCombinations.ts';
import type { BasisForces } from './combinations/wallDemand.ts';
import { wallDemand } from './combinations/wallDemand.ts';
import { lateralActions } from './distribution/lateralActions.ts';
import type { LateralAction } from './distribution/lateralActions.ts';
import { rigidBasis } from './distribution/rigidBasis.ts';
import type { BasisShares } from './distribution/rigidBasis.ts';
import type { StoryStiffness } from './distribution/storyStiffness.ts';
import type { BuildingInput, Problem } from './input.ts';
import type { Model } from './model/model.ts';
import { toModel } from './model/toModel.ts';
import { storyRigidities } from './rigidity/storyRigidities.ts';
import { designWall } from './schedule/designWall.ts';
import { gravityTakedown } from './takedown/gravityTakedown.ts';
import type { GravityTakedown } from './takedown/gravityTakedown.ts';
import { lateralMoments } from './takedown/lateralMoments.ts';
import { transferPoints } from './takedown/transferred.ts';
import type { TransferPoint } from './takedown/transferred.ts';
import type { PinnedBand, WallDemand, WallDesign } from './wall-design/designTypes.ts';

/** Shares, shears and moments of one basis, `[action][story][wall]`. */
export interface BasisResult extends BasisForces {
  readonly shares: BasisShares;
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
  /** one list per basis, in the order of `bases` */
  readonly balance: readonly (readonly BalanceEntry[])[];
  readonly expansions: readonly ExpandedCombination[];
  readonly gravitySetCount: number;
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

  const actions = lateralActions(model);
  const rigid = rigidBasis(model, rigidities, actions);
  if ('problems' in rigid) return { ok: false, problems: rigid.problems };
  yield 'distribution';

  const momentKipIn = lateralMoments(model, rigid.shares.totalKip, actions.length);
  const bases: BasisResult[] = [{ basis: 'rigid', shares: rigid.shares, shearKip: rigid.shares.totalKip, momentKipIn }];
  const gravity = gravityTakedown(model);
  const transfers = transferPoints(model);
  yield 'takedown';

  const vertical = gravityBalance(model, gravity, transfers);
  const balance = bases.map((basis) => [
    ...actions.flatMap((action, index) =>
      lateralBalance(model, action, index, basis.shearKip, basis.momentKipIn, transfers),
    ),
    ...vertical,
  ]);
  yield 'balance';

  const { expansions, gravitySetCount } = expandCombinations(input.combinations, actions);
  const analysis: Analysis = {
    model,
    rigidities,
    stiffness: rigid.stiffness,
    actions,
    bases,
    gravity,
    transfers,
    balance,
    expansions,
    gravitySetCount,
  };
  yield 'combinations';

  const walls: WallOutcome[] = [];
  for (let index = 0; index < model.walls.length; index += 1) {
    const demand = wallDemand(model, gravity, bases, expansions, gravitySetCount, index);
    walls.push({ demand, design: designWall(demand, model.settings, input.pinned) });
    yield 'design';
  }
  return { ok: true, analysis, walls };
}
