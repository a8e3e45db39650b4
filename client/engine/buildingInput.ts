import type { BuildingResource } from '#shared/contracts/buildings';
import { editableTables, tableColumns, type EditableTable } from '#shared/contracts/tableColumns';
import type { TableResource } from '#shared/contracts/tables';
import type { BuildingInput, Tables } from '#shared/engineering/input';

export type LoadedTables = { readonly [T in EditableTable]: TableResource<T> };

/** A stored row without id and version: the columns of its table in their order, a missing value as null. */
function plainRow(table: EditableTable, row: object): Record<string, unknown> {
  const cells = new Map<string, unknown>(Object.entries(row));
  return Object.fromEntries(tableColumns[table].map(({ name }) => [name, cells.get(name) ?? null]));
}

/** What the server starts from, put together again from what it sent. */
export function buildingInput(building: BuildingResource, tables: LoadedTables): BuildingInput {
  const { id: _id, state: _state, seq: _seq, version: _version, ...settings } = building;
  const plain = Object.fromEntries(
    editableTables.map((table) => [table, tables[table].rows.map((row) => plainRow(table, row))]),
  );
  return {
    settings: { given: [], ...settings },
    tables: plain as unknown as Tables,
  };
}
