import type { Model } from '../model/model.ts';

import { wallRigidityKipPerIn } from './wallRigidity.ts';

/** Ways of taking a wall's rigidity, to compare how much the choice matters (engineering.md section 2). */
export const rigidityModels = [
  'as set',
  'flexure only',
  'shear only',
  'height to the base',
  'fixed ends',
  'cracked 0.35',
  'uncracked 0.70',
] as const;
export type RigidityModel = (typeof rigidityModels)[number];

export interface ComparedWall {
  readonly wallIndex: number;
  readonly wall: string;
  /** k over the sum of k of the walls that run the same way (within 45 degrees) in the story, by model */
  readonly share: Readonly<Record<RigidityModel, number>>;
}

/** Stands for "rigid": a deformation taken out of the model. */
const endless = 1e12;

/**
 * Shares of relative rigidity among the walls of one story that run the same way, under each model: a table to see whether the choice of
 * model moves the shares. `as set` is the building's own; `cracked` and `uncracked` replace the flexural factor of every wall (ACI
 * 318-19 Table 6.6.3.1.1(a)); `height to the base` measures the cantilever from the wall's base.
 */
export function compareRigidityModels(model: Model, story: number): ComparedWall[] {
  const standing = model.walls.flatMap((wall, wallIndex) => {
    const segment = wall.segments[story - wall.fromStory];
    const level = model.stories[story];
    const base = model.stories[wall.fromStory];
    if (!segment || !level || !base) return [];
    const heights = { story: level.heightIn, base: level.elevationIn - base.bottomElevationIn };
    return [{ wallIndex, wall: wall.name, segment, heights, alongX: Math.abs(segment.cos) >= Math.abs(segment.sin) }];
  });
  const rigidity = (wall: (typeof standing)[number], kind: RigidityModel): number => {
    const { segment, heights } = wall;
    const flexure = { 'shear only': endless, 'cracked 0.35': 0.35, 'uncracked 0.70': 0.7 } as const;
    return wallRigidityKipPerIn({
      heightIn: kind === 'height to the base' ? heights.base : heights.story,
      lengthIn: segment.lengthIn,
      thicknessIn: segment.thicknessIn,
      fcPsi: segment.fcPsi,
      flexureFactor: kind in flexure ? flexure[kind as keyof typeof flexure] : segment.flexureFactor,
      shearFactor: kind === 'flexure only' ? endless : segment.shearFactor,
      endFactor: kind === 'fixed ends' ? 12 : model.settings.endFactor,
      unitWeightPcf: model.settings.stiffnessWeightPcf,
    });
  };
  return standing.map((wall) => {
    const peers = standing.filter((other) => other.alongX === wall.alongX);
    const entries = rigidityModels.map((kind) => {
      const sum = peers.reduce((total, peer) => total + rigidity(peer, kind), 0);
      return [kind, rigidity(wall, kind) / sum] as const;
    });
    return {
      wallIndex: wall.wallIndex,
      wall: wall.wall,
      share: Object.fromEntries(entries) as Record<RigidityModel, number>,
    };
  });
}
