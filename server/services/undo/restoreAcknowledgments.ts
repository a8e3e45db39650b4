import { canonicalJson } from '../../change-log/canonicalJson.ts';
import type { DeltaSide } from '../../change-log/delta.ts';
import type { Store } from '../../db/Store.ts';
import { stateOf } from '../acknowledgments/stateOf.ts';

import { movedOn } from './movedOn.ts';

type Side = NonNullable<DeltaSide['acknowledgments']>;

/** Takes acknowledgments out and brings those back that they had replaced; refused where one is no longer as it was left. */
export async function restoreAcknowledgments(
  store: Store,
  buildingId: string,
  before: Side,
  after: Side,
): Promise<void> {
  const stored = new Map((await store.acknowledgments.rows(buildingId)).map((row) => [row.id, stateOf(row)]));
  for (const [id, wanted] of Object.entries(after)) {
    if (canonicalJson(stored.get(id) ?? null) !== canonicalJson(before[id] ?? null)) {
      throw movedOn([{ table: 'acknowledgments', id }]);
    }
    if (stored.has(id)) await store.acknowledgments.remove(buildingId, id);
    if (wanted !== null) await store.acknowledgments.add(buildingId, id, wanted);
  }
}
