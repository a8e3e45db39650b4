import type { BuildingInput, Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

/** Named limits that can be read off the plan and the levels. */
export function planWarnings(building: BuildingInput, analysis: Analysis): Warning[] {
  const { model, transfers } = analysis;
  const roof = model.stories.length - 1;
  const warnings: Warning[] = [];
  for (const story of model.stories) {
    if (!story.extentAssumed) continue;
    warnings.push({
      code: 'plan-size-assumed',
      level: story.level,
      message: `The extent of ${story.level} is taken from its wall ends: accidental eccentricity depends on it. Give extent_x and extent_y, and the level's point or edge.`,
    });
  }
  for (const { level, diaphragm } of building.tables.levels) {
    if (diaphragm !== 'flexible') continue;
    warnings.push({
      code: 'diaphragm-contradicts',
      level,
      message: `${level} is entered with a flexible diaphragm, but shears are shared under the rigid basis.`,
    });
  }
  for (const { wallIndex, level } of transfers) {
    const wall = model.walls[wallIndex]?.name;
    warnings.push({
      code: 'transfer-not-assigned',
      level,
      ...(wall === undefined ? {} : { wall }),
      message: `${wall} starts above the base and arrives on ${level}: what it brings down is listed as transferred and added to no wall below.`,
    });
  }
  for (const wall of model.walls) {
    const open = wall.segments.find((segment) => segment.opening > 0);
    if (wall.toStory < roof) {
      warnings.push({
        code: 'wall-stops-below-roof',
        level: model.stories[wall.toStory]?.level ?? '',
        wall: wall.name,
        message: `${wall.name} stops at ${model.stories[wall.toStory]?.level}: where a wall ends, story-by-story shares can hide a reversal of shear in the walls that go on.`,
      });
    }
    if (open) {
      warnings.push({
        code: 'opening-solid',
        level: model.stories[open.story]?.level ?? '',
        wall: wall.name,
        message: `${wall.name} has openings: its self-weight is net of them, its stiffness and strength are those of the solid wall.`,
      });
    }
  }
  return warnings;
}
