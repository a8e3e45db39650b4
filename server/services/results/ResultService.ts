import type { ApiProblem } from '#shared/contracts/errors';
import type { OrphanedOverwrite, ScheduleResourceRow } from '#shared/contracts/schedule';
import type { Problem } from '#shared/engineering/input';

import type { Computing } from '../../compute/Computing.ts';
import { Lru } from '../../compute/Lru.ts';
import type { Computed } from '../../compute/Runner.ts';
import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { ScheduleRecord } from '../../db/repositories/ScheduleRepository.ts';
import { HttpError } from '../../http/HttpError.ts';
import type { Context } from '../Context.ts';

import { keyBuilding, readBuilding, type LoadedBuilding } from './LoadedBuilding.ts';
import { matchBands } from './matchBands.ts';
import { orphanedOverwrites, scheduleRows } from './scheduleResource.ts';

/** A building whose schedule rows stand in the database as they were computed. */
export interface Published {
  readonly loaded: LoadedBuilding;
  readonly computed: Computed;
  readonly records: readonly ScheduleRecord[];
  readonly rows: readonly ScheduleResourceRow[];
  readonly orphans: readonly OrphanedOverwrite[];
}

/** How often inputs may move under a publication before the caller is asked to come again. */
const mostAttempts = 40;

export class ResultService {
  /** content keys by building and `inputsSeq`, so that an unchanged building is neither read nor hashed again */
  private readonly keys = new Lru<string>(10_000);

  constructor(
    private readonly context: Context,
    readonly computing: Computing,
    readonly engineBuild: string,
  ) {}

  /** The key where it is known without reading the tables. */
  knownKey({ id, inputsSeq }: BuildingRecord): string | null {
    return this.keys.get(`${id} ${inputsSeq}`) ?? null;
  }

  async load(id: string): Promise<LoadedBuilding> {
    const loaded = keyBuilding(await this.context.gate.read((store) => readBuilding(store, id, this.engineBuild)));
    this.keys.set(`${id} ${loaded.inputsSeq}`, loaded.key, 1);
    return loaded;
  }

  async result(id: string): Promise<{ readonly key: string; readonly computed: Computed }> {
    const loaded = await this.load(id);
    return { key: loaded.key, computed: await this.compute(loaded) };
  }

  /** The chain, or 422 with what stands in its way, each problem with the id of its row. */
  async compute({ key, input, pinned, acknowledged, rowIds }: LoadedBuilding): Promise<Computed> {
    const answer = await this.computing.compute(key, input, pinned, acknowledged);
    if (answer.ok) return answer;
    throw new HttpError(422, 'does-not-compute', 'The tables do not fit together yet; nothing was computed.', {
      problems: answer.problems.map((problem) => placed(problem, rowIds)),
    });
  }

  /**
   * Computes and writes the schedule rows: computing happens outside, the writing in a short transaction that asks whether inputs
   * and rows are still those it started from, and is thrown away where they are not.
   */
  async publish(id: string): Promise<Published> {
    for (let attempt = 0; attempt < mostAttempts; attempt += 1) {
      const loaded = await this.load(id);
      const computed = await this.compute(loaded);
      const fresh =
        loaded.records.length >= computed.schedule.length &&
        loaded.records.every((row) => row.computedKey === loaded.key);
      if (fresh) return published(loaded, computed, loaded.records);
      const records = matchBands(loaded.records, computed, loaded.input.tables, loaded.key, this.context.newId);
      const written = await this.context.gate.write(async (store) => {
        if (!(await store.buildings.lockWhile(id, loaded.inputsSeq))) return false;
        if (stamp(await store.schedule.rows(id)) !== stamp(loaded.records)) return false;
        await store.schedule.replace(id, records);
        return true;
      });
      if (written) return published(loaded, computed, records);
    }
    throw new HttpError(503, 'busy', 'The building is being changed faster than it can be computed.', {
      retryAfterSeconds: 2,
    });
  }
}

const stamp = (records: readonly ScheduleRecord[]): string =>
  records.map((row) => `${row.id} ${row.version} ${row.computedKey}`).join('\n');

const published = (loaded: LoadedBuilding, computed: Computed, records: readonly ScheduleRecord[]): Published => ({
  loaded,
  computed,
  records,
  rows: scheduleRows(computed, records),
  orphans: orphanedOverwrites(computed, records),
});

function placed({ table, row, column, message, code }: Problem, rowIds: LoadedBuilding['rowIds']): ApiProblem {
  const inTable = table === 'building' || table === 'schedule' || row === null ? undefined : rowIds[table][row - 1];
  return {
    table,
    row,
    column,
    message,
    ...(inTable === undefined ? {} : { rowId: inTable }),
    ...(code === undefined ? {} : { code }),
  };
}
