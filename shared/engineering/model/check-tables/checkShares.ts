import type { WallRow } from '../../input.ts';

import type { WallSpan } from './checkWalls.ts';
import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

/** Shares typed for one direction may not add up to more than 1 in any story; the row that passes 1 is to blame, once. */
export function checkShares(
  walls: readonly WallRow[],
  spans: readonly (WallSpan | null)[],
  levels: LevelIndex,
  findings: Findings,
): void {
  for (const column of ['share_x', 'share_y'] as const) {
    const sums = levels.names.map(() => 0);
    walls.forEach((row, index) => {
      const span = spans[index];
      const share = row[column];
      if (!span || share === null || !(share > 0)) return;
      let passed: number | null = null;
      for (let story = span.from; story <= span.to; story += 1) {
        const before = sums[story] ?? 0;
        sums[story] = before + share;
        if (before <= 1 + 1e-9 && before + share > 1 + 1e-9) passed ??= story;
      }
      if (passed === null) return;
      findings.refuse(
        'walls',
        index,
        column,
        `${column} reads ${share}, which brings the shares at level ${levels.names[passed]} to ${Number((sums[passed] ?? 0).toFixed(6))}; expected at most 1 in each story; lower one of them`,
      );
    });
  }
}
