import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { editableTables } from '#shared/contracts/tableColumns';
import type { TableResource, UploadAnswer } from '#shared/contracts/tables';

import { newBuilding, newSmallBuilding, smallBuilding, upload } from '../../testing/smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from '../../testing/startTestServer.ts';
import { tablesHash } from '../../testing/tablesHash.ts';

const fixtures = join(import.meta.dirname, '../../../fixtures/csv');
interface BrokenFile {
  readonly folder: string;
  readonly base: 'us' | 'si';
  readonly table: string;
  readonly file: string;
  readonly beside?: string;
  readonly expected: readonly { readonly row: number | null; readonly column: string | null }[];
  readonly about: string;
}
const broken = JSON.parse(readFileSync(join(fixtures, 'broken/manifest.json'), 'utf8')) as BrokenFile[];
const tables = broken.filter((one) => one.table !== 'building' && one.beside === undefined);

let server: TestServer;
let engineer: Agent;
const valid: Partial<Record<'us' | 'si', string>> = {};

async function newValidBuilding(units: 'us' | 'si'): Promise<string> {
  const folder = join(fixtures, 'valid', units);
  const settings = JSON.parse(readFileSync(join(folder, 'building.json'), 'utf8')) as object;
  const id = await newBuilding(engineer, settings);
  for (const table of editableTables) {
    if (!readdirSync(folder).includes(`${table}.csv`)) continue;
    await upload(engineer, id, table, readFileSync(join(folder, `${table}.csv`), 'utf8')).expect(200);
  }
  return id;
}

beforeAll(async () => {
  server = await startTestServer();
  engineer = server.as('engineer');
  valid.us = await newValidBuilding('us');
  valid.si = await newValidBuilding('si');
});
afterAll(() => server.close());

describe('uploads', () => {
  it('refuses callers without session, of another office, and readers', async () => {
    const id = valid.us ?? '';
    expect((await upload(server.nobody(), id, 'levels', smallBuilding.levels)).status).toBe(401);
    expect((await upload(server.as('stranger'), id, 'levels', smallBuilding.levels)).status).toBe(404);
    expect((await upload(server.as('checker'), id, 'levels', smallBuilding.levels)).status).toBe(403);
  });

  it('knows at least forty ways in which a file can be broken', () => {
    expect(tables.length).toBeGreaterThanOrEqual(40);
  });

  it.each(tables)('refuses $folder ($about) at its row and column, and stores nothing of it', async (one) => {
    const id = valid[one.base] ?? '';
    const bytes = readFileSync(join(fixtures, 'broken', one.folder, one.file));
    const before = await tablesHash(server.database);
    for (const dryRun of ['true', 'false']) {
      const answer = await engineer
        .post(`/api/buildings/${id}/uploads`)
        .field('table', one.table)
        .field('dryRun', dryRun)
        .attach('file', bytes, one.file);
      expect(answer.status).toBe(422);
      const { error } = answer.body as {
        error: { code: string; problems: { row: number | null; column: string | null; file: string }[] };
      };
      expect(error.code).toBe('problems');
      expect(error.problems.map(({ row, column }) => ({ row, column }))).toEqual(one.expected);
      expect(new Set(error.problems.map((problem) => problem.file))).toEqual(new Set([one.file]));
    }
    expect(await tablesHash(server.database)).toBe(before);
  });

  it('stores nothing in a dry run and tells what would change', async () => {
    const id = await newSmallBuilding(engineer);
    const before = await tablesHash(server.database);
    const text =
      'Level,Case,Kind,FX (kN),fy,remark\nRoof,WX,wind,4.4482216152605,0,x\nL2,WX,wind,26,0,\nL2,WZ,other,1,2,\n';
    const answer = await upload(engineer, id, 'forces', text, { dryRun: 'true' });
    const body = answer.body as UploadAnswer;
    expect(answer.status).toBe(200);
    expect(body.changes).toEqual({ added: 1, removed: 2, changed: 2, same: 0 });
    expect(body.rows[0]).toMatchObject({ level: 'Roof', case: 'WX', fx: 1 });
    expect(body.columns).toContainEqual({ header: 'remark', column: null });
    expect(body.notices.some((notice) => notice.includes('remark'))).toBe(true);
    expect(await tablesHash(server.database)).toBe(before);
    const taken = (await upload(engineer, id, 'forces', text)).body as UploadAnswer;
    expect(taken.changes).toEqual(body.changes);
    expect(taken.version).toBe(body.version + 1);
  });

  it('matches own headers to columns by hand', async () => {
    const id = await newBuilding(engineer);
    const text = 'Floor,Story height\nRoof,11\nL2,13\n';
    const refused = await upload(engineer, id, 'levels', text);
    expect(refused.body).toMatchObject({ error: { code: 'problems' } });
    const columns = JSON.stringify({ Floor: 'level', 'Story height': 'height' });
    const taken = await upload(engineer, id, 'levels', text, { columns });
    expect((taken.body as UploadAnswer).rows).toMatchObject([
      { level: 'Roof', height: 11 },
      { level: 'L2', height: 13 },
    ]);
  });

  it('keeps ids over a new upload, in the order of the file', async () => {
    const id = await newSmallBuilding(engineer);
    const path = `/api/buildings/${id}/forces`;
    const before = ((await engineer.get(path)).body as TableResource<'forces'>).rows;
    await upload(engineer, id, 'forces', smallBuilding.forces.replace(',24,0', ',36,0')).expect(200);
    const after = ((await engineer.get(path)).body as TableResource<'forces'>).rows;
    expect(after.map((row) => row.id)).toEqual(before.map((row) => row.id));
    expect(after.map((row) => row.version - (before.find((old) => old.id === row.id)?.version ?? 0))).toEqual([
      1, 0, 0, 0,
    ]);
  });

  it('takes any order of first uploads, and takes levels that orphan rows with a notice', async () => {
    const id = await newBuilding(engineer);
    for (const table of ['gravity', 'forces', 'walls', 'levels'] as const) {
      await upload(engineer, id, table, smallBuilding[table]).expect(200);
    }
    const fewer = await upload(engineer, id, 'levels', 'level,height\nTop,11\nL2,13\n');
    expect(fewer.status).toBe(200);
    expect((fewer.body as UploadAnswer).notices.join('\n')).toContain('Roof');
    const results = await engineer.get(`/api/buildings/${id}/results`);
    expect(results.body).toMatchObject({ error: { code: 'does-not-compute' } });
  });

  it('refuses texts of combinations that do not read, with the place', async () => {
    const id = await newSmallBuilding(engineer);
    const answer = await upload(engineer, id, 'combinations', 'name,expression\nfirst,1.4D\nsecond,1.2D + 2 Q\n');
    expect(answer.body).toMatchObject({
      error: { problems: [{ row: 3, column: 'expression', table: 'combinations' }] },
    });
    const path = `/api/buildings/${id}/combinations`;
    const typed = await engineer.patch(path).send({ inserts: [{ after: null, row: { expression: 'D * L' } }] });
    expect(typed.body).toMatchObject({ error: { problems: [{ row: 1, column: 'expression' }] } });
    await engineer
      .patch(path)
      .send({ inserts: [{ after: null, row: { expression: '1.4D' } }] })
      .expect(200);
  });

  it('refuses unknown tables, a missing file and files over 8 MB', async () => {
    const id = valid.us ?? '';
    expect((await upload(engineer, id, 'beams', 'a\n')).body).toMatchObject({
      error: { problems: [{ column: 'table' }] },
    });
    const none = await engineer.post(`/api/buildings/${id}/uploads`).field('table', 'levels');
    expect(none.body).toMatchObject({ error: { code: 'invalid', problems: [{ column: 'file' }] } });
    const large = await upload(engineer, id, 'levels', 'x'.repeat(8 * 1024 * 1024 + 1));
    expect(large.status).toBe(413);
    expect(large.body).toMatchObject({ error: { code: 'too-large' } });
    const cut = await engineer
      .post(`/api/buildings/${id}/uploads`)
      .set('Content-Type', 'multipart/form-data; boundary=x')
      .send('--x\r\nContent-Disposition: form-data; name="file"; filename="a.csv"\r\n\r\nlevel');
    expect(cut.status).toBe(400);
    expect(cut.body).toMatchObject({ error: { code: 'unreadable' } });
  });

  it('takes 50,000 rows of gravity and replaces them again', async () => {
    const id = await newBuilding(engineer);
    const rows = Array.from({ length: 50_000 }, (_, nth) => `L${nth % 50},W${Math.floor(nth / 50)},${nth + 1}`);
    const text = `level,wall,dead\n${rows.join('\n')}\n`;
    expect(((await upload(engineer, id, 'gravity', text)).body as UploadAnswer).changes.added).toBe(50_000);
    const changed = text.replaceAll(',1\n', ',2\n');
    expect(((await upload(engineer, id, 'gravity', changed)).body as UploadAnswer).changes).toEqual({
      added: 0,
      removed: 0,
      changed: 1,
      same: 49_999,
    });
  });
});
