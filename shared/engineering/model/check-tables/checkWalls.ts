import type { UnitSystem, WallRow } from '../../input.ts';

import { geometryTolerance, listNames } from './findings.ts';

import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

/** Where a wall stands, from the base up; null where its levels are not known. */
export interface WallSpan {
  readonly from: number;
  readonly to: number;
}

/** Strengths outside of these are in another unit: [least, most, unit]. */
const strengthLimits: Readonly<Record<UnitSystem, readonly [number, number, string]>> = {
  us: [500, 30_000, 'psi'],
  si: [3, 210, 'MPa'],
};

/** A longer wall line was typed in another unit, and its bars alone would keep the solver for minutes: [most, unit]. */
const longestWall: Readonly<Record<UnitSystem, readonly [number, string]>> = { us: [2000, 'ft'], si: [600, 'm'] };

/** Each row of walls.csv by itself and against the levels; bands are looked at in checkBands. */
export function checkWalls(
  walls: readonly WallRow[],
  levels: LevelIndex,
  units: UnitSystem,
  findings: Findings,
): (WallSpan | null)[] {
  const tolerance = geometryTolerance[units];
  const [least, most, unit] = strengthLimits[units];
  const [longest, lengthUnit] = longestWall[units];
  return walls.map((row, index) => {
    const dx = row.x2 - row.x1;
    const dy = row.y2 - row.y1;
    const length = Math.sqrt(dx * dx + dy * dy);
    if (length > longest) {
      findings.refuse(
        'walls',
        index,
        'x2',
        `wall ${row.wall} is ${Number(length.toPrecision(6))} ${lengthUnit} long, expected at most ${longest} ${lengthUnit}; convert its points or name their unit in the header`,
      );
    }
    if (length <= tolerance) {
      findings.refuse(
        'walls',
        index,
        'x2',
        `wall ${row.wall} ends where it begins, at ${row.x1}, ${row.y1}; expected two points apart; correct x2 or y2`,
      );
    }
    if (row.fc !== null && (row.fc < least || row.fc > most)) {
      findings.refuse(
        'walls',
        index,
        'fc',
        `fc reads ${row.fc}, expected ${least} to ${most} ${unit}; convert it or name its unit in the header`,
      );
    }
    return spanOf(row, index, levels, findings);
  });
}

function spanOf(row: WallRow, index: number, levels: LevelIndex, findings: Findings): WallSpan | null {
  if (!levels.usable) return null;
  const storyAt = (column: 'from_level' | 'to_level'): number | undefined => {
    const story = levels.storyOf.get(row[column]);
    if (story === undefined && row[column] !== '') {
      findings.refuse(
        'walls',
        index,
        column,
        `${column} reads ${row[column]}, expected a level of levels.csv: ${listNames(levels.names)}; correct the name or add the level`,
      );
    }
    return story;
  };
  const from = storyAt('from_level');
  const to = storyAt('to_level');
  if (!levels.ordered || from === undefined || to === undefined) return null;
  if (to < from) {
    findings.refuse(
      'walls',
      index,
      'to_level',
      `to_level reads ${row.to_level}, which is below from_level ${row.from_level}; expected the highest story the wall stands in; exchange the two`,
    );
    return null;
  }
  return { from, to };
}
