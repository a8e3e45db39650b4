import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResource } from '#shared/contracts/schedule';
import type { TableResource } from '#shared/contracts/tables';

import { newBuilding, newSmallBuilding, smallBuilding, upload } from '../testing/smallBuilding.ts';
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

  it('bodies that nest without end are unreadable, whatever the route', async () => {
    const deep = (open: string, close: string): string => `${open.repeat(10_000)}1${close.repeat(10_000)}`;
    const engineer = server.as('engineer');
    const bodies = [
      `{"name":"a","units":"us","basis":${deep('[', ']')}}`,
      `{"version":1,"stiffness":${deep('{"flexure":', '}')}}`,
      `{"version":1,"bars":${deep('{"web":', '}')}}`,
      `{"rows":${deep('[', ']')},"edits":${deep('[', ']')}}`,
    ];
    for (const body of bodies) {
      const calls = [
        engineer.post('/api/buildings'),
        engineer.patch(`/api/buildings/${id}`),
        engineer.patch(`/api/buildings/${id}/walls`),
        engineer.put(`/api/buildings/${id}/walls`).set('If-Match', '"1"'),
      ];
      for (const call of calls) {
        const answer = await call.set('Content-Type', 'application/json').send(body);
        expect([answer.status, (answer.body as { error: { code: string } }).error.code]).toEqual([400, 'unreadable']);
      }
    }
  });

  it('bodies of a type that is not read', async () => {
    for (const type of ['text/plain', 'application/xml', 'application/x-www-form-urlencoded']) {
      const call = server.as('engineer').patch(`/api/buildings/${id}/levels`).set('Content-Type', type);
      expect((await call.send('{"edits": []}')).status).toBe(400);
    }
  });

  it('a form whose part has a header with a null character', async () => {
    const part =
      '--b\r\nContent-Disposition: form-data; name="file"; filename="a\u0000b.csv"\r\n\r\nlevel\r\n--b--\r\n';
    const answer = await server
      .as('engineer')
      .post(`/api/buildings/${id}/uploads`)
      .set('Content-Type', 'multipart/form-data; boundary=b')
      .send(part);
    expect(answer.body).toMatchObject({ error: { code: 'unreadable' } });
    expect(answer.status).toBe(400);
  });

  it('an edit that changes nothing leaves the edit before it to be undone', async () => {
    const engineer = server.as('engineer');
    const own = await newSmallBuilding(engineer);
    const address = `/api/buildings/${own}/walls`;
    const first = async () => ((await engineer.get(address)).body as TableResource<'walls'>).rows[0];
    const wall = await first();
    const edit = (was: number, to: number) =>
      engineer.patch(address).send({ edits: [{ id: wall?.id, column: 'thickness', was, to }] });
    await edit(10, 12).expect(200);
    await edit(12, 12).expect(200);
    await engineer.patch(address).send({}).expect(200);
    await engineer.post(`/api/buildings/${own}/undo`).expect(200);
    expect((await first())?.thickness).toBe(10);
  });

  it('names that every object has are no columns and no cells', async () => {
    const row = { level: 'Attic', height: 12, constructor: 1 };
    const inserted = await server
      .as('engineer')
      .patch(`/api/buildings/${id}/levels`)
      .send({ inserts: [{ after: null, row }] });
    expect(inserted.status).toBe(422);
    expect(inserted.body).toMatchObject({ error: { problems: [{ column: 'constructor' }] } });
  });

  it('keeps every name, also those that every object has', async () => {
    const engineer = server.as('engineer');
    const own = await newBuilding(engineer);
    const names: readonly (readonly [string, string])[] = [
      ['Roof', '__proto__'],
      ['L2', '=1+1'],
      ['A,', 'constructor,'],
      ['B,', '-1,'],
      ['WX', '__proto__'],
      ['WY', 'toString'],
    ];
    for (const table of ['levels', 'walls', 'forces', 'gravity'] as const) {
      const text = names.reduce((so, [from, to]) => so.replaceAll(from, to), smallBuilding[table]);
      await upload(engineer, own, table, text).expect(200);
    }
    const answer = await engineer.get(`/api/buildings/${own}/results`).expect(200);
    const { levels, schedule } = answer.body as ResultDocument;
    expect(levels.map(({ level }) => level)).toEqual(['__proto__', '=1+1']);
    for (const { force, shear } of levels) {
      expect(Object.keys(force).sort()).toEqual(['__proto__', 'toString']);
      expect(Object.keys(shear).sort()).toEqual(['__proto__', 'toString']);
    }
    expect(Object.entries(levels[1]?.shear ?? {}).find(([name]) => name === '__proto__')?.[1].vx).toBeCloseTo(50, 9);
    expect(new Set(schedule.map(({ wall }) => wall))).toEqual(new Set(['constructor', '-1', 'C', 'D']));
  });

  it('walls and spacings that would keep a computation for hours', async () => {
    const engineer = server.as('engineer');
    const own = await newSmallBuilding(engineer);
    const file = smallBuilding.walls.replace('A,0,10,0,30,', 'A,0,10,0,30000,');
    const taken = await upload(engineer, own, 'walls', file);
    expect(taken.status).toBe(422);
    expect(taken.body).toMatchObject({ error: { problems: [{ file: 'walls.csv', row: 2, column: 'x2' }] } });

    const { rows } = (await engineer.get(`/api/buildings/${own}/schedule`)).body as ScheduleResource;
    const address = `/api/buildings/${own}/schedule/${rows[0]?.id ?? ''}`;
    for (const spacing of [1e-300, 0.01, 121]) {
      const body = { version: rows[0]?.version, vertical: { curtains: 2, bar: 5, spacing } };
      const answer = await engineer.patch(address).send(body);
      expect(answer.body).toMatchObject({ error: { code: 'invalid', problems: [{ column: 'vertical.spacing' }] } });
    }
    const settings = { name: 'Close bars', units: 'si', bars: { web: { spacings: [24, 200] } } };
    const made = await engineer.post('/api/buildings').send(settings);
    expect(made.status).toBe(422);
    expect(made.body).toMatchObject({ error: { problems: [{ column: 'bars.web.spacings' }] } });
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
