import type { EntityManager } from 'typeorm';

import { Change } from '../entities/Change.ts';
import { select } from '../sql.ts';

export interface ChangeRecord {
  readonly seq: number;
  readonly kind: string;
  readonly target: string;
  readonly before: object;
  readonly after: object;
}

export interface NewChange extends ChangeRecord {
  readonly id: string;
  readonly buildingId: string;
  readonly personId: string;
  readonly at: string;
  readonly undoes: number | null;
}

export class ChangeRepository {
  constructor(private readonly manager: EntityManager) {}

  async add(change: NewChange): Promise<void> {
    await this.manager.insert(Change, change);
  }

  /** The person's own last edit of a building that is neither undone nor an undo itself. */
  async lastOwn(buildingId: string, personId: string): Promise<ChangeRecord | null> {
    const found = await select<{ seq: number }>(
      this.manager,
      `SELECT c."seq" FROM "change" c
       WHERE c."buildingId" = ? AND c."personId" = ? AND c."undoes" IS NULL
         AND c."kind" NOT IN ('create', 'delete')
         AND NOT EXISTS (SELECT 1 FROM "change" u WHERE u."buildingId" = c."buildingId" AND u."undoes" = c."seq")
       ORDER BY c."seq" DESC LIMIT 1`,
      [buildingId, personId],
    );
    const seq = found[0]?.seq;
    if (seq === undefined) return null;
    const { kind, target, before, after } = await this.manager.findOneByOrFail(Change, { buildingId, seq });
    return { seq, kind, target, before, after };
  }
}
