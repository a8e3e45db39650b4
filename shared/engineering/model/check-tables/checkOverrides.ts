import { gravityCases } from '../model.ts';
import type { ForceRow, OverrideRow, WallRow } from '../../input.ts';

import { listNames } from './findings.ts';
import { standsIn } from './standsIn.ts';

import type { WallSpan } from './checkWalls.ts';
import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

const effects = ['shear', 'axial', 'moment'] as const;

interface Known {
  readonly levels: LevelIndex;
  /** bands of each wall; null where walls can't be asked */
  readonly walls: ReadonlyMap<string, readonly (WallSpan | null)[]> | null;
  readonly cases: readonly string[] | null;
}

/**
 * overrides.csv: levels, walls and cases that exist, the wall standing in that story; a transfer with something to hand over and no
 * share, a share with its part and nothing else, each share once.
 */
export function checkOverrides(
  overrides: readonly OverrideRow[],
  forces: readonly ForceRow[],
  walls: readonly WallRow[],
  spans: readonly (WallSpan | null)[],
  levels: LevelIndex,
  findings: Findings,
): void {
  const spansOf = new Map<string, (WallSpan | null)[]>();
  walls.forEach((row, index) => {
    spansOf.set(row.wall, [...(spansOf.get(row.wall) ?? []), spans[index] ?? null]);
  });
  const cases = [...new Set(forces.map((row) => row.case))];
  const known: Known = {
    levels,
    walls: walls.length > 0 && !spansOf.has('') ? spansOf : null,
    cases: cases.length > 0 && !cases.includes('') ? cases : null,
  };
  overrides.forEach((row, index) => {
    checkNames(row, index, known, findings);
    checkKind(row, index, findings);
  });
  checkSharesOnce(overrides, findings);
}

function checkNames(row: OverrideRow, index: number, known: Known, findings: Findings): void {
  const { level, wall } = row;
  const story = known.levels.storyOf.get(level);
  if (known.levels.usable && level !== '' && story === undefined) {
    findings.refuse(
      'overrides',
      index,
      'level',
      `level reads ${level}, expected a level of levels.csv: ${listNames(known.levels.names)}; correct the name or add the level`,
    );
  }
  const bands = known.walls?.get(wall);
  if (known.walls && wall !== '' && !bands) {
    findings.refuse(
      'overrides',
      index,
      'wall',
      `wall reads ${wall}, expected a wall of walls.csv: ${listNames([...known.walls.keys()])}; correct the name or add the wall`,
    );
  }
  if (known.walls && bands && story !== undefined && !standsIn(bands, story)) {
    findings.refuse(
      'overrides',
      index,
      'wall',
      `wall reads ${wall}, which does not stand in the story below level ${level}; expected a wall that does; correct the level or the wall`,
    );
  }
  checkCase(row, index, known.cases, findings);
}

/** A case of forces.csv, or in a transfer of axial and moment one of the gravity cases; blank is every case of forces.csv. */
function checkCase(row: OverrideRow, index: number, cases: Known['cases'], findings: Findings): void {
  // an empty text is a case that could not be read
  if (!cases || row.case === null || row.case === '' || cases.includes(row.case)) return;
  const gravity = row.kind === 'transfer' && gravityCases.some((name) => name === row.case);
  if (!gravity) {
    const more = row.kind === 'transfer' ? ` or ${gravityCases.join(', ')}` : '';
    findings.refuse(
      'overrides',
      index,
      'case',
      `case reads ${row.case}, expected a case of forces.csv: ${listNames(cases)}${more}; correct the name or leave it blank for every case`,
    );
  } else if (row.shear !== null && row.shear !== 0) {
    findings.refuse(
      'overrides',
      index,
      'shear',
      `shear reads ${row.shear} in a transfer of case ${row.case}, expected none: gravity has axial and moment only; clear the cell`,
    );
  }
}

function checkKind(row: OverrideRow, index: number, findings: Findings): void {
  const { wall, share } = row;
  if (row.kind === 'share') {
    if (share === null) {
      findings.refuse(
        'overrides',
        index,
        'share',
        `share is empty in a row of kind share, expected a number from 0 to 1, the part of the story shear that ${wall} takes; fill the cell`,
      );
    }
    for (const column of effects) {
      if (row[column] === null) continue;
      findings.refuse(
        'overrides',
        index,
        column,
        `${column} reads ${row[column]} in a row of kind share, expected nothing; clear the cell or make it a row of kind transfer`,
      );
    }
  }
  if (row.kind === 'transfer') {
    if (effects.every((column) => row[column] === null)) {
      findings.refuse(
        'overrides',
        index,
        'shear',
        `shear, axial and moment are empty in a row of kind transfer, expected at least one of them for ${wall} to take; fill one`,
      );
    }
    if (share !== null) {
      findings.refuse(
        'overrides',
        index,
        'share',
        `share reads ${share} in a row of kind transfer, expected nothing; clear the cell or make it a row of kind share`,
      );
    }
  }
}

/** A wall has one share in a story and case; a blank case stands for every one. Transfers add up. */
function checkSharesOnce(overrides: readonly OverrideRow[], findings: Findings): void {
  const seen = new Map<string, (string | null)[]>();
  overrides.forEach((row, index) => {
    if (row.kind !== 'share' || row.level === '' || row.wall === '' || row.case === '') return;
    const key = JSON.stringify([row.level, row.wall]);
    const cases = seen.get(key) ?? [];
    if (cases.some((name) => name === row.case || name === null || row.case === null)) {
      findings.refuse(
        'overrides',
        index,
        'wall',
        `wall ${row.wall} at level ${row.level} has a share of ${row.case === null ? 'every case' : `case ${row.case}`} in a row above already; expected one share a case; take one of the two rows out`,
      );
    }
    seen.set(key, [...cases, row.case]);
  });
}
