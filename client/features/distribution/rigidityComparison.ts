import type { BuildingInput } from '#shared/engineering/input';
import { checkTables } from '#shared/engineering/model/check-tables/checkTables';
import { toModel } from '#shared/engineering/model/toModel';
import {
  compareRigidityModels,
  rigidityModels,
  type ComparedWall,
  type RigidityModel,
} from '#shared/engineering/rigidity/compareModels';
import { formatShare } from '#shared/format/force';

/** Shares of the story's walls under each rigidity model; null where the tables do not fit together. */
export function rigidityComparison(input: BuildingInput, level: string): readonly ComparedWall[] | null {
  if (checkTables(input, { complete: true }).problems.length > 0) return null;
  const model = toModel(input);
  const story = model.stories.findIndex((one) => one.level === level);
  return story < 0 ? null : compareRigidityModels(model, story);
}

export interface FarthestModel {
  readonly wall: string;
  readonly model: RigidityModel;
  readonly asSet: number;
  readonly share: number;
}

/** Of each wall the model that moves its share most, where it does by more than half a percent of the story. */
export function farthestModel(wall: ComparedWall): FarthestModel | null {
  const asSet = wall.share['as set'];
  let farthest: FarthestModel | null = null;
  for (const model of rigidityModels) {
    const share = wall.share[model];
    const distance = Math.abs(share - asSet);
    if (distance <= Math.max(0.005, farthest === null ? 0 : Math.abs(farthest.share - asSet))) continue;
    farthest = { wall: wall.wall, model, asSet, share };
  }
  return farthest;
}

/** The wall that the choice of model moves most, in words. */
export function sayComparison(walls: readonly ComparedWall[]): string {
  const moved = walls.map(farthestModel).filter((one) => one !== null);
  const most = moved.reduce<FarthestModel | null>(
    (far, one) => (far === null || Math.abs(one.share - one.asSet) > Math.abs(far.share - far.asSet) ? one : far),
    null,
  );
  if (most === null) return 'No model moves a share by more than 0.5 % of the story: the choice does not matter here.';
  return `${most.wall} moves most: ${formatShare(most.asSet)} as set, ${formatShare(most.share)} with ${most.model}. Where models lie far apart, the shares rest on a judgement; say it on the sheet.`;
}
