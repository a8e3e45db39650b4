import { typedSettings } from '#shared/contracts/settings';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';
import type { Settings } from '#shared/engineering/input';

import type { DeltaSide, Rename, RowState, TableState } from '../../change-log/delta.ts';
import { writeRows } from '../../change-log/writeRows.ts';
import type { RowRecord } from '../../db/repositories/TableRepository.ts';
import type { Store } from '../../db/Store.ts';
import { HttpError } from '../../http/HttpError.ts';

const ownNames: Readonly<Partial<Record<EditableTable, { kind: Rename['kind']; column: string }>>> = {
  levels: { kind: 'level', column: 'level' },
  walls: { kind: 'wall', column: 'wall' },
  forces: { kind: 'case', column: 'case' },
};

const references: Readonly<Record<Rename['kind'], readonly (readonly [EditableTable, readonly string[]])[]>> = {
  level: [
    ['walls', ['from_level', 'to_level']],
    ['forces', ['level']],
    ['gravity', ['level']],
    ['overrides', ['level']],
  ],
  wall: [
    ['gravity', ['wall']],
    ['overrides', ['wall']],
  ],
  case: [['overrides', ['case']]],
};

/**
 * Renames of a table's own names: the old name stands in no row any more and all rows that had it agree on a new one. A band of a
 * wall that is given another name while others keep the old one is no rename.
 */
export function renamesOf(table: EditableTable, stored: readonly RowRecord[], next: readonly RowRecord[]): Rename[] {
  const own = ownNames[table];
  if (own === undefined) return [];
  const { kind, column } = own;
  const nameOf = (row: RowRecord): string => String(row.cells[column]);
  const standing = new Set(next.map(nameOf));
  const before = new Map(stored.map((row) => [row.id, nameOf(row)]));
  const found = new Map<string, Set<string>>();
  for (const row of next) {
    const from = before.get(row.id);
    if (from === undefined || from === nameOf(row) || standing.has(from)) continue;
    found.set(from, (found.get(from) ?? new Set()).add(nameOf(row)));
  }
  return [...found].flatMap(([from, to]) => (to.size === 1 ? [...to].map((name) => ({ kind, from, to: name })) : []));
}

export interface Cascade {
  readonly before: Partial<Record<EditableTable, TableState>>;
  readonly after: Partial<Record<EditableTable, TableState>>;
  /** building.json before and after, where a setting named what was renamed */
  readonly settings: { readonly before: DeltaSide['settings']; readonly after: DeltaSide['settings'] } | null;
}

/** Lets renames through to every table and schedule row that refers to the names; gives the rows' states for the change log. */
export async function cascadeRename(store: Store, buildingId: string, renames: readonly Rename[]): Promise<Cascade> {
  const before: Partial<Record<EditableTable, TableState>> = {};
  const after: Partial<Record<EditableTable, TableState>> = {};
  for (const table of ['walls', 'forces', 'gravity', 'overrides'] as const) {
    const maps = renames.flatMap((rename) =>
      references[rename.kind].filter(([name]) => name === table).map(([, columns]) => ({ rename, columns })),
    );
    if (maps.length === 0) continue;
    const update: { stored: RowRecord; next: RowRecord }[] = [];
    const sides: { before: Record<string, RowState>; after: Record<string, RowState> } = { before: {}, after: {} };
    for (const stored of await store.tables.rows(buildingId, table)) {
      const changed: Record<string, CellValue> = {};
      for (const { rename, columns } of maps) {
        for (const column of columns) if (stored.cells[column] === rename.from) changed[column] = rename.to;
      }
      const names = Object.keys(changed);
      if (names.length === 0) continue;
      update.push({ stored, next: { ...stored, cells: { ...stored.cells, ...changed } } });
      sides.before[stored.id] = Object.fromEntries(names.map((name) => [name, stored.cells[name] ?? null]));
      sides.after[stored.id] = changed;
    }
    if (update.length === 0) continue;
    if (!(await writeRows(store, buildingId, table, { insert: [], update, remove: [] }))) {
      throw new HttpError(409, 'version', `A row of ${table} has been changed at the same moment.`);
    }
    before[table] = sides.before;
    after[table] = sides.after;
  }
  await renameSchedule(store, buildingId, renames);
  return { before, after, settings: await renameInSettings(store, buildingId, renames) };
}

/** `expectedBaseShear` is by case, `baseSprings` by wall. */
async function renameInSettings(
  store: Store,
  buildingId: string,
  renames: readonly Rename[],
): Promise<Cascade['settings']> {
  const names = (wanted: Rename['kind']): ReadonlyMap<string, string> =>
    new Map(renames.flatMap(({ kind, from, to }) => (kind === wanted ? [[from, to] as const] : [])));
  const cases = names('case');
  const walls = names('wall');
  if (cases.size + walls.size === 0) return null;
  const { settings, version } = await store.buildings.get(buildingId);
  const { expectedBaseShear, baseSprings } = settings;
  const named =
    Object.keys(expectedBaseShear).some((name) => cases.has(name)) ||
    Object.keys(baseSprings).some((name) => walls.has(name));
  if (!named) return null;
  const renamed = (record: Readonly<Record<string, number>>, to: ReadonlyMap<string, string>) =>
    Object.fromEntries(Object.entries(record).map(([name, value]) => [to.get(name) ?? name, value]));
  const next: Settings = {
    ...settings,
    expectedBaseShear: renamed(expectedBaseShear, cases),
    baseSprings: renamed(baseSprings, walls),
  };
  if (!(await store.buildings.setSettings(buildingId, version, next))) {
    throw new HttpError(409, 'version', 'The settings have been changed at the same moment.');
  }
  return { before: typedSettings(settings), after: typedSettings(next) };
}

export async function renameSchedule(store: Store, buildingId: string, renames: readonly Rename[]): Promise<void> {
  if (renames.length === 0) return;
  const levels = new Map(renames.flatMap(({ kind, from, to }) => (kind === 'level' ? [[from, to] as const] : [])));
  const walls = new Map(renames.flatMap(({ kind, from, to }) => (kind === 'wall' ? [[from, to] as const] : [])));
  const level = (name: string): string => levels.get(name) ?? name;
  for (const row of await store.schedule.rows(buildingId)) {
    const names = [row.wall, row.fromLevel, row.toLevel, ...row.stories];
    if (!names.some((name) => levels.has(name) || walls.has(name))) continue;
    await store.schedule.rename(row.id, {
      wall: walls.get(row.wall) ?? row.wall,
      fromLevel: level(row.fromLevel),
      toLevel: level(row.toLevel),
      stories: row.stories.map(level),
    });
  }
}
