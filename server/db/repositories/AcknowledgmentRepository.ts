import type { EntityManager } from 'typeorm';

import { Acknowledgment } from '../entities/Acknowledgment.ts';
import { select } from '../sql.ts';

/** A warning settled by an engineer, without the building it belongs to. */
export type AcknowledgmentState = Omit<Acknowledgment, 'id' | 'buildingId'>;
export interface AcknowledgmentRecord extends AcknowledgmentState {
  readonly id: string;
  readonly byName: string;
}

export class AcknowledgmentRepository {
  constructor(private readonly manager: EntityManager) {}

  /** In the order in which they were made. */
  rows(buildingId: string): Promise<AcknowledgmentRecord[]> {
    return select<AcknowledgmentRecord>(
      this.manager,
      `SELECT a."id", a."code", a."level", a."wall", a."reason", a."factsHash", a."byId", a."at", p."name" AS "byName"
       FROM "acknowledgment" a JOIN "person" p ON p."id" = a."byId"
       WHERE a."buildingId" = ? ORDER BY a."at", a."id"`,
      [buildingId],
    );
  }

  async add(buildingId: string, id: string, state: AcknowledgmentState): Promise<void> {
    await this.manager.insert(Acknowledgment, { id, buildingId, ...state });
  }

  /** False where it is gone already. */
  async remove(buildingId: string, id: string): Promise<boolean> {
    const removed = await this.manager.delete(Acknowledgment, { id, buildingId });
    return removed.affected === 1;
  }
}
