import type { ForceRow } from '../../input.ts';

import { listNames } from './findings.ts';

import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

/** The kind most rows of a case have, the first on a tie. */
function kindsOfCases(forces: readonly ForceRow[]): Map<string, ForceRow['kind']> {
  const counts = new Map<string, Map<ForceRow['kind'], number>>();
  for (const { case: name, kind } of forces) {
    // a kind that could not be read is an empty text here
    if (!kind) continue;
    const kinds = counts.get(name) ?? new Map<ForceRow['kind'], number>();
    kinds.set(kind, (kinds.get(kind) ?? 0) + 1);
    counts.set(name, kinds);
  }
  return new Map(
    [...counts].flatMap(([name, kinds]) =>
      [...kinds]
        .sort((a, b) => b[1] - a[1])
        .slice(0, 1)
        .map(([kind]) => [name, kind] as const),
    ),
  );
}

/** forces.csv: levels that exist, one kind a case; rows of one level and case add up, with a notice. */
export function checkForces(forces: readonly ForceRow[], levels: LevelIndex, findings: Findings): void {
  const kinds = kindsOfCases(forces);
  const seen = new Map<string, number>();
  forces.forEach((row, index) => {
    if (levels.usable && row.level !== '' && !levels.storyOf.has(row.level)) {
      findings.refuse(
        'forces',
        index,
        'level',
        `level reads ${row.level}, expected a level of levels.csv: ${listNames(levels.names)}; correct the name or add the level`,
      );
    }
    const usual = kinds.get(row.case);
    if (row.case !== '' && row.kind && usual !== undefined && row.kind !== usual) {
      findings.refuse(
        'forces',
        index,
        'kind',
        `kind reads ${row.kind}, but case ${row.case} is ${usual} in other rows; expected one kind for a case; correct the kind or rename the case`,
      );
    }
    const key = JSON.stringify([row.level, row.case]);
    const times = (seen.get(key) ?? 0) + 1;
    seen.set(key, times);
    if (times === 2 && row.level !== '' && row.case !== '') {
      findings.notices.push({
        code: 'forces-added',
        level: row.level,
        message: `level ${row.level} has several forces of case ${row.case}; they are added up`,
      });
    }
  });
}
