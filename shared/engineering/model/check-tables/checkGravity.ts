import type { GravityRow, WallRow } from '../../input.ts';

import { listNames } from './findings.ts';
import { standsIn } from './standsIn.ts';

import type { WallSpan } from './checkWalls.ts';
import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

const loads = ['dead', 'live', 'roof_live', 'snow'] as const;

/** gravity.csv: levels and walls that exist, the wall standing there; rows of one wall and level add up, with a notice. */
export function checkGravity(
  gravity: readonly GravityRow[],
  walls: readonly WallRow[],
  spans: readonly (WallSpan | null)[],
  levels: LevelIndex,
  findings: Findings,
): void {
  const spansOf = new Map<string, (WallSpan | null)[]>();
  walls.forEach((row, index) => {
    spansOf.set(row.wall, [...(spansOf.get(row.wall) ?? []), spans[index] ?? null]);
  });
  const wallsUsable = walls.length > 0 && !spansOf.has('');
  const wallNames = [...spansOf.keys()];
  const seen = new Map<string, number>();
  gravity.forEach((row, index) => {
    const { level, wall } = row;
    const story = levels.storyOf.get(level);
    if (levels.usable && level !== '' && story === undefined) {
      findings.refuse(
        'gravity',
        index,
        'level',
        `level reads ${level}, expected a level of levels.csv: ${listNames(levels.names)}; correct the name or add the level`,
      );
    }
    const bands = spansOf.get(wall);
    if (wallsUsable && wall !== '' && !bands) {
      findings.refuse(
        'gravity',
        index,
        'wall',
        `wall reads ${wall}, expected a wall of walls.csv: ${listNames(wallNames)}; correct the name or add the wall`,
      );
    }
    const stands = story === undefined || !bands || standsIn(bands, story);
    if (!stands) {
      findings.refuse(
        'gravity',
        index,
        'wall',
        `wall reads ${wall}, which does not stand in the story below level ${level}; expected a wall that does; move the load or extend the wall`,
      );
    }
    const negative = loads.filter((load) => (row[load] ?? 0) < 0);
    if (negative.length > 0) {
      findings.notices.push({
        code: 'negative-gravity',
        level,
        wall,
        message: `wall ${wall} at level ${level}: ${negative.join(', ')} below 0 is taken as uplift`,
      });
    }
    const key = JSON.stringify([level, wall]);
    const times = (seen.get(key) ?? 0) + 1;
    seen.set(key, times);
    if (times === 2 && level !== '' && wall !== '') {
      findings.notices.push({
        code: 'gravity-added',
        level,
        wall,
        message: `wall ${wall} at level ${level} has several rows of gravity; they are added up`,
      });
    }
  });
}
