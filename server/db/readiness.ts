import type { DataSource } from 'typeorm';

export interface Readiness {
  readonly ok: boolean;
  readonly database: 'sqlite' | 'postgres';
  /** none is waiting to run */
  readonly migrations: 'current' | 'pending';
  /** `full` on SQLite (PRAGMA synchronous 2); the setting as named by PostgreSQL */
  readonly synchronous: string;
}

const sqliteModes = ['off', 'normal', 'full', 'extra'];

/** Asks the live connection, not the configuration. */
export async function readiness(dataSource: DataSource): Promise<Readiness> {
  const pending = await dataSource.showMigrations();
  const migrations = pending ? 'pending' : 'current';
  if (dataSource.options.type === 'postgres') {
    const rows: { synchronous_commit: string }[] = await dataSource.query('SHOW synchronous_commit');
    const synchronous = rows[0]?.synchronous_commit ?? 'unknown';
    return { ok: !pending && synchronous !== 'off', database: 'postgres', migrations, synchronous };
  }
  const rows: { synchronous: number }[] = await dataSource.query('PRAGMA synchronous');
  const synchronous = sqliteModes[rows[0]?.synchronous ?? -1] ?? 'unknown';
  return { ok: !pending && synchronous === 'full', database: 'sqlite', migrations, synchronous };
}
