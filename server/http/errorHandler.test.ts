import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { newBuilding, newSmallBuilding, smallBuilding, upload } from '../testing/smallBuilding.ts';
import { startTestServer, type TestServer } from '../testing/startTestServer.ts';

import { errorForLog } from './errorForLog.ts';
import { toHttpError } from './errorHandler.ts';
import { HttpError } from './HttpError.ts';

describe('toHttpError', () => {
  const seen = (error: unknown): [number, string] | null => {
    const known = toHttpError(error);
    return known === null ? null : [known.status, known.code];
  };

  it('knows what the parsers and drivers throw', () => {
    expect(seen({ type: 'entity.too.large', status: 413 })).toEqual([413, 'too-large']);
    expect(seen({ type: 'entity.parse.failed', status: 400 })).toEqual([400, 'unreadable']);
    expect(seen({ type: 'encoding.unsupported', status: 415 })).toEqual([400, 'unreadable']);
    expect(seen({ driverError: { code: 'SQLITE_FULL' } })).toEqual([507, 'storage-full']);
    expect(seen({ driverError: { code: '53100' } })).toEqual([507, 'storage-full']);
    expect(seen({ driverError: { code: 'SQLITE_READONLY' } })).toEqual([503, 'read-only']);
    expect(seen(new HttpError(409, 'version', 'no'))).toEqual([409, 'version']);
    expect(seen(new TypeError('a fault of ours'))).toBeNull();
  });
});

describe('errorForLog', () => {
  it('leaves out what hangs on an error, such as the values of a statement', () => {
    const error = Object.assign(new Error('statement failed'), { parameters: ['a hash'], query: 'INSERT' });
    expect(JSON.stringify(errorForLog(error))).not.toContain('a hash');
  });
});

describe('a database that takes no more', () => {
  let server: TestServer;
  beforeAll(async () => {
    server = await startTestServer();
  });
  afterAll(() => server.close());

  it('answers 507 when the disk is full and 503 when it is read-only, and nothing of it is stored', async () => {
    const { dataSource } = server.database;
    const engineer = server.as('engineer');
    const id = await newBuilding(engineer);
    // how PostgreSQL says it is checked above; here the engine itself is brought to it
    if (dataSource.options.type !== 'postgres') {
      const [pages] = (await dataSource.query('PRAGMA page_count')) as { page_count: number }[];
      await dataSource.query(`PRAGMA max_page_count = ${pages?.page_count ?? 1}`);
      const rows = Array.from({ length: 20_000 }, (_, nth) => `L${nth},W,1`).join('\n');
      const full = await upload(engineer, id, 'gravity', `level,wall,dead\n${rows}\n`);
      expect(full.status).toBe(507);
      expect(full.body).toMatchObject({ error: { code: 'storage-full' } });
      await dataSource.query('PRAGMA max_page_count = 1073741823');
      await dataSource.query('PRAGMA query_only = ON');
      const readOnly = await upload(engineer, id, 'levels', smallBuilding.levels);
      expect(readOnly.status).toBe(503);
      expect(readOnly.headers['retry-after']).toBe('30');
      expect((await engineer.get(`/api/buildings/${id}/gravity`)).body).toMatchObject({ rows: [], version: 1 });
      await dataSource.query('PRAGMA query_only = OFF');
    }
    await newSmallBuilding(engineer);
  });
});
