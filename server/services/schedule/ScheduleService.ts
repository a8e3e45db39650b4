import type { SchedulePatchAnswer, ScheduleResource } from '#shared/contracts/schedule';

import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import type { Context } from '../Context.ts';
import type { ResultService } from '../results/ResultService.ts';

import { editSchedule } from './editSchedule.ts';

export class ScheduleService {
  constructor(
    private readonly context: Context,
    private readonly results: ResultService,
  ) {}

  async get(building: BuildingRecord): Promise<{ readonly tag: string; readonly resource: ScheduleResource }> {
    const { loaded, rows, orphans } = await this.results.publish(building.id);
    return { tag: `${loaded.key}.${loaded.seq}`, resource: { rows, orphans, seq: loaded.seq } };
  }

  edit(caller: Caller, building: BuildingRecord, rowId: string, body: unknown): Promise<SchedulePatchAnswer> {
    return editSchedule(this.context, this.results, caller, building.id, rowId, body);
  }

  /** The workbook of what is published now. */
  async workbook(
    building: BuildingRecord,
  ): Promise<{ readonly tag: string; readonly file: () => Promise<Uint8Array> }> {
    const { loaded, computed, rows } = await this.results.publish(building.id);
    const printedAt = `${this.context.now().slice(0, 16).replace('T', ' ')} UTC`;
    const { settings } = loaded.input;
    return {
      tag: `${loaded.key}.${loaded.seq}.xlsx`,
      file: () =>
        this.results.computing.runner.workbook({
          kind: 'workbook',
          result: computed.result,
          settings,
          rows,
          printedAt,
        }),
    };
  }
}
