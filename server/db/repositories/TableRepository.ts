import type { EntityManager } from 'typeorm';

import { tableColumns } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';
import type { TableName } from '#shared/engineering/input';

import { deleteByIds, insertMany, select, type SqlValue } from '../sql.ts';

/** A stored row of any input table; the cells are under the names of the CSV columns. */
export interface RowRecord {
  readonly id: string;
  readonly version: number;
  readonly position: number;
  readonly cells: Readonly<Record<string, CellValue>>;
}

const sqlTables: Readonly<Record<TableName, string>> = {
  levels: 'level_row',
  walls: 'wall_row',
  forces: 'force_row',
  gravity: 'gravity_row',
  combinations: 'combination_row',
  overrides: 'override_row',
};

const columnsOf = (table: TableName): string[] => tableColumns[table].map((column) => column.name);

/** Rows of the input tables by raw statements: hydrating 50,000 of them as entities takes more than twice as long. */
export class TableRepository {
  constructor(private readonly manager: EntityManager) {}

  rows(buildingId: string, table: TableName): Promise<RowRecord[]> {
    return this.find(buildingId, table, '', []);
  }

  /** Some rows by id, in the order of the table; unknown ids are passed over. */
  async rowsByIds(buildingId: string, table: TableName, ids: readonly string[]): Promise<RowRecord[]> {
    if (ids.length === 0) return [];
    if (ids.length > 1000) {
      const wanted = new Set(ids);
      return (await this.rows(buildingId, table)).filter((row) => wanted.has(row.id));
    }
    return this.find(buildingId, table, `AND "id" IN (${ids.map(() => '?').join(', ')})`, ids);
  }

  private async find(
    buildingId: string,
    table: TableName,
    where: string,
    values: readonly string[],
  ): Promise<RowRecord[]> {
    const columns = columnsOf(table);
    const names = columns.map((name) => `"${name}"`).join(', ');
    const found = await select<Record<string, CellValue>>(
      this.manager,
      `SELECT "id", "version", "position", ${names} FROM "${sqlTables[table]}"
       WHERE "buildingId" = ? ${where} ORDER BY "position", "id"`,
      [buildingId, ...values],
    );
    return found.map((row) => {
      const cells: Record<string, CellValue> = {};
      for (const name of columns) cells[name] = row[name] ?? null;
      return { id: String(row.id), version: Number(row.version), position: Number(row.position), cells };
    });
  }

  async hasRows(buildingId: string): Promise<boolean> {
    for (const table of Object.values(sqlTables)) {
      const found = await select(this.manager, `SELECT 1 FROM "${table}" WHERE "buildingId" = ? LIMIT 1`, [buildingId]);
      if (found.length > 0) return true;
    }
    return false;
  }

  async insert(buildingId: string, table: TableName, rows: readonly RowRecord[]): Promise<void> {
    const columns = columnsOf(table);
    await insertMany(
      this.manager,
      sqlTables[table],
      ['id', 'buildingId', 'version', 'position', ...columns],
      rows.map((row) => [
        row.id,
        buildingId,
        row.version,
        row.position,
        ...columns.map((name): SqlValue => row.cells[name] ?? null),
      ]),
    );
  }

  /** False where the row has moved on from `version`, or is gone. */
  async update(
    table: TableName,
    id: string,
    version: number,
    cells: Readonly<Record<string, CellValue>>,
    position?: number,
  ): Promise<boolean> {
    const known = columnsOf(table).filter((name) => name in cells);
    const values: SqlValue[] = known.map((name) => cells[name] ?? null);
    const sets = known.map((name) => `"${name}" = ?`);
    if (position !== undefined) {
      sets.push('"position" = ?');
      values.push(position);
    }
    const done = await select<{ id: string }>(
      this.manager,
      `UPDATE "${sqlTables[table]}" SET ${[...sets, '"version" = "version" + 1'].join(', ')}
       WHERE "id" = ? AND "version" = ? RETURNING "id"`,
      [...values, id, version],
    );
    return updatedRows(done) === 1;
  }

  async remove(table: TableName, ids: readonly string[]): Promise<void> {
    await deleteByIds(this.manager, sqlTables[table], ids);
  }

  async setPosition(table: TableName, id: string, position: number): Promise<void> {
    await select(this.manager, `UPDATE "${sqlTables[table]}" SET "position" = ? WHERE "id" = ?`, [position, id]);
  }

  async addTable(id: string, buildingId: string, table: TableName): Promise<void> {
    await insertMany(
      this.manager,
      'input_table',
      ['id', 'buildingId', 'table', 'version'],
      [[id, buildingId, table, 1]],
    );
  }

  async version(buildingId: string, table: TableName): Promise<number> {
    const found = await select<{ version: number }>(
      this.manager,
      'SELECT "version" FROM "input_table" WHERE "buildingId" = ? AND "table" = ?',
      [buildingId, table],
    );
    return found[0]?.version ?? 0;
  }

  async bump(buildingId: string, table: TableName): Promise<void> {
    await select(
      this.manager,
      'UPDATE "input_table" SET "version" = "version" + 1 WHERE "buildingId" = ? AND "table" = ?',
      [buildingId, table],
    );
  }

  async setSource(buildingId: string, table: TableName, source: Readonly<Record<string, unknown>>): Promise<void> {
    await select(this.manager, 'UPDATE "input_table" SET "source" = ? WHERE "buildingId" = ? AND "table" = ?', [
      JSON.stringify(source),
      buildingId,
      table,
    ]);
  }
}

/** PostgreSQL's driver answers [rows, count] for an UPDATE ... RETURNING, SQLite's the rows. */
function updatedRows(answer: readonly unknown[]): number {
  const first = answer[0];
  return Array.isArray(first) ? first.length : answer.length;
}
