import type { BuildingListRow, BuildingResource } from '#shared/contracts/buildings';
import { readSettings, readSettingsPatch, settingsPatchSchema, typedSettings } from '#shared/contracts/settings';
import type { SettingsOutcome } from '#shared/contracts/settings';
import { tableColumns } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';
import type { Settings, TableName, Tables } from '#shared/engineering/input';

import { recordChange } from '../../change-log/recordChange.ts';
import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';

import { positionStep } from '../tables/planReplacement.ts';

import { settingsRefusal } from './settingsRefusal.ts';

export function buildingResource({ id, state, seq, version, settings }: BuildingRecord): BuildingResource {
  const { given: _given, ...shown } = settings;
  return { ...shown, id, state, seq, version };
}

const taken = (outcome: SettingsOutcome): Settings => {
  if (!outcome.ok) throw settingsRefusal(outcome.problems);
  return outcome.settings;
};

export class BuildingService {
  constructor(private readonly context: Context) {}

  list(caller: Caller): Promise<BuildingListRow[]> {
    return this.context.gate.read((store) => store.buildings.of(caller).list());
  }

  /** The body is a building.json. */
  async create(caller: Caller, body: unknown): Promise<BuildingResource> {
    const settings = taken(readSettings(body));
    const id = this.context.newId();
    return buildingResource(await this.add(caller, id, settings));
  }

  /** A building with rows that are checked already (the demo); without rows all its tables are empty. */
  async add(caller: Caller, id: string, settings: Settings, tables: Partial<Tables> = {}): Promise<BuildingRecord> {
    const { gate, now, newId } = this.context;
    return gate.write(async (store) => {
      await store.buildings.add(
        { id, officeId: caller.office.id, settings, access: 'office', createdAt: now() },
        caller.id,
        newId(),
      );
      for (const table of Object.keys(tableColumns) as TableName[]) {
        await store.tables.addTable(newId(), id, table);
        const rows = (tables[table] ?? []) as unknown as readonly Readonly<Record<string, CellValue>>[];
        const records = rows.map((cells, place) => {
          return { id: newId(), version: 1, position: (place + 1) * positionStep, cells };
        });
        await store.tables.insert(id, table, records);
      }
      const seq = await store.buildings.nextSeq(id, true);
      const delta = { before: {}, after: { settings: typedSettings(settings) } };
      await recordChange(store, this.context, { buildingId: id, personId: caller.id, seq, kind: 'create', delta });
      return store.buildings.get(id);
    });
  }

  /** {version, ...changed settings}; a key set to null goes back to its default. */
  async edit(caller: Caller, building: BuildingRecord, body: unknown): Promise<BuildingResource> {
    const { version, ...changes } = (typeof body === 'object' && body !== null ? body : {}) as Record<string, unknown>;
    if (typeof version !== 'number' || !Number.isInteger(version)) {
      throw new HttpError(422, 'invalid', 'The body names no version. Expected: the version that was read.', {
        problems: [{ row: null, column: 'version', message: 'version is missing, expected a whole number' }],
      });
    }
    const known = settingsPatchSchema.safeParse(changes);
    const patch: unknown = known.success ? known.data : changes;
    taken(readSettingsPatch(building.settings, patch));
    return this.context.gate.write(async (store) => {
      const seq = await store.buildings.nextSeq(building.id, true);
      const stored = await store.buildings.get(building.id);
      if (stored.version !== version) {
        throw new HttpError(409, 'version', 'The settings have been changed since they were read.', {
          current: buildingResource({ ...stored, seq: stored.seq - 1 }),
        });
      }
      const settings = taken(readSettingsPatch(stored.settings, patch));
      if (settings.units !== stored.settings.units && (await store.tables.hasRows(building.id))) {
        throw new HttpError(409, 'units-fixed', 'The units are fixed while a table has rows.');
      }
      if (!(await store.buildings.setSettings(building.id, version, settings))) {
        throw new HttpError(409, 'version', 'The settings have been changed since they were read.');
      }
      const delta = {
        before: { settings: typedSettings(stored.settings) },
        after: { settings: typedSettings(settings) },
      };
      await recordChange(store, this.context, {
        buildingId: building.id,
        personId: caller.id,
        seq,
        kind: 'settings',
        delta,
      });
      return buildingResource(await store.buildings.get(building.id));
    });
  }

  /** Hidden, not removed. */
  async hide(caller: Caller, building: BuildingRecord): Promise<void> {
    await this.context.gate.write(async (store) => {
      const seq = await store.buildings.nextSeq(building.id, false);
      await store.buildings.hide(building.id, this.context.now());
      const delta = { before: {}, after: {} };
      await recordChange(store, this.context, {
        buildingId: building.id,
        personId: caller.id,
        seq,
        kind: 'delete',
        delta,
      });
    });
  }
}
