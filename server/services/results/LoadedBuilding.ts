import { tableColumns } from '#shared/contracts/tableColumns';
import type { BuildingInput, TableName, Tables } from '#shared/engineering/input';
import type { PinnedBand } from '#shared/engineering/wall-design/designTypes';
import type { Acknowledged } from '#shared/result/warningFacts';

import { contentKey } from '../../compute/contentKey.ts';
import type { ScheduleRecord } from '../../db/repositories/ScheduleRepository.ts';
import type { Store } from '../../db/Store.ts';

import { pinnedBands } from './pinnedBands.ts';

/** All that a computation starts from, read in one go. */
export interface LoadedBuilding {
  readonly id: string;
  readonly seq: number;
  readonly inputsSeq: number;
  readonly input: BuildingInput;
  /** ids of the stored rows, in the order of `input.tables` */
  readonly rowIds: Readonly<Record<TableName, readonly string[]>>;
  readonly records: readonly ScheduleRecord[];
  readonly pinned: readonly PinnedBand[];
  readonly acknowledged: readonly Acknowledged[];
  readonly key: string;
}

const names = Object.keys(tableColumns) as TableName[];

export interface RawBuilding extends Omit<LoadedBuilding, 'pinned' | 'key'> {
  readonly engineBuild: string;
}

/** Inside the gate: SQL only. */
export async function readBuilding(store: Store, id: string, engineBuild: string): Promise<RawBuilding> {
  const { seq, inputsSeq, settings } = await store.buildings.get(id);
  const tables: Partial<Record<TableName, unknown>> = {};
  const rowIds: Partial<Record<TableName, readonly string[]>> = {};
  for (const name of names) {
    const rows = await store.tables.rows(id, name);
    tables[name] = rows.map((row) => row.cells);
    rowIds[name] = rows.map((row) => row.id);
  }
  return {
    id,
    seq,
    inputsSeq,
    input: { settings, tables: tables as unknown as Tables },
    rowIds: rowIds as Readonly<Record<TableName, readonly string[]>>,
    records: await store.schedule.rows(id),
    acknowledged: (await store.acknowledgments.rows(id)).map(({ code, level, wall, factsHash }) => ({
      code,
      level,
      wall,
      factsHash,
    })),
    engineBuild,
  };
}

/** Outside the gate: pinned bands and the content key. */
export function keyBuilding({ engineBuild, ...raw }: RawBuilding, records = raw.records): LoadedBuilding {
  const pinned = pinnedBands(records, raw.input.tables);
  return { ...raw, records, pinned, key: contentKey(engineBuild, raw.input, pinned, raw.acknowledged) };
}
