import { createHash } from 'node:crypto';

import { tableColumns } from '#shared/contracts/tableColumns';
import type { TableName } from '#shared/engineering/input';

import type { Gate } from '../db/gate.ts';

/** One hash over all rows, versions and counters of a building: moves with everything that is stored of it. */
export async function tablesHash(gate: Gate, buildingId: string): Promise<string> {
  const stored = await gate.read(async (store) => {
    const tables: unknown[] = [await store.buildings.get(buildingId)];
    for (const table of Object.keys(tableColumns) as TableName[]) {
      tables.push(await store.tables.rows(buildingId, table), await store.tables.version(buildingId, table));
    }
    return tables;
  });
  return createHash('sha256').update(JSON.stringify(stored)).digest('hex');
}
