import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, TablePatch, TablePatchAnswer, TableResource } from '#shared/contracts/tables';

import type { BuildingRecord } from '../../db/repositories/BuildingRepository.ts';
import type { Caller } from '../../db/repositories/PersonRepository.ts';
import type { Context } from '../Context.ts';

import { editTable } from './editTable.ts';
import { replaceTable } from './replaceTable.ts';
import { storedRow } from './storedRow.ts';

export class TableService {
  constructor(private readonly context: Context) {}

  get(building: BuildingRecord, table: EditableTable): Promise<TableResource> {
    return this.context.gate.read(async (store) => {
      const rows = await store.tables.rows(building.id, table);
      const version = await store.tables.version(building.id, table);
      const { seq } = await store.buildings.get(building.id);
      return { rows: rows.map(storedRow), version, seq };
    });
  }

  edit(caller: Caller, building: BuildingRecord, table: EditableTable, patch: TablePatch): Promise<TablePatchAnswer> {
    return editTable(this.context, caller, building.id, table, patch);
  }

  /** The whole table; `version` is the one of If-Match. */
  async put(
    caller: Caller,
    building: BuildingRecord,
    table: EditableTable,
    version: number,
    rows: readonly Readonly<Record<string, CellValue | undefined>>[],
  ): Promise<TableResource> {
    const { notices } = await replaceTable(this.context, caller, building, table, rows, version);
    return { ...(await this.get(building, table)), notices };
  }
}
