import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { BuildingListRow, BuildingResource } from '#shared/contracts/buildings';

import { newBuilding, newSmallBuilding } from '../../testing/smallBuilding.ts';
import { startTestServer, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const read = async (id: string): Promise<BuildingResource> =>
  (await server.as('engineer').get(`/api/buildings/${id}`).expect(200)).body as BuildingResource;
const patch = (id: string, body: object) => server.as('engineer').patch(`/api/buildings/${id}`).send(body);

describe('buildings', () => {
  it('refuses callers without session, of another office, and drafters', async () => {
    const id = await newBuilding(server.as('engineer'));
    expect((await server.nobody().get(`/api/buildings/${id}`)).status).toBe(401);
    expect((await server.as('stranger').get(`/api/buildings/${id}`)).status).toBe(404);
    expect((await server.as('drafter').get(`/api/buildings/${id}`)).status).toBe(403);
    expect((await server.as('admin').post('/api/buildings').send({ name: 'No', units: 'us' })).status).toBe(403);
  });

  it('fills in the defaults of the units and answers 201 with the address', async () => {
    const answer = await server.as('engineer').post('/api/buildings').send({ name: 'Metric', units: 'si' });
    const body = answer.body as BuildingResource;
    expect(answer.status).toBe(201);
    expect(answer.headers.location).toBe(`/api/buildings/${body.id}`);
    expect(body).toMatchObject({ fc: 35, fy: 420, cover: 20, edge: 75, state: 'in progress', seq: 1, version: 1 });
    expect(body.basis).toEqual(['rigid', 'compatible']);
    expect(body).not.toHaveProperty('given');
  });

  it('says what is not designed yet, and lists every problem', async () => {
    const special = await server
      .as('engineer')
      .post('/api/buildings')
      .send({ name: 'S', units: 'us', wallClass: 'special' });
    expect(special.status).toBe(422);
    expect(special.body).toMatchObject({ error: { code: 'not-designed-yet', problems: [{ column: 'wallClass' }] } });
    const wrong = await server.as('engineer').post('/api/buildings').send({ units: 'feet', fc: -1 });
    const { error } = wrong.body as { error: { code: string; problems: { column: string }[] } };
    expect(error.code).toBe('problems');
    expect(error.problems.map((problem) => problem.column).sort()).toEqual(['fc', 'name', 'units']);
  });

  it('lists those of the office with what the list needs, newest change first, and none to drafters', async () => {
    const id = await newSmallBuilding(server.as('engineer'), { name: 'Listed', units: 'us', number: '12' });
    const { rows } = (await server.as('checker').get('/api/buildings')).body as { rows: BuildingListRow[] };
    expect(rows[0]).toMatchObject({
      id,
      name: 'Listed',
      number: '12',
      units: 'us',
      levels: 2,
      walls: 4,
      changedBy: 'The engineer',
      seq: 5,
    });
    expect((await server.as('drafter').get('/api/buildings')).body).toEqual({ rows: [] });
    const theirs = (await server.as('stranger').get('/api/buildings')).body as { rows: BuildingListRow[] };
    expect(theirs.rows.map((row) => row.id)).not.toContain(id);
  });

  it('hides a building of members from the others of the office, not from its members and admins', async () => {
    const id = await newBuilding(server.as('engineer'));
    await server.database.dataSource.query(`UPDATE "building" SET "access" = 'members' WHERE "id" = '${id}'`);
    expect((await server.as('engineer').get(`/api/buildings/${id}`)).status).toBe(200);
    expect((await server.as('admin').get(`/api/buildings/${id}`)).status).toBe(200);
    expect((await server.as('colleague').get(`/api/buildings/${id}`)).status).toBe(404);
    const { rows } = (await server.as('colleague').get('/api/buildings')).body as { rows: BuildingListRow[] };
    expect(rows.map((row) => row.id)).not.toContain(id);
  });
});

describe('settings', () => {
  it('change under their version, null goes back to the default', async () => {
    const id = await newBuilding(server.as('engineer'));
    const changed = (await patch(id, { version: 1, fc: 6000, stiffness: { flexure: 0.35 } })).body as BuildingResource;
    expect(changed).toMatchObject({ fc: 6000, version: 2, seq: 2, stiffness: { flexure: 0.35, shear: 1 } });
    const old = await patch(id, { version: 1, fc: 7000 });
    expect(old.status).toBe(409);
    expect(old.body).toMatchObject({ error: { code: 'version', current: { fc: 6000, version: 2, seq: 2 } } });
    expect((await patch(id, { version: 2, fc: null })).body).toMatchObject({ fc: 5000, version: 3 });
  });

  it('name the version and known keys', async () => {
    const id = await newBuilding(server.as('engineer'));
    expect((await patch(id, { fc: 6000 })).body).toMatchObject({ error: { problems: [{ column: 'version' }] } });
    expect((await patch(id, { version: 1, colour: 'red' })).body).toMatchObject({
      error: { problems: [{ column: 'colour' }] },
    });
    expect((await patch(id, { version: 1, mergeShare: 0.1 })).body).toMatchObject({
      error: { code: 'not-designed-yet' },
    });
    expect((await read(id)).version).toBe(1);
  });

  it('keep the units while a table has rows', async () => {
    const empty = await newBuilding(server.as('engineer'));
    expect((await patch(empty, { version: 1, units: 'si' })).body).toMatchObject({ units: 'si', fc: 35 });
    const filled = await newSmallBuilding(server.as('engineer'));
    const refused = await patch(filled, { version: 1, units: 'si' });
    expect(refused.status).toBe(409);
    expect(refused.body).toMatchObject({ error: { code: 'units-fixed' } });
  });

  it('take one of twenty changes of one version', async () => {
    const id = await newBuilding(server.as('engineer'));
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, nth) => patch(id, { version: 1, number: `n${nth}` })),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, ...Array.from({ length: 19 }, () => 409)]);
    expect(await read(id)).toMatchObject({ version: 2, seq: 2 });
  });
});

describe('DELETE', () => {
  it('hides the building from everybody', async () => {
    const id = await newBuilding(server.as('engineer'));
    await server.as('engineer').delete(`/api/buildings/${id}`).expect(204);
    expect((await server.as('engineer').get(`/api/buildings/${id}`)).status).toBe(404);
    expect((await server.as('admin').get(`/api/buildings/${id}/levels`)).status).toBe(404);
  });
});
