import { createHash } from 'node:crypto';

import type { TestDatabase } from '../db/testing/openTestDatabase.ts';

/** One hash over all rows of all tables of the database, whatever they belong to. */
export async function tablesHash({ dataSource }: TestDatabase): Promise<string> {
  const hash = createHash('sha256');
  for (const { tableName } of dataSource.entityMetadatas) {
    const rows: unknown[] = await dataSource.query(`SELECT * FROM "${tableName}"`);
    hash.update(tableName);
    for (const row of rows.map((one) => JSON.stringify(one)).sort()) hash.update(row);
  }
  return hash.digest('hex');
}
