import { targetsOf, type Delta } from './delta.ts';

import type { Store } from '../db/Store.ts';

export interface ChangeMaker {
  readonly newId: () => string;
  readonly now: () => string;
}

export interface ChangeNote {
  readonly buildingId: string;
  readonly personId: string;
  readonly seq: number;
  readonly kind: string;
  readonly delta: Delta;
  readonly undoes?: number;
}

/** One row an edit, inside the transaction of the edit. */
export async function recordChange(store: Store, maker: ChangeMaker, note: ChangeNote): Promise<void> {
  await store.changes.add({
    id: maker.newId(),
    buildingId: note.buildingId,
    personId: note.personId,
    seq: note.seq,
    at: maker.now(),
    kind: note.kind,
    target: targetsOf(note.delta.after).join(' '),
    before: note.delta.before,
    after: note.delta.after,
    undoes: note.undoes ?? null,
  });
}
