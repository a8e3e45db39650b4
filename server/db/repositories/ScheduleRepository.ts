import type { EntityManager } from 'typeorm';

import type { ResultRow } from '#shared/contracts/result';
import type { OverwritableCell, OwnCells } from '#shared/engineering/wall-design/designTypes';

import { ScheduleRow } from '../entities/ScheduleRow.ts';
import { insertMany, type SqlValue } from '../sql.ts';

export interface ScheduleRecord {
  readonly id: string;
  readonly wall: string;
  readonly fromLevel: string;
  readonly toLevel: string;
  readonly position: number;
  /** levels of the band, from the base up */
  readonly stories: readonly string[];
  readonly auto: Partial<Pick<ResultRow, OverwritableCell>>;
  readonly own: OwnCells;
  readonly reason: string | null;
  readonly ratio: number | null;
  readonly ok: boolean;
  readonly governing: object | null;
  readonly computedKey: string;
  readonly version: number;
}

const columns = [
  'id',
  'buildingId',
  'wall',
  'fromLevel',
  'toLevel',
  'position',
  'stories',
  'auto',
  'own',
  'locks',
  'bandPinned',
  'reason',
  'ratio',
  'ok',
  'governing',
  'computedKey',
  'version',
];

const record = (row: ScheduleRow): ScheduleRecord => ({
  id: row.id,
  wall: row.wall,
  fromLevel: row.fromLevel,
  toLevel: row.toLevel,
  position: row.position,
  stories: row.stories,
  auto: row.auto as ScheduleRecord['auto'],
  own: row.own as OwnCells,
  reason: row.reason,
  ratio: row.ratio,
  ok: row.ok,
  governing: row.governing,
  computedKey: row.computedKey,
  version: row.version,
});

export class ScheduleRepository {
  constructor(private readonly manager: EntityManager) {}

  async rows(buildingId: string): Promise<ScheduleRecord[]> {
    const found = await this.manager.find(ScheduleRow, {
      where: { buildingId },
      order: { position: 'ASC', id: 'ASC' },
    });
    return found.map(record);
  }

  /** False where the row has moved on from `version`. */
  async setOwn(id: string, version: number, own: OwnCells, reason: string | null): Promise<boolean> {
    const changed = await this.manager
      .createQueryBuilder()
      .update(ScheduleRow)
      .set({
        own,
        reason,
        bandPinned: Object.keys(own).length > 0,
        computedKey: '',
        version: () => '"version" + 1',
      })
      .where({ id, version })
      .execute();
    return changed.affected === 1;
  }

  async rename(
    id: string,
    names: { readonly wall: string; readonly fromLevel: string; readonly toLevel: string; readonly stories: string[] },
  ): Promise<void> {
    await this.manager.update(ScheduleRow, { id }, names);
  }

  /** All rows of a building at once: publishing. */
  async replace(buildingId: string, rows: readonly ScheduleRecord[]): Promise<void> {
    await this.manager.delete(ScheduleRow, { buildingId });
    await insertMany(
      this.manager,
      'schedule_row',
      columns,
      rows.map((row): SqlValue[] => [
        row.id,
        buildingId,
        row.wall,
        row.fromLevel,
        row.toLevel,
        row.position,
        JSON.stringify(row.stories),
        JSON.stringify(row.auto),
        JSON.stringify(row.own),
        '[]',
        Object.keys(row.own).length > 0,
        row.reason,
        row.ratio,
        row.ok,
        row.governing === null ? null : JSON.stringify(row.governing),
        row.computedKey,
        row.version,
      ]),
    );
  }
}
