import { readSettings, typedSettings } from '#shared/contracts/settings';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { UndoAnswer } from '#shared/contracts/undo';

import { canonicalJson } from '../../change-log/canonicalJson.ts';
import { targetsOf, type Delta, type DeltaSide } from '../../change-log/delta.ts';
import { recordChange } from '../../change-log/recordChange.ts';
import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import type { Store } from '../../db/Store.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';
import { settingsRefusal } from '../buildings/settingsRefusal.ts';
import { ownOfState, scheduleState } from '../schedule/scheduleState.ts';
import { renameSchedule } from '../tables/cascadeRename.ts';

import { movedOn } from './movedOn.ts';
import { restoreAcknowledgments } from './restoreAcknowledgments.ts';
import { restoreTable } from './restoreTable.ts';

/** A new edit made of the reversed delta of the person's own last edit; refused where a cell has moved on since. */
export class UndoService {
  constructor(private readonly context: Context) {}

  undo(caller: Caller, building: BuildingRecord): Promise<UndoAnswer> {
    return this.context.gate.write(
      async (store) => {
        const seq = await store.buildings.nextSeq(building.id, true);
        const last = await store.changes.lastOwn(building.id, caller.id);
        if (last === null) {
          throw new HttpError(409, 'nothing-to-undo', 'No edit of yours in this building is left to undo.');
        }
        const delta: Delta = { before: last.after as DeltaSide, after: last.before as DeltaSide };
        await this.apply(store, building.id, delta);
        const note = { buildingId: building.id, personId: caller.id, seq, kind: 'undo', delta, undoes: last.seq };
        await recordChange(store, this.context, note);
        return { seq, undone: last.seq, targets: targetsOf(delta.after) };
      },
      { long: true },
    );
  }

  private async apply(store: Store, buildingId: string, { before, after }: Delta): Promise<void> {
    for (const table of Object.keys(after.tables ?? {}) as EditableTable[]) {
      await restoreTable(store, buildingId, table, before.tables?.[table] ?? {}, after.tables?.[table] ?? {});
    }
    await renameSchedule(store, buildingId, after.renames ?? []);
    await this.restoreSchedule(store, buildingId, before.schedule ?? {}, after.schedule ?? {});
    if (after.acknowledgments !== undefined)
      await restoreAcknowledgments(store, buildingId, before.acknowledgments ?? {}, after.acknowledgments);
    if (after.settings !== undefined)
      await this.restoreSettings(store, buildingId, before.settings ?? {}, after.settings);
  }

  private async restoreSchedule(
    store: Store,
    buildingId: string,
    before: NonNullable<DeltaSide['schedule']>,
    after: NonNullable<DeltaSide['schedule']>,
  ): Promise<void> {
    if (Object.keys(after).length === 0) return;
    const rows = new Map((await store.schedule.rows(buildingId)).map((row) => [row.id, row]));
    for (const [id, state] of Object.entries(after)) {
      const row = rows.get(id);
      const stands =
        row !== undefined && canonicalJson(scheduleState(row.own, row.reason)) === canonicalJson(before[id]);
      if (!stands || !(await store.schedule.setOwn(id, row.version, ownOfState(state), state.reason))) {
        throw movedOn([{ table: 'schedule', id }]);
      }
    }
  }

  private async restoreSettings(
    store: Store,
    buildingId: string,
    before: Readonly<Record<string, unknown>>,
    after: Readonly<Record<string, unknown>>,
  ): Promise<void> {
    const stored = await store.buildings.get(buildingId);
    const typed = typedSettings(stored.settings);
    const changed = [...new Set([...Object.keys(before), ...Object.keys(after)])].filter(
      (name) => canonicalJson(before[name] ?? null) !== canonicalJson(after[name] ?? null),
    );
    const moved = changed.filter((name) => canonicalJson(typed[name] ?? null) !== canonicalJson(before[name] ?? null));
    if (moved.length > 0) throw movedOn(moved.map((name) => ({ table: 'building', id: buildingId, column: name })));
    const next: Record<string, unknown> = { ...typed };
    for (const name of changed) next[name] = after[name];
    const outcome = readSettings(Object.fromEntries(Object.entries(next).filter(([, value]) => value !== undefined)));
    if (!outcome.ok) throw settingsRefusal(outcome.problems);
    if (outcome.settings.units !== stored.settings.units && (await store.tables.hasRows(buildingId))) {
      throw new HttpError(409, 'units-fixed', 'The units are fixed while a table has rows.');
    }
    if (!(await store.buildings.setSettings(buildingId, stored.version, outcome.settings))) {
      throw movedOn([{ table: 'building', id: buildingId }]);
    }
  }
}
