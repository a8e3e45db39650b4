import { readSettings } from '../contracts/settings.ts';
import { settingsDefaults } from '../contracts/settingsDefaults.ts';
import { checkTables } from '../engineering/model/check-tables/checkTables.ts';

import { limitProblems, problemLimit } from './fileProblem.ts';
import { parseJson } from './parseJson.ts';
import { readTable, requiredTables } from './readTable.ts';
import { byRowAndColumn } from './sortProblems.ts';

import type { BuildingInput, Problem, Settings, TableName, Tables, Warning } from '../engineering/input.ts';

import type { FileProblem } from './fileProblem.ts';
import type { TableReading } from './readTable.ts';

export type FolderReading =
  | {
      readonly ok: true;
      readonly input: BuildingInput;
      /** physical line of each row, by table */
      readonly lines: Readonly<Record<TableName, readonly number[]>>;
      readonly notices: readonly Warning[];
    }
  | { readonly ok: false; readonly problems: readonly FileProblem[] };

const tableNames = ['levels', 'walls', 'forces', 'gravity', 'combinations', 'overrides'] as const;
/** The file of that name, letter case aside where no exact one is there. */
function findFile(files: ReadonlyMap<string, Uint8Array>, name: string): { name: string; bytes: Uint8Array } | null {
  const exact = files.get(name);
  if (exact) return { name, bytes: exact };
  for (const [own, bytes] of files) if (own.toLowerCase() === name) return { name: own, bytes };
  return null;
}

interface SettingsReading {
  readonly settings: Settings;
  readonly problems: readonly FileProblem[];
}

function readBuildingFile(files: ReadonlyMap<string, Uint8Array>): SettingsReading {
  const found = findFile(files, 'building.json');
  const refuse = (problems: readonly FileProblem[], units: 'us' | 'si'): SettingsReading => ({
    settings: settingsDefaults(units),
    problems,
  });
  if (!found) {
    const message = 'building.json is not in the folder, expected one with name and units; add it';
    return refuse([{ file: 'building.json', row: null, column: null, message }], 'us');
  }
  const parsed = parseJson(found.bytes);
  if (!parsed.ok) return refuse([{ file: found.name, row: parsed.row, column: null, message: parsed.message }], 'us');
  const outcome = readSettings(parsed.json);
  if (outcome.ok) return { settings: outcome.settings, problems: [] };
  // the tables are still read in the units that were meant, so that their problems come along
  const { json } = parsed;
  const si = typeof json === 'object' && json !== null && 'units' in json && json.units === 'si';
  return refuse(
    outcome.problems.map((problem) => ({ file: found.name, row: null, ...problem })),
    si ? 'si' : 'us',
  );
}

/** A folder of building.json and tables, as the command gets it: one building, or all problems by file and physical line. */
export function readFolder(files: ReadonlyMap<string, Uint8Array>): FolderReading {
  const building = readBuildingFile(files);
  const problems: FileProblem[] = [...building.problems];
  let total = problems.length;
  const notices: Warning[] = [];
  const readings = new Map<TableName, TableReading>();
  for (const table of tableNames) {
    const found = findFile(files, `${table}.csv`);
    if (found) {
      const reading = readTable(table, found.bytes, found.name, building.settings.units);
      readings.set(table, reading);
      for (const message of reading.notices)
        notices.push({ code: 'file-notice', message: `${found.name}: ${message}` });
    } else if (requiredTables.includes(table)) {
      total += 1;
      problems.push({
        file: `${table}.csv`,
        row: null,
        column: null,
        message: `${table}.csv is not in the folder, expected it beside building.json; add it`,
      });
    } else if (table === 'gravity') {
      notices.push({
        code: 'no-gravity',
        message: 'gravity.csv is not in the folder; walls carry their own weight only',
      });
    }
  }
  const rowsOf = <T extends TableName>(table: T): Tables[T] =>
    (readings.get(table)?.rows ?? []) as unknown as Tables[T];
  const input: BuildingInput = {
    settings: building.settings,
    tables: {
      levels: rowsOf('levels'),
      walls: rowsOf('walls'),
      forces: rowsOf('forces'),
      gravity: rowsOf('gravity'),
      combinations: rowsOf('combinations'),
      overrides: rowsOf('overrides'),
    },
  };
  const checked = checkTables(input);
  notices.push(...checked.notices);
  for (const problem of checked.problems.filter((candidate) => candidate.table === 'building')) {
    total += 1;
    problems.push({ file: 'building.json', row: null, column: problem.column, message: problem.message });
  }
  for (const [table, reading] of readings) {
    const across = checked.problems
      .filter((problem) => problem.table === table)
      .map((problem) => inFile(problem, table, reading, files));
    total += reading.problemCount + across.length;
    const own = reading.problems.slice(0, Math.min(reading.problemCount, problemLimit));
    problems.push(...[...own, ...across].sort(byRowAndColumn(table)));
  }
  if (total > 0) return { ok: false, problems: limitProblems(problems, total, 'building.json') };
  const linesOf = (table: TableName): readonly number[] => readings.get(table)?.lines ?? [];
  return {
    ok: true,
    input,
    lines: {
      levels: linesOf('levels'),
      walls: linesOf('walls'),
      forces: linesOf('forces'),
      gravity: linesOf('gravity'),
      combinations: linesOf('combinations'),
      overrides: linesOf('overrides'),
    },
    notices,
  };
}

function inFile(
  problem: Problem,
  table: TableName,
  reading: TableReading,
  files: ReadonlyMap<string, Uint8Array>,
): FileProblem {
  const file = findFile(files, `${table}.csv`)?.name ?? `${table}.csv`;
  const row = problem.row === null ? null : (reading.lines[problem.row - 1] ?? null);
  const place = { file, row, column: problem.column, message: problem.message };
  return problem.code ? { ...place, code: problem.code } : place;
}
