import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { newSmallBuilding, upload } from '../testing/smallBuilding.ts';
import { startTestServer, type TestServer } from '../testing/startTestServer.ts';

let server: TestServer;
let id: string;
beforeAll(async () => {
  server = await startTestServer();
  id = await newSmallBuilding(server.as('engineer'));
});
afterAll(() => server.close());

describe('odd requests', () => {
  it.each([
    ['a null character in a name', { name: 'a\u0000b', units: 'us' }, 400],
    ['a number for a body', 5, 422],
    ['null', null, 422],
    ['a list', [], 422],
    ['a name of 10,000 letters', { name: 'x'.repeat(10_000), units: 'us' }, 422],
    ['a lone surrogate', { name: 'a\ud800', units: 'us' }, 201],
    ['__proto__', JSON.parse('{"__proto__": {"name": "x"}, "units": "us"}') as object, 422],
  ])('a building of %s', async (_about, body, status) => {
    const answer = await server
      .as('engineer')
      .post('/api/buildings')
      .set('Content-Type', 'application/json')
      .send(JSON.stringify(body));
    expect(answer.status).toBe(status);
  });

  it.each(['%00', '..%2f..', "'; DROP TABLE building; --", 'x'.repeat(3000)])('a building called %s', async (name) => {
    const answer = await server
      .as('engineer')
      .get(`/api/buildings/${name.includes('%') ? name : encodeURIComponent(name)}`);
    expect(answer.status).toBe(404);
  });

  it('cells that no database could hold', async () => {
    const insert = (row: object) =>
      server
        .as('engineer')
        .patch(`/api/buildings/${id}/levels`)
        .send({ inserts: [{ after: null, row }] });
    for (const row of [
      { level: 'x', height: 1e300 },
      { level: 'x', height: '12' },
      { level: 'x'.repeat(501), height: 12 },
      { level: '\u0007', height: 12 },
      { level: {}, height: 12 },
      {},
    ]) {
      expect((await insert(row)).status).toBe(422);
    }
    expect((await insert({ level: '  spaced  ', height: 12 })).body).toMatchObject({ rows: [{ level: 'spaced' }] });
  });

  it('files and forms that are something else', async () => {
    const engineer = server.as('engineer');
    expect((await upload(engineer, id, 'levels', 'level,height\na\u0000b,12\n')).status).toBe(422);
    expect((await upload(engineer, id, 'levels', `level,height\n${'x'.repeat(600)},12\n`)).status).toBe(422);
    expect((await upload(engineer, id, 'levels', '')).status).toBe(422);
    expect((await engineer.post(`/api/buildings/${id}/uploads`).send({ table: 'levels' })).status).toBe(422);
    const columns = await upload(engineer, id, 'levels', 'level,height\nR,12\n', { columns: 'no json' });
    expect(columns.body).toMatchObject({ error: { problems: [{ column: 'columns' }] } });
  });

  it('versions and tags that are no numbers of ours', async () => {
    const engineer = server.as('engineer');
    for (const version of [1e20, -1, 1.5, '1', null]) {
      const answer = await engineer.patch(`/api/buildings/${id}`).send({ version, number: 'x' });
      expect([409, 422]).toContain(answer.status);
    }
    const put = (tag: string) => engineer.put(`/api/buildings/${id}/levels`).set('If-Match', tag).send({ rows: [] });
    expect((await put('W/"x"')).status).toBe(422);
    expect((await put('"99999999999"')).status).toBe(409);
  });

  it('a sign-in with an address that no database could hold', async () => {
    const answer = await server.nobody().post('/api/session').send({ email: 'a@b.example\u0001', password: 'x' });
    expect(answer.status).toBe(401);
  });
});
