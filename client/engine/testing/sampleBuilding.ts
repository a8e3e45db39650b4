import type { BuildingResource } from '#shared/contracts/buildings';
import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { readSettings } from '#shared/contracts/settings';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type {
  BuildingInput,
  ForceRow,
  GravityRow,
  LevelRow,
  Settings,
  Tables,
  WallRow,
} from '#shared/engineering/input';
import { runBuilding } from '#shared/result/runBuilding';

/** An invented building of three stories and four walls, for tests of pages and worker. */
const level = (name: string, height: number): LevelRow => ({
  level: name,
  height,
  elevation: null,
  x: null,
  y: null,
  extent_x: 80,
  extent_y: 50,
  edge_x: 0,
  edge_y: 0,
  diaphragm: null,
  weight: null,
  gravity: null,
});

const wall = (name: string, x1: number, y1: number, x2: number, y2: number): WallRow => ({
  wall: name,
  x1,
  y1,
  x2,
  y2,
  thickness: 12,
  from_level: 'L2',
  to_level: 'Roof',
  fc: null,
  share_x: null,
  share_y: null,
  opening: null,
  flexure_factor: null,
  shear_factor: null,
});

const force = (at: string, caseName: string, fx: number, fy: number): ForceRow => ({
  level: at,
  case: caseName,
  kind: 'seismic',
  fx,
  fy,
  x: null,
  y: null,
  mz: null,
});

const gravity = (at: string, name: string, dead: number): GravityRow => ({
  level: at,
  wall: name,
  dead,
  live: dead / 4,
  roof_live: null,
  snow: null,
  tributary_area: null,
  eccentricity: null,
  live_class: null,
});

const levels = ['Roof', 'L3', 'L2'];
const walls = [
  wall('P1', 0, 10, 0, 34),
  wall('P2', 80, 8, 80, 32),
  wall('Q1', 10, 0, 34, 0),
  wall('Q2', 30, 50, 50, 50),
];

export const sampleTables: Tables = {
  levels: [level('Roof', 12), level('L3', 12), level('L2', 15)],
  walls,
  forces: levels.flatMap((at, index) => [force(at, 'EX', 60 - index * 15, 0), force(at, 'EY', 0, 60 - index * 15)]),
  gravity: levels.flatMap((at) => walls.map((one) => gravity(at, one.wall, 40))),
  combinations: [],
  overrides: [],
};

function sampleSettings(): Settings {
  const read = readSettings({ name: 'Alder Yard', units: 'us', basis: ['rigid'], bandStories: 2 });
  if (!read.ok) throw new Error(read.problems.map((problem) => problem.message).join('; '));
  return read.settings;
}

export const sampleInput: BuildingInput = { settings: sampleSettings(), tables: sampleTables };

function run(): { document: ResultDocument; rows: readonly ScheduleResourceRow[] } {
  const outcome = runBuilding(sampleInput);
  if (!outcome.ok) throw new Error(outcome.problems.map((problem) => problem.message).join('; '));
  const rows = outcome.document.schedule.map((row, index) => {
    const { vertical, horizontal, ends, ties, laps, notes } = row;
    const automatic = { vertical, horizontal, ends, ties, laps, notes };
    return { ...row, id: `row-${index + 1}`, version: 1, overwritten: [], automatic, reason: null };
  });
  return { document: outcome.document, rows };
}

export const sample = run();

const { given: _given, ...settings } = sampleInput.settings;
export const sampleResource: BuildingResource = { ...settings, id: 'b1', state: 'in progress', seq: 7, version: 1 };

/** A table as the server answers it. */
export const sampleTable = (table: EditableTable) => ({
  rows: sampleTables[table].map((row, index) => ({ ...row, id: `${table}-${index + 1}`, version: 1 })),
  version: 1,
  seq: 7,
});
