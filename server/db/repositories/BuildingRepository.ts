import { IsNull, type EntityManager } from 'typeorm';

import type { BuildingListRow, BuildingState } from '#shared/contracts/buildings';
import type { Settings } from '#shared/engineering/input';

import { Building } from '../entities/Building.ts';
import { Member } from '../entities/Member.ts';
import { select } from '../sql.ts';

import type { Caller } from './PersonRepository.ts';

export interface BuildingRecord {
  readonly id: string;
  readonly officeId: string;
  readonly settings: Settings;
  readonly seq: number;
  readonly inputsSeq: number;
  readonly state: BuildingState;
  readonly version: number;
}

export interface NewBuilding {
  readonly id: string;
  readonly officeId: string;
  readonly settings: Settings;
  readonly access: 'office' | 'members';
  readonly createdAt: string;
}

interface ListRow extends Omit<BuildingListRow, 'code' | 'units'> {
  readonly settings: string;
}

const record = (building: Building): BuildingRecord => ({
  id: building.id,
  officeId: building.officeId,
  settings: building.settings as unknown as Settings,
  seq: building.seq,
  inputsSeq: building.inputsSeq,
  state: building.state as BuildingState,
  version: building.version,
});

/** Buildings a person may know of: those of the own office, by membership where access is by membership; admins all. */
class ScopedBuildings {
  constructor(
    private readonly manager: EntityManager,
    private readonly caller: Caller,
  ) {}

  async find(id: string): Promise<BuildingRecord | null> {
    const building = await this.manager.findOneBy(Building, {
      id,
      officeId: this.caller.office.id,
      deletedAt: IsNull(),
    });
    if (building === null) return null;
    if (building.access === 'members' && this.caller.role !== 'admin') {
      const member = await this.manager.countBy(Member, { buildingId: id, personId: this.caller.id });
      if (member === 0) return null;
    }
    return record(building);
  }

  async list(): Promise<BuildingListRow[]> {
    const { role, id, office } = this.caller;
    const onlyIssued =
      role === 'drafter' ? 'AND EXISTS (SELECT 1 FROM "revision" r WHERE r."buildingId" = b."id")' : '';
    const rows = await select<ListRow>(
      this.manager,
      `SELECT b."id", b."name", b."number", b."settings", b."state", b."seq", b."version",
         (SELECT count(*) FROM "level_row" l WHERE l."buildingId" = b."id") AS "levels",
         (SELECT count(DISTINCT w."wall") FROM "wall_row" w WHERE w."buildingId" = b."id") AS "walls",
         COALESCE(c."at", b."createdAt") AS "changedAt", p."name" AS "changedBy"
       FROM "building" b
       LEFT JOIN "change" c ON c."buildingId" = b."id"
         AND c."seq" = (SELECT max(m."seq") FROM "change" m WHERE m."buildingId" = b."id")
       LEFT JOIN "person" p ON p."id" = c."personId"
       WHERE b."officeId" = ? AND b."deletedAt" IS NULL ${onlyIssued}
         AND (? = 'admin' OR b."access" = 'office'
           OR EXISTS (SELECT 1 FROM "member" m WHERE m."buildingId" = b."id" AND m."personId" = ?))
       ORDER BY COALESCE(c."at", b."createdAt") DESC, b."id"`,
      [office.id, role, id],
    );
    return rows.map(({ settings, levels, walls, ...row }) => {
      const { units, code } = JSON.parse(settings) as Settings;
      return { ...row, units, code, levels: Number(levels), walls: Number(walls) };
    });
  }
}

export class BuildingRepository {
  constructor(private readonly manager: EntityManager) {}

  of(caller: Caller): ScopedBuildings {
    return new ScopedBuildings(this.manager, caller);
  }

  /** After the scope was asked: the building as it stands inside this transaction. */
  async get(id: string): Promise<BuildingRecord> {
    return record(await this.manager.findOneByOrFail(Building, { id }));
  }

  async add(building: NewBuilding, personId: string | null, memberId: string): Promise<void> {
    const { settings } = building;
    await this.manager.insert(Building, {
      id: building.id,
      officeId: building.officeId,
      name: settings.name,
      number: settings.number,
      settings,
      seq: 0,
      inputsSeq: 0,
      state: 'in progress',
      access: building.access,
      studyOf: null,
      createdAt: building.createdAt,
      deletedAt: null,
      version: 1,
    });
    if (personId !== null) {
      await this.manager.insert(Member, { id: memberId, buildingId: building.id, personId });
    }
  }

  /** First in every transaction that changes a building: on PostgreSQL the row lock makes its writers line up. */
  async nextSeq(id: string, inputsMove: boolean): Promise<number> {
    await this.manager
      .createQueryBuilder()
      .update(Building)
      .set(inputsMove ? { seq: () => '"seq" + 1', inputsSeq: () => '"inputsSeq" + 1' } : { seq: () => '"seq" + 1' })
      .where({ id })
      .execute();
    return (await this.get(id)).seq;
  }

  /** Takes the row lock and says whether the inputs are still those of `inputsSeq`. */
  async lockWhile(id: string, inputsSeq: number): Promise<boolean> {
    const locked = await this.manager
      .createQueryBuilder()
      .update(Building)
      .set({ inputsSeq: () => '"inputsSeq"' })
      .where({ id, inputsSeq })
      .execute();
    return locked.affected === 1;
  }

  /** False where the version has moved on. */
  async setSettings(id: string, version: number, settings: Settings): Promise<boolean> {
    const changed = await this.manager
      .createQueryBuilder()
      .update(Building)
      .set({ name: settings.name, number: settings.number, settings, version: () => '"version" + 1' })
      .where({ id, version })
      .execute();
    return changed.affected === 1;
  }

  async hide(id: string, now: string): Promise<void> {
    await this.manager.update(Building, { id }, { deletedAt: now });
  }
}
