import { createHash } from 'node:crypto';

import { tableColumns } from '#shared/contracts/tableColumns';
import type { BuildingInput, TableName } from '#shared/engineering/input';
import { engineVersion } from '#shared/engineering/version';
import type { PinnedBand } from '#shared/engineering/wall-design/designTypes';
import type { Acknowledged } from '#shared/result/warningFacts';

import { canonicalJson } from '../change-log/canonicalJson.ts';

/** Name of a result: equal for equal engine, settings, tables, pinned bands and settled warnings, and for nothing else. */
export function contentKey(
  engineBuild: string,
  input: BuildingInput,
  pinned: readonly PinnedBand[],
  acknowledged: readonly Acknowledged[] = [],
): string {
  const hash = createHash('sha256');
  hash.update(canonicalJson({ engineVersion, engineBuild, settings: input.settings, pinned, acknowledged }));
  for (const table of Object.keys(tableColumns) as TableName[]) {
    // cells in the order of the columns: sorting the keys of 50,000 rows would take longer than hashing them
    const names = tableColumns[table].map((column) => column.name);
    const rows = (input.tables[table] as readonly object[]).map((row) => {
      const cells = row as Readonly<Record<string, unknown>>;
      return names.map((name) => cells[name] ?? null);
    });
    hash.update(JSON.stringify([table, rows]));
  }
  return hash.digest('hex');
}
