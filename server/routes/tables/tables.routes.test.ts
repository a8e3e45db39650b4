import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import type { StoredRow, TablePatchAnswer, TableResource } from '#shared/contracts/tables';

import { newSmallBuilding } from '../../testing/smallBuilding.ts';
import { startTestServer, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let id: string;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  id = await newSmallBuilding(server.as('engineer'));
});

const path = (table: string): string => `/api/buildings/${id}/${table}`;
const get = async <T extends 'levels' | 'walls' | 'forces' | 'gravity'>(table: T): Promise<TableResource<T>> =>
  (await server.as('engineer').get(path(table)).expect(200)).body as TableResource<T>;
const patch = (table: string, body: object) => server.as('engineer').patch(path(table)).send(body);
const first = <T>(rows: readonly T[]): T => {
  const row = rows[0];
  if (row === undefined) throw new Error('no rows');
  return row;
};

describe('a table', () => {
  it('refuses callers without session, of another office, and drafters', async () => {
    expect((await server.nobody().get(path('levels'))).status).toBe(401);
    expect((await server.as('stranger').get(path('levels'))).status).toBe(404);
    expect((await server.as('drafter').get(path('levels'))).status).toBe(403);
    expect((await server.as('checker').patch(path('levels')).send({})).status).toBe(403);
    expect((await server.as('engineer').get('/api/buildings/unknown/levels')).status).toBe(404);
  });

  it('lists its rows as typed, in the order of the file, with a version that serves as tag', async () => {
    const answer = await server.as('checker').get(path('levels'));
    const { rows, version } = answer.body as TableResource<'levels'>;
    expect(rows.map((row) => [row.level, row.height, row.extent_x, row.elevation])).toEqual([
      ['Roof', 11, 60, null],
      ['L2', 13, 60, null],
    ]);
    expect(answer.headers.etag).toBe(`"${version}"`);
    const again = await server.as('checker').get(path('levels')).set('If-None-Match', `"${version}"`);
    expect(again.status).toBe(304);
  });
});

describe('PATCH of cells', () => {
  it('changes a cell and moves the versions of row, table and building', async () => {
    const before = await get('levels');
    const row = first(before.rows);
    const answer = await patch('levels', { edits: [{ id: row.id, column: 'height', was: 11, to: 12.5 }] });
    expect(answer.status).toBe(200);
    const body = answer.body as TablePatchAnswer<'levels'>;
    expect(body.rows).toEqual([{ ...row, height: 12.5, version: row.version + 1 }]);
    expect(body.version).toBe(before.version + 1);
    expect(body.seq).toBe(before.seq + 1);
  });

  it('refuses with the cells whose `was` is no longer stored, and takes nothing', async () => {
    const [roof, l2] = (await get('levels')).rows;
    const answer = await patch('levels', {
      edits: [
        { id: roof?.id, column: 'height', was: 11, to: 14 },
        { id: l2?.id, column: 'height', was: 99, to: 14 },
      ],
    });
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({
      error: { code: 'cell-moved', current: [{ id: l2?.id, column: 'height', was: 99, stored: 13 }] },
    });
    expect((await get('levels')).rows.map((row) => row.height)).toEqual([11, 13]);
  });

  it('lets one of twenty edits of one cell through, and all of twenty edits of different rows', async () => {
    const row = first((await get('walls')).rows);
    const same = await Promise.all(
      Array.from({ length: 20 }, (_, nth) =>
        patch('walls', { edits: [{ id: row.id, column: 'thickness', was: 10, to: 11 + nth }] }),
      ),
    );
    const statuses = same.map((answer) => answer.status).sort();
    expect(statuses).toEqual([200, ...Array.from({ length: 19 }, () => 409)]);

    const inserts = Array.from({ length: 20 }, (_, nth) => ({
      after: null,
      row: { level: 'Roof', case: `X${nth}`, kind: 'other', fx: 1, fy: 0 },
    }));
    const made = (await patch('forces', { inserts })).body as TablePatchAnswer<'forces'>;
    const different = await Promise.all(
      made.rows.map((force, nth) => patch('forces', { edits: [{ id: force.id, column: 'fx', was: 1, to: 2 + nth }] })),
    );
    expect(different.map((answer) => answer.status)).toEqual(Array.from({ length: 20 }, () => 200));
  });

  it('gives every problem with its row and column, in the words read and expected', async () => {
    const row = first((await get('walls')).rows);
    const answer = await patch('walls', {
      edits: [
        { id: row.id, column: 'thickness', was: 10, to: -1 },
        { id: row.id, column: 'wall', was: 'A', to: ' ' },
        { id: row.id, column: 'color', was: null, to: 'red' },
        { id: row.id, column: 'opening', was: null, to: 1.5 },
      ],
    });
    expect(answer.status).toBe(422);
    const { problems } = (answer.body as { error: { problems: { column: string; rowId: string; message: string }[] } })
      .error;
    expect(problems.map((problem) => problem.column)).toEqual(['thickness', 'wall', 'color', 'opening']);
    expect(problems.every((problem) => problem.rowId === row.id)).toBe(true);
    expect(problems[0]?.message).toBe('thickness reads "-1", expected a number above 0; correct the cell');
    expect(problems[3]?.message).toBe(
      'opening reads "1.5", expected a number not below 0 and not above 1; correct the cell',
    );
  });

  it('lets a half-finished building stand', async () => {
    const row = first((await get('levels')).rows);
    await patch('levels', { deletes: [{ id: row.id, version: row.version }] }).expect(200);
    const answer = await server.as('engineer').get(path('results'));
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { code: 'does-not-compute' } });
    const { problems } = (answer.body as { error: { problems: { table: string; rowId?: string }[] } }).error;
    const walls = (await get('walls')).rows.map((wall) => wall.id);
    const named = problems.filter((problem) => problem.table === 'walls').map((problem) => problem.rowId);
    expect(named.sort()).toEqual(walls.sort());
  });
});

describe('PATCH of rows', () => {
  it('puts new rows where they were asked for', async () => {
    const [roof, l2] = (await get('levels')).rows;
    const row = (level: string) => ({ level, height: 10 });
    await patch('levels', {
      inserts: [
        { after: roof?.id, row: row('between 1') },
        { after: roof?.id, row: row('between 2') },
        { after: l2?.id, row: row('below') },
        { after: null, row: row('top') },
      ],
    }).expect(200);
    const names = (await get('levels')).rows.map((stored) => stored.level);
    expect(names).toEqual(['top', 'Roof', 'between 1', 'between 2', 'L2', 'below']);
  });

  it('keeps the order when the gap between two rows is used up', async () => {
    const top = first((await get('levels')).rows).id;
    for (let nth = 0; nth < 40; nth += 1) {
      await patch('levels', { inserts: [{ after: top, row: { level: `n${nth}`, height: 1 } }] }).expect(200);
    }
    const names = (await get('levels')).rows.map((stored) => stored.level);
    const added = Array.from({ length: 40 }, (_, nth) => `n${39 - nth}`);
    expect(names).toEqual(['Roof', ...added, 'L2']);
  });

  it('deletes a row in the version that was read only', async () => {
    const row = first((await get('gravity')).rows);
    const stale = await patch('gravity', { deletes: [{ id: row.id, version: row.version + 1 }] });
    expect(stale.status).toBe(409);
    expect(stale.body).toMatchObject({ error: { code: 'version', current: [{ id: row.id, dead: 40 }] } });
    await patch('gravity', { deletes: [{ id: row.id, version: row.version }] }).expect(200);
    expect((await get('gravity')).rows.map((stored) => stored.id)).not.toContain(row.id);
  });
});

describe('renaming', () => {
  it('of a level goes through walls, forces and gravity in the same edit', async () => {
    const before = await get('levels');
    const roof = first(before.rows);
    const answer = await patch('levels', { edits: [{ id: roof.id, column: 'level', was: 'Roof', to: 'Attic' }] });
    const body = answer.body as TablePatchAnswer<'levels'>;
    expect(body.alsoChanged).toEqual(['walls', 'forces', 'gravity']);
    expect(body.seq).toBe(before.seq + 1);
    expect((await get('walls')).rows.map((row) => row.to_level)).toEqual(['Attic', 'Attic', 'Attic', 'Attic']);
    expect((await get('forces')).rows.map((row) => row.level)).toEqual(['Attic', 'L2', 'Attic', 'L2']);
    expect((await get('gravity')).rows.filter((row) => row.level === 'Attic')).toHaveLength(4);
    await server.as('engineer').get(path('results')).expect(200);
  });

  it('of a case in all its rows goes through to the base shear expected of it, and undo takes both back', async () => {
    const engineer = server.as('engineer');
    const expected = async (): Promise<unknown> =>
      ((await engineer.get(`/api/buildings/${id}`)).body as { expectedBaseShear: unknown }).expectedBaseShear;
    await engineer
      .patch(`/api/buildings/${id}`)
      .send({ version: 1, expectedBaseShear: { WX: 50 } })
      .expect(200);
    const rows = (await get('forces')).rows.filter((row) => row.case === 'WX');
    const edit = (row: StoredRow<'forces'> | undefined) => ({ id: row?.id, column: 'case', was: 'WX', to: 'West' });
    await patch('forces', { edits: [edit(rows[0])] }).expect(200);
    expect(await expected()).toEqual({ WX: 50 });
    await patch('forces', { edits: [edit(rows[1])] }).expect(200);
    expect(await expected()).toEqual({ West: 50 });
    await engineer.post(path('undo')).send({}).expect(200);
    expect(await expected()).toEqual({ WX: 50 });
    expect((await get('forces')).rows.map((row) => row.case)).toEqual(['West', 'WX', 'WY', 'WY']);
  });

  it('of a wall goes through gravity; a second band that keeps the old name stops it', async () => {
    const wall = first((await get('walls')).rows);
    await patch('walls', { edits: [{ id: wall.id, column: 'wall', was: 'A', to: 'W1' }] }).expect(200);
    expect((await get('gravity')).rows.filter((row) => row.wall === 'W1')).toHaveLength(2);
    const { id: _id, version: _version, ...cells } = { ...wall, wall: 'W1', from_level: 'Roof' };
    await patch('walls', { inserts: [{ after: wall.id, row: cells }] }).expect(200);
    await patch('walls', { edits: [{ id: wall.id, column: 'wall', was: 'W1', to: 'W2' }] }).expect(200);
    expect((await get('gravity')).rows.filter((row) => row.wall === 'W1')).toHaveLength(2);
  });
});

describe('PUT of a table', () => {
  const put = (table: string, version: number, rows: readonly object[]) =>
    server.as('engineer').put(path(table)).set('If-Match', `"${version}"`).send({ rows });

  it('asks for If-Match and refuses an old version', async () => {
    const { rows, version } = await get('forces');
    const without = await server.as('engineer').put(path('forces')).send({ rows });
    expect(without.status).toBe(422);
    expect(without.body).toMatchObject({ error: { code: 'if-match-missing' } });
    const old = await put('forces', version - 1, rows);
    expect(old.status).toBe(409);
    expect(old.body).toMatchObject({ error: { code: 'version', current: { version } } });
  });

  it('keeps the ids of rows that keep their names', async () => {
    const { rows, version } = await get('forces');
    const next = [
      ...rows.map((row) => ({ ...row, fx: row.fx * 1.5 })).reverse(),
      { level: 'Roof', case: 'H', kind: 'other', fx: 5, fy: 0 },
    ];
    const answer = await put('forces', version, next);
    expect(answer.status).toBe(200);
    const stored = (answer.body as TableResource<'forces'>).rows;
    expect(stored.map((row) => row.id).slice(0, 4)).toEqual(rows.map((row) => row.id).reverse());
    const expected = (row: StoredRow<'forces'>): number => (row.fx === 0 ? row.version : row.version + 1);
    const again = rows.find((row) => row.fx === 24);
    expect(stored.find((row) => row.id === again?.id)).toMatchObject({ fx: 36, case: 'WX' });
    expect(stored.find((row) => row.id === again?.id)?.version).toBe(again === undefined ? 0 : expected(again));
    expect(stored).toHaveLength(5);
  });

  it('refuses rows that do not fit, with row and column, and takes nothing', async () => {
    const { rows, version } = await get('forces');
    const wrong = rows.map((row, nth) =>
      nth === 1 ? { ...row, level: 'L9' } : { ...row, fx: nth === 2 ? null : row.fx },
    );
    const cells = await put('forces', version, wrong);
    expect(cells.body).toMatchObject({
      error: { code: 'problems', problems: [{ table: 'forces', row: 3, column: 'fx' }] },
    });
    const across = await put(
      'forces',
      version,
      rows.map((row, nth) => (nth === 1 ? { ...row, level: 'L9' } : row)),
    );
    expect(across.status).toBe(422);
    expect(across.body).toMatchObject({ error: { problems: [{ table: 'forces', row: 2, column: 'level' }] } });
    expect((await get('forces')).version).toBe(version);
  });
});
