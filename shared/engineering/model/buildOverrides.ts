import type { OverrideRow, Settings } from '../input.ts';
import { unitFactors } from '../units.ts';

import type { Override, Story, WallLine } from './model.ts';

/** Transfers and shares in engine units; rows that name nothing that exists are passed over (checkTables refuses them). */
export function buildOverrides(
  rows: readonly OverrideRow[],
  stories: readonly Story[],
  walls: readonly WallLine[],
  settings: Settings,
): Override[] {
  const factors = unitFactors[settings.units];
  return rows.flatMap((row) => {
    const story = stories.findIndex(({ level }) => level === row.level);
    const wallIndex = walls.findIndex(({ name }) => name === row.wall);
    if (story < 0 || wallIndex < 0) return [];
    return [
      {
        kind: row.kind,
        story,
        wallIndex,
        caseName: row.case,
        shearKip: (row.shear ?? 0) * factors.force,
        axialKip: (row.axial ?? 0) * factors.force,
        momentKipIn: (row.moment ?? 0) * factors.moment,
        share: row.share ?? 0,
      },
    ];
  });
}
