import type { BuildingInput, Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

/** What the chosen method can't say, so that no one reads silence as an answer. */
export function methodWarnings(building: BuildingInput, analysis: Analysis): Warning[] {
  const warnings: Warning[] = [];
  if (analysis.model.stories.length > 1 && building.settings.basis.every((basis) => basis === 'rigid')) {
    warnings.push({
      code: 'rigid-only',
      message:
        'Shares are by relative rigidity story by story. From three stories up this can under-load the longer walls, by 8 to 11 % of the base moment for walls of 15 and 25 ft: compare with a whole-height solution.',
    });
  }
  const sharesGiven = building.tables.walls.some((row) => row.share_x !== null || row.share_y !== null);
  if (sharesGiven && !building.settings.basis.includes('flexible')) {
    warnings.push({
      code: 'shares-not-used',
      message: 'share_x and share_y are stored but not used: they belong to the flexible basis.',
    });
  }
  return warnings;
}
