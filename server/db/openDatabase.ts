import 'reflect-metadata';

import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';

import { DataSource } from 'typeorm';

import { entities } from './entities/entities.ts';
import { migrations } from './migrations/migrations.ts';

/** `sqlite:PATH` or `postgres://...`; nothing is migrated yet. */
function makeDataSource(url: string): DataSource {
  if (url.startsWith('postgres://') || url.startsWith('postgresql://')) {
    return new DataSource({ type: 'postgres', url, entities, migrations, synchronize: false, logging: false });
  }
  if (!url.startsWith('sqlite:')) {
    throw new Error('DATABASE_URL: expected sqlite:PATH or postgres://USER@HOST/NAME.');
  }
  const file = url.slice('sqlite:'.length);
  mkdirSync(dirname(file), { recursive: true });
  return new DataSource({
    type: 'better-sqlite3',
    database: file,
    enableWAL: true,
    entities,
    migrations,
    synchronize: false,
    logging: false,
  });
}

/**
 * Opens the database. On SQLite with full synchronous commits: the driver's default under WAL is NORMAL, which may lose the last
 * commits at a power cut.
 */
export async function openDatabase(url: string): Promise<DataSource> {
  const dataSource = await makeDataSource(url).initialize();
  if (dataSource.options.type === 'better-sqlite3') {
    await dataSource.query('PRAGMA synchronous = FULL');
    await dataSource.query('PRAGMA foreign_keys = ON');
    await dataSource.query('PRAGMA busy_timeout = 5000');
  }
  return dataSource;
}
