import type { ForceRow } from '../../input.ts';

import { listNames } from './findings.ts';

import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

/**
 * Forces entered as story shears: a level force is the difference of successive rows, so every level of a case needs a row
 * (engineering.md section 5). The first row of the case is to blame, with the levels that are missing.
 */
export function checkStoryShears(forces: readonly ForceRow[], levels: LevelIndex, findings: Findings): void {
  if (!levels.ordered) return;
  const cases = new Map<string, { readonly index: number; readonly levels: Set<string> }>();
  forces.forEach((row, index) => {
    if (row.case === '') return;
    const found = cases.get(row.case) ?? { index, levels: new Set<string>() };
    found.levels.add(row.level);
    cases.set(row.case, found);
  });
  for (const [name, { index, levels: given }] of cases) {
    const missing = [...levels.names].reverse().filter((level) => !given.has(level));
    // a level that could not be read may be any of them
    if (missing.length === 0 || given.has('')) continue;
    findings.refuse(
      'forces',
      index,
      'level',
      `case ${name} has no row for ${listNames(missing)}; forces are entered as story shears, expected one row for every level; add the rows, with 0 where no shear is`,
    );
  }
}
