import type { QueryRunner } from 'typeorm';

/** Triggers that refuse every UPDATE and DELETE of a table: what is issued is never changed, by no route and no hand. */
export async function makeImmutable(queryRunner: QueryRunner, table: string): Promise<void> {
  if (queryRunner.connection.options.type === 'postgres') {
    await queryRunner.query(
      `CREATE FUNCTION "${table}_refuse"() RETURNS trigger LANGUAGE plpgsql AS $$ BEGIN RAISE EXCEPTION '${table} is immutable'; END $$`,
    );
    await queryRunner.query(
      `CREATE TRIGGER "${table}_immutable" BEFORE UPDATE OR DELETE ON "${table}" FOR EACH ROW EXECUTE FUNCTION "${table}_refuse"()`,
    );
    return;
  }
  for (const deed of ['UPDATE', 'DELETE']) {
    await queryRunner.query(
      `CREATE TRIGGER "${table}_no_${deed.toLowerCase()}" BEFORE ${deed} ON "${table}" BEGIN SELECT RAISE(ABORT, '${table} is immutable'); END`,
    );
  }
}

export async function dropImmutability(queryRunner: QueryRunner, table: string): Promise<void> {
  if (queryRunner.connection.options.type === 'postgres') {
    await queryRunner.query(`DROP TRIGGER "${table}_immutable" ON "${table}"`);
    await queryRunner.query(`DROP FUNCTION "${table}_refuse"()`);
    return;
  }
  for (const deed of ['update', 'delete']) await queryRunner.query(`DROP TRIGGER "${table}_no_${deed}"`);
}
