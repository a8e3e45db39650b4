import { Table, TableForeignKey, TableIndex, TableUnique, type MigrationInterface, type QueryRunner } from 'typeorm';

import { inputTables } from './create-tables/inputTables.ts';
import { peopleTables } from './create-tables/peopleTables.ts';
import { workTables } from './create-tables/workTables.ts';
import { dropImmutability, makeImmutable } from './immutability.ts';

/** A table stands after those it refers to. */
const tables = [...peopleTables, ...inputTables, ...workTables];

const immutable = ['revision', 'revision_part'];

/** The whole data model, tables of later work included; adding columns later is cheap, threading them in is not. */
export class CreateTables1767225600000 implements MigrationInterface {
  name = 'CreateTables1767225600000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const table of tables) {
      await queryRunner.createTable(
        new Table({
          name: table.name,
          columns: [...table.columns],
          foreignKeys: (table.references ?? []).map(
            ([from, referencedTableName, onDelete]) =>
              new TableForeignKey({
                columnNames: [from],
                referencedColumnNames: ['id'],
                referencedTableName,
                onDelete,
              }),
          ),
          uniques: (table.uniques ?? []).map((columnNames) => new TableUnique({ columnNames: [...columnNames] })),
          indices: (table.indexes ?? []).map((columnNames) => new TableIndex({ columnNames: [...columnNames] })),
        }),
      );
    }
    for (const table of immutable) await makeImmutable(queryRunner, table);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of immutable) await dropImmutability(queryRunner, table);
    for (const table of [...tables].reverse()) await queryRunner.dropTable(table.name);
  }
}
