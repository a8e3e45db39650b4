import { readdirSync } from 'node:fs';

import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { entities } from '../entities/entities.ts';
import { openTestDatabase, type TestDatabase } from '../testing/openTestDatabase.ts';

import { migrations } from './migrations.ts';

let database: TestDatabase;
beforeEach(async () => {
  database = await openTestDatabase();
});
afterEach(() => database.drop());

const drift = async (): Promise<string[]> => {
  const log = await database.dataSource.driver.createSchemaBuilder().log();
  return log.upQueries.map((query) => query.query);
};

describe('migrations', () => {
  it('lead to the schema of the entities, with nothing left to do', async () => {
    expect(await drift()).toEqual([]);
    expect(await database.dataSource.showMigrations()).toBe(false);
  });

  it('go down to nothing and up again', async () => {
    for (let left = migrations.length; left > 0; left -= 1) await database.dataSource.undoLastMigration();
    const runner = database.dataSource.createQueryRunner();
    const ours = database.dataSource.entityMetadatas.map((entity) => entity.tableName);
    for (const name of ours) expect(await runner.hasTable(name)).toBe(false);
    await runner.release();
    await database.dataSource.runMigrations();
    expect(await drift()).toEqual([]);
  });

  it('are all in the list, and so are the entities', () => {
    const files = readdirSync(import.meta.dirname).filter((name) => /\d{13}\.ts$/.test(name));
    expect(migrations.map((migration) => `${migration.name}.ts`)).toEqual(files.sort());
    const classes = readdirSync(`${import.meta.dirname}/../entities`).filter((name) => /^[A-Z]/.test(name));
    expect(entities.map((entity) => `${entity.name}.ts`).sort()).toEqual(classes.sort());
  });
});

describe('issued revisions', () => {
  it('are refused every change by the database itself', async () => {
    const { dataSource } = database;
    const quiet = "'2026-01-01T00:00:00.000Z'";
    await dataSource.query(`INSERT INTO "office" VALUES ('o', 'Office', '{}', 1)`);
    await dataSource.query(
      `INSERT INTO "person" ("id", "officeId", "email", "name", "role", "active", "version") VALUES ('p', 'o', 'p@test.example', 'P', 'engineer', ${dataSource.options.type === 'postgres' ? 'true' : '1'}, 1)`,
    );
    await dataSource.query(
      `INSERT INTO "building" ("id", "officeId", "name", "number", "settings", "seq", "inputsSeq", "state", "access", "createdAt", "version") VALUES ('b', 'o', 'B', '', '{}', 1, 1, 'checked', 'office', ${quiet}, 1)`,
    );
    await dataSource.query(
      `INSERT INTO "revision" ("id", "buildingId", "n", "at", "note", "byId", "engineVersion", "inputsKey", "contentHash") VALUES ('r', 'b', 1, ${quiet}, 'first', 'p', '0', 'k', 'h')`,
    );
    await dataSource.query(
      `INSERT INTO "revision_part" ("id", "revisionId", "kind", "hash", "body") VALUES ('t', 'r', 'inputs', 'h', 'body')`,
    );
    for (const deed of [
      `UPDATE "revision" SET "note" = 'another'`,
      `DELETE FROM "revision"`,
      `UPDATE "revision_part" SET "body" = 'another'`,
      `DELETE FROM "revision_part"`,
    ]) {
      await expect(dataSource.query(deed)).rejects.toThrow(/immutable/);
    }
  });
});
