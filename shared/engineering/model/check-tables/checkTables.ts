import type { BuildingInput, Problem, Settings, TableName, Tables, UnitSystem, Warning } from '../../input.ts';

import { checkBands } from './checkBands.ts';
import { checkForces } from './checkForces.ts';
import { checkGravity } from './checkGravity.ts';
import { checkLevels } from './checkLevels.ts';
import { checkOverrides } from './checkOverrides.ts';
import { checkShares } from './checkShares.ts';
import { checkStoryShears } from './checkStoryShears.ts';
import { checkWalls } from './checkWalls.ts';
import { Findings } from './findings.ts';
import { indexLevels } from './levelIndex.ts';

import type { CheckResult } from './findings.ts';

const emptyTables: Tables = { levels: [], walls: [], forces: [], gravity: [], combinations: [], overrides: [] };

const tableOrder: readonly string[] = [
  'building',
  'levels',
  'walls',
  'forces',
  'gravity',
  'combinations',
  'overrides',
  'schedule',
];

/** Tables in the order of the contract, then rows; the columns of a row keep the order in which they were checked. */
const byPlace = (a: Problem, b: Problem): number =>
  tableOrder.indexOf(a.table) - tableOrder.indexOf(b.table) || (a.row ?? 0) - (b.row ?? 0);

function checkFilled(tables: Tables, units: UnitSystem, forcesAre: Settings['forcesAre']): Findings {
  const findings = new Findings();
  const levels = indexLevels(tables.levels);
  checkLevels(tables.levels, units, findings);
  const spans = checkWalls(tables.walls, levels, units, findings);
  checkBands(tables.walls, spans, levels, units, findings);
  checkShares(tables.walls, spans, levels, findings);
  checkForces(tables.forces, levels, findings);
  checkGravity(tables.gravity, tables.walls, spans, levels, findings);
  if (forcesAre === 'story-shear') checkStoryShears(tables.forces, levels, findings);
  checkOverrides(tables.overrides, tables.forces, tables.walls, spans, levels, findings);
  return findings;
}

/**
 * Everything that needs more than one cell or more than one table. Tables without rows are not held against the others; with
 * `complete`, levels, walls and forces must have some. Numbers that are NaN and names that are '' were refused before and are
 * passed over here.
 */
export function checkTables(input: BuildingInput, options: { readonly complete?: boolean } = {}): CheckResult {
  const { settings, tables } = input;
  const findings = checkFilled(tables, settings.units, settings.forcesAre);
  if (options.complete) {
    for (const table of ['levels', 'walls', 'forces'] as const) {
      if (tables[table].length > 0) continue;
      findings.problems.push({
        table,
        row: null,
        column: null,
        message: `${table}.csv has no rows, expected at least one; fill the table`,
      });
    }
  }
  const refuseSetting = (column: string, message: string): void => {
    findings.problems.push({ table: 'building', row: null, column, message });
  };
  const cases = new Set(tables.forces.map((row) => row.case));
  for (const name of Object.keys(settings.expectedBaseShear)) {
    if (tables.forces.length === 0 || cases.has(name)) continue;
    refuseSetting(
      `expectedBaseShear.${name}`,
      `expectedBaseShear names case ${name}, which forces.csv does not have; correct the name or take it out`,
    );
  }
  const walls = new Set(tables.walls.map((row) => row.wall));
  for (const name of Object.keys(settings.baseSprings)) {
    if (tables.walls.length === 0 || walls.has(name)) continue;
    refuseSetting(
      `baseSprings.${name}`,
      `baseSprings names wall ${name}, which walls.csv does not have; correct the name or take it out`,
    );
  }
  return { problems: findings.problems.sort(byPlace), notices: findings.notices };
}

/** Notices about rows of other tables that stand in the way after an upload, at most this many. */
const orphanLimit = 20;

/**
 * One table on its way in, against the tables that already hold rows. Its own faults are problems; rows of other tables that no
 * longer fit are notices, since the file is then stored and the building does not compute until they do.
 */
export function checkTable<T extends TableName>(
  table: T,
  rows: Tables[T],
  others: Partial<Tables>,
  units: UnitSystem,
  forcesAre: Settings['forcesAre'] = 'level-force',
): CheckResult {
  const tables: Tables = { ...emptyTables, ...others, [table]: rows };
  const findings = checkFilled(tables, units, forcesAre);
  const own = findings.problems.filter((problem) => problem.table === table);
  const orphans: Warning[] = findings.problems
    .filter((problem) => problem.table !== table)
    .sort(byPlace)
    .map((problem) => ({
      code: 'does-not-fit',
      message: `${problem.table}, row ${problem.row ?? ''}: ${problem.message}`,
    }));
  const more = orphans.length - orphanLimit;
  const kept = orphans.slice(0, orphanLimit);
  if (more > 0) kept.push({ code: 'does-not-fit', message: `and ${more} more rows of other tables do not fit` });
  return { problems: own.sort(byPlace), notices: [...ownNotices(table, findings.notices), ...kept] };
}

const noticeTables: Readonly<Record<string, TableName>> = {
  'edge-unused': 'levels',
  'forces-added': 'forces',
  'gravity-added': 'gravity',
  'negative-gravity': 'gravity',
};

const ownNotices = (table: TableName, notices: readonly Warning[]): Warning[] =>
  notices.filter((notice) => noticeTables[notice.code] === table);
