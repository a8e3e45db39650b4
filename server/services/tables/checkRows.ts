import { tableColumns, type EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';
import type { Settings, TableName, Tables } from '#shared/engineering/input';
import { checkTable } from '#shared/engineering/model/check-tables/checkTables';

import type { Gate } from '../../db/gate.ts';
import type { RowRecord } from '../../db/repositories/TableRepository.ts';

/** The tables of a building that hold rows, without the one on its way in; and that one's rows and version. */
export interface Surroundings {
  readonly others: Partial<Tables>;
  readonly stored: readonly RowRecord[];
  readonly version: number;
}

export function readSurroundings(gate: Gate, buildingId: string, table: EditableTable): Promise<Surroundings> {
  return gate.read(async (store) => {
    const others: Partial<Record<TableName, unknown>> = {};
    for (const name of Object.keys(tableColumns) as TableName[]) {
      if (name !== table) others[name] = (await store.tables.rows(buildingId, name)).map((row) => row.cells);
    }
    return {
      others: others as Partial<Tables>,
      stored: await store.tables.rows(buildingId, table),
      version: await store.tables.version(buildingId, table),
    };
  });
}

/** A table against itself and against the others; `row` counts from 1. */
export function checkRows(
  table: EditableTable,
  rows: readonly Readonly<Record<string, CellValue>>[],
  others: Partial<Tables>,
  { units, forcesAre }: Settings,
): ReturnType<typeof checkTable> {
  return checkTable(table, rows as unknown as Tables[EditableTable], others, units, forcesAre);
}
