import { schedulePatchSchema, type SchedulePatch, type SchedulePatchAnswer } from '#shared/contracts/schedule';
import { overwritableCells, type OwnCells } from '#shared/engineering/wall-design/designTypes';

import { canonicalJson } from '../../change-log/canonicalJson.ts';
import { recordChange } from '../../change-log/recordChange.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import { HttpError, notFound } from '../../http/HttpError.ts';
import { validate } from '../../http/validate.ts';
import type { Context } from '../Context.ts';
import { keyBuilding } from '../results/LoadedBuilding.ts';
import type { Published, ResultService } from '../results/ResultService.ts';

import { checkBars } from './checkBars.ts';
import { refuseInputCells } from './refuseInputCells.ts';
import { scheduleState } from './scheduleState.ts';

function withPatch(own: OwnCells, patch: SchedulePatch): OwnCells {
  const released = new Set<string>(patch.release ?? []);
  const next: Record<string, unknown> = {};
  for (const cell of overwritableCells) {
    if (patch[cell] !== undefined) next[cell] = patch[cell];
    else if (cell in own && !released.has(cell)) next[cell] = own[cell];
  }
  return next as OwnCells;
}

/** Rolls the transaction back. */
class RowMoved extends Error {}

const moved = (current: unknown): HttpError =>
  new HttpError(409, 'version', 'The row has been changed since it was read.', { current });

/** Other rows whose verdict or automatic cells the edit has changed. */
function changedBeside(before: Published, after: Published, rowId: string): SchedulePatchAnswer['alsoChanged'] {
  const verdict = (row: Published['rows'][number]): string =>
    canonicalJson([row.ok, row.state, row.from, row.to, row.automatic, row.overwritten]);
  const old = new Map(before.rows.map((row) => [row.id, verdict(row)]));
  return after.rows.filter((row) => row.id !== rowId && old.get(row.id) !== verdict(row));
}

/**
 * Overwrites or releases cells of one row. The building is computed with the edit before anything is stored, so that what the
 * engine refuses never stands; then the row changes under its version, and the schedule is published anew.
 */
export async function editSchedule(
  context: Context,
  results: ResultService,
  caller: Caller,
  buildingId: string,
  rowId: string,
  body: unknown,
): Promise<SchedulePatchAnswer> {
  const before = await results.publish(buildingId);
  const record = before.records.find((one) => one.id === rowId);
  if (record === undefined) throw notFound();
  refuseInputCells(body);
  const patch = validate(schedulePatchSchema, body);
  checkBars(patch, before.loaded.input.settings.units);
  const shown = (published: Published): unknown => published.rows.find((row) => row.id === rowId) ?? null;
  if (record.version !== patch.version) throw moved(shown(before));

  const own = withPatch(record.own, patch);
  const reason = Object.keys(own).length === 0 ? null : (patch.reason ?? record.reason);
  if (canonicalJson([own, reason]) === canonicalJson([record.own, record.reason])) {
    return { row: before.rows.find((row) => row.id === rowId) ?? null, alsoChanged: [], seq: before.loaded.seq };
  }
  const tried = before.records.map((one) => (one.id === rowId ? { ...one, own } : one));
  await results.compute(keyBuilding({ ...before.loaded, engineBuild: results.engineBuild }, tried));

  const stored = await context.gate
    .write(async (store) => {
      const seq = await store.buildings.nextSeq(buildingId, true);
      if (!(await store.schedule.setOwn(rowId, patch.version, own, reason))) throw new RowMoved();
      await recordChange(store, context, {
        buildingId,
        personId: caller.id,
        seq,
        kind: 'schedule',
        delta: {
          before: { schedule: { [rowId]: scheduleState(record.own, record.reason) } },
          after: { schedule: { [rowId]: scheduleState(own, reason) } },
        },
      });
      return seq;
    })
    .catch((error: unknown) => {
      if (error instanceof RowMoved) return null;
      throw error;
    });
  if (stored === null) throw moved(shown(await results.publish(buildingId)));
  const after = await results.publish(buildingId);
  const row = after.rows.find((one) => one.id === rowId) ?? null;
  return { row, alsoChanged: changedBeside(before, after, rowId), seq: stored };
}
