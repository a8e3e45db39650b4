import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import type { BuildingResource } from '#shared/contracts/buildings';
import type { StoredRow, TableResource } from '#shared/contracts/tables';
import type { UndoAnswer } from '#shared/contracts/undo';

import { newSmallBuilding, smallBuilding, upload } from '../../testing/smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let id: string;
let engineer: Agent;
beforeAll(async () => {
  server = await startTestServer();
  engineer = server.as('engineer');
});
afterAll(() => server.close());
beforeEach(async () => {
  id = await newSmallBuilding(engineer);
});

const path = (table: string): string => `/api/buildings/${id}/${table}`;
const undo = (agent: Agent = engineer) => agent.post(path('undo')).send({});
type Levels = TableResource<'levels'>;
const levels = async (): Promise<readonly StoredRow<'levels'>[]> =>
  ((await engineer.get(path('levels'))).body as Levels).rows;
const cells = async (table: string): Promise<object[]> =>
  ((await engineer.get(path(table))).body as { rows: (object & { version: number })[] }).rows.map(
    ({ version: _version, ...row }) => row,
  );
const setHeight = async (agent: Agent, nth: number, was: number, to: number): Promise<void> => {
  const row = (await levels())[nth];
  await agent
    .patch(path('levels'))
    .send({ edits: [{ id: row?.id, column: 'height', was, to }] })
    .expect(200);
};
const heights = async (): Promise<number[]> => (await levels()).map((row) => row.height);

describe('undo', () => {
  it('refuses callers without session, of another office, and readers', async () => {
    expect((await undo(server.nobody())).status).toBe(401);
    expect((await undo(server.as('stranger'))).status).toBe(404);
    expect((await undo(server.as('checker'))).status).toBe(403);
  });

  it('takes back own edits one after the other, and not those of a colleague', async () => {
    await setHeight(engineer, 0, 11, 12);
    await setHeight(server.as('colleague'), 1, 13, 14);
    await setHeight(engineer, 0, 12, 15);
    const answer = (await undo()).body as UndoAnswer;
    expect(answer).toEqual({ seq: 9, undone: 8, targets: ['levels'] });
    expect(await heights()).toEqual([12, 14]);
    expect((await undo()).body).toMatchObject({ undone: 6 });
    expect(await heights()).toEqual([11, 14]);
    expect((await undo(server.as('colleague'))).body).toMatchObject({ undone: 7 });
    expect(await heights()).toEqual([11, 13]);
  });

  it('is refused where the cell has moved on, and changes nothing', async () => {
    await setHeight(engineer, 0, 11, 12);
    await setHeight(server.as('colleague'), 0, 12, 16);
    const refused = await undo();
    expect(refused.status).toBe(409);
    expect(refused.body).toMatchObject({
      error: { code: 'moved-on', current: [{ table: 'levels', column: 'height', stored: 16 }] },
    });
    expect(await heights()).toEqual([16, 13]);
  });

  it('takes back inserts and deletes together', async () => {
    const before = await cells('gravity');
    const { rows } = (await engineer.get(path('gravity'))).body as TableResource<'gravity'>;
    const gone = rows[2];
    await engineer
      .patch(path('gravity'))
      .send({
        inserts: [{ after: rows[0]?.id, row: { level: 'Roof', wall: 'A', dead: 3 } }],
        deletes: [{ id: gone?.id, version: gone?.version }],
      })
      .expect(200);
    expect(await cells('gravity')).not.toEqual(before);
    await undo().expect(200);
    expect(await cells('gravity')).toEqual(before);
  });

  it('takes back a rename with all that it went through', async () => {
    const before = await Promise.all(['levels', 'walls', 'forces', 'gravity'].map(cells));
    const roof = (await levels())[0];
    await engineer
      .patch(path('levels'))
      .send({ edits: [{ id: roof?.id, column: 'level', was: 'Roof', to: 'Attic' }] })
      .expect(200);
    await engineer.get(path('schedule')).expect(200);
    const answer = (await undo()).body as UndoAnswer;
    expect([...answer.targets].sort()).toEqual(['forces', 'gravity', 'levels', 'walls']);
    expect(await Promise.all(['levels', 'walls', 'forces', 'gravity'].map(cells))).toEqual(before);
    await engineer.get(path('schedule')).expect(200);
  });

  it('takes back an upload and a PUT', async () => {
    const before = await cells('forces');
    const { rows, version } = (await engineer.get(path('forces'))).body as TableResource<'forces'>;
    await engineer
      .put(path('forces'))
      .set('If-Match', String(version))
      .send({ rows: rows.slice(1).map((row) => ({ ...row, fy: row.fy + 1 })) })
      .expect(200);
    await upload(engineer, id, 'forces', smallBuilding.forces.replaceAll('WX', 'WXN')).expect(200);
    await undo().expect(200);
    expect(await cells('forces')).toHaveLength(3);
    await undo().expect(200);
    expect(await cells('forces')).toEqual(before);
  });

  it('takes back settings, and leaves those changed since by others alone', async () => {
    const read = async (): Promise<BuildingResource> =>
      (await engineer.get(`/api/buildings/${id}`)).body as BuildingResource;
    const change = (agent: Agent, version: number, body: object) =>
      agent
        .patch(`/api/buildings/${id}`)
        .send({ version, ...body })
        .expect(200);
    await change(engineer, 1, { fc: 6000, sds: 0.4 });
    await change(server.as('colleague'), 2, { number: '44' });
    await undo().expect(200);
    expect(await read()).toMatchObject({ fc: 5000, sds: 0, number: '44', version: 4 });
    await change(engineer, 4, { fc: 6000 });
    await change(server.as('colleague'), 5, { fc: 7000 });
    expect((await undo()).body).toMatchObject({ error: { code: 'moved-on', current: [{ column: 'fc' }] } });
    expect(await read()).toMatchObject({ fc: 7000 });
  });

  it('says when nothing is left', async () => {
    const answer = await undo(server.as('colleague'));
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({ error: { code: 'nothing-to-undo' } });
  });
});
