import type { EntityManager } from 'typeorm';

export type SqlValue = string | number | boolean | null;

const isPostgres = (manager: EntityManager): boolean => manager.connection.options.type === 'postgres';

/** Raw SQL with `?` on both engines; names are quoted by the caller. */
export async function select<Row>(
  manager: EntityManager,
  text: string,
  values: readonly SqlValue[] = [],
): Promise<Row[]> {
  let place = 0;
  const query = isPostgres(manager) ? text.replace(/\?/g, () => `$${++place}`) : text;
  const bound = isPostgres(manager)
    ? values
    : values.map((value) => (typeof value === 'boolean' ? Number(value) : value));
  const rows: Row[] = await manager.query(query, [...bound]);
  return rows;
}

/** Bound values of one statement: below the limit of both engines (SQLite 32,766, PostgreSQL 65,535). */
const mostValues = 30_000;

/** Many rows in few statements: through the ORM 50,000 rows hold the connection for about a second. */
export async function insertMany(
  manager: EntityManager,
  table: string,
  columns: readonly string[],
  rows: readonly (readonly SqlValue[])[],
): Promise<void> {
  const perStatement = Math.floor(mostValues / columns.length);
  const names = columns.map((name) => `"${name}"`).join(', ');
  const one = `(${columns.map(() => '?').join(', ')})`;
  for (let start = 0; start < rows.length; start += perStatement) {
    const part = rows.slice(start, start + perStatement);
    const places = part.map(() => one).join(', ');
    await select(manager, `INSERT INTO "${table}" (${names}) VALUES ${places}`, part.flat());
  }
}

/** Rows by id, in as many statements as the limit of bound values asks for. */
export async function deleteByIds(manager: EntityManager, table: string, ids: readonly string[]): Promise<void> {
  for (let start = 0; start < ids.length; start += mostValues) {
    const part = ids.slice(start, start + mostValues);
    await select(manager, `DELETE FROM "${table}" WHERE "id" IN (${part.map(() => '?').join(', ')})`, part);
  }
}
