import type { LevelRow, UnitSystem } from '../../input.ts';

import { geometryTolerance } from './findings.ts';
import { contradictingElevations, levelOrder } from './levelOrder.ts';

import type { Findings } from './findings.ts';

/** levels.csv by itself: names once each, extents whole, elevations in step with heights. */
export function checkLevels(levels: readonly LevelRow[], units: UnitSystem, findings: Findings): void {
  const first = new Map<string, number>();
  levels.forEach((row, index) => {
    if (row.level === '') return;
    const earlier = first.get(row.level);
    if (earlier === undefined) first.set(row.level, index);
    else
      findings.refuse(
        'levels',
        index,
        'level',
        `level reads ${row.level} a second time, expected each level once; rename or take out one of the two rows`,
      );
  });
  levels.forEach((row, index) => {
    if ((row.extent_x === null) !== (row.extent_y === null)) {
      const [missing, given] = row.extent_x === null ? ['extent_x', 'extent_y'] : ['extent_y', 'extent_x'];
      findings.refuse(
        'levels',
        index,
        missing,
        `${missing} is empty beside ${given}, expected both or neither; fill it or clear the other`,
      );
    }
    if (row.extent_x === null && row.extent_y === null && (row.edge_x !== null || row.edge_y !== null)) {
      findings.notices.push({
        code: 'edge-unused',
        level: row.level,
        message: `level ${row.level}: edge_x and edge_y are not used without extent_x and extent_y; the plan is taken from the wall ends`,
      });
    }
  });
  const tolerance = geometryTolerance[units];
  for (const index of contradictingElevations(levels, levelOrder(levels), tolerance).sort((a, b) => a - b)) {
    const row = levels[index];
    if (!row) continue;
    findings.refuse(
      'levels',
      index,
      'elevation',
      `elevation reads ${row.elevation}, expected the elevation below plus the heights between, within ${units === 'us' ? '1/16 in' : '1 mm'}; correct one of them or clear the elevations`,
    );
  }
}
