import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ScheduleResource } from '#shared/contracts/schedule';
import { editableTables } from '#shared/contracts/tableColumns';
import { callers, matrix, type CallerKind, type MatrixLine } from '#shared/permissions/matrix';

import { newSmallBuilding, smallBuilding, upload } from '../testing/smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from '../testing/startTestServer.ts';
import { addressOf, testPassword } from '../testing/people.ts';

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
  readonly handle?: { readonly stack?: readonly Layer[] };
}

/** Every route of the running application, found in the router's own stack. */
function routesOf(layers: readonly Layer[]): string[] {
  return layers.flatMap((layer) => {
    const { route } = layer;
    if (route !== undefined) {
      return Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`);
    }
    return routesOf(layer.handle?.stack ?? []);
  });
}

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

describe('router', () => {
  it('has the routes of the matrix and no other', () => {
    const { router } = server.app.express as unknown as { router: { stack: readonly Layer[] } };
    expect(routesOf(router.stack).sort()).toEqual(matrix.map((line) => `${line.method} ${line.path}`).sort());
  });

  it.each(['POST /redo', 'GET /schedule.csv', 'GET /book.pdf', 'POST /jobs', 'GET /events'])(
    'has no %s, which belongs to later work',
    async (route) => {
      const [method, path] = route.split(' ');
      const address = `/api/buildings/x${path ?? ''}`;
      const agent = server.as('engineer');
      const answer = await (method === 'GET' ? agent.get(address) : agent.post(address).send({}));
      expect(answer.status).toBe(404);
    },
  );
});

/** A call that is in order apart from who makes it. */
async function call(agent: Agent, line: MatrixLine, id: string): Promise<number> {
  const path = line.path.replace(':id', id);
  const table = editableTables.find((name) => path.endsWith(`/${name}`));
  if (line.action === 'session.open') {
    const body = { email: addressOf('engineer'), password: testPassword };
    return (await agent.post(path).send(body)).status;
  }
  if (line.action === 'upload.take') {
    return (await upload(agent, id, 'levels', smallBuilding.levels, { dryRun: 'true' })).status;
  }
  if (line.action === 'buildings.create') return (await agent.post(path).send({ name: 'Another', units: 'us' })).status;
  if (line.action === 'building.edit') {
    const version = await currentVersion(`/api/buildings/${id}`);
    return (await agent.patch(path).send({ version, number: '7' })).status;
  }
  if (line.action === 'edit.undo') {
    const engineer = server.as('engineer');
    const version = await currentVersion(`/api/buildings/${id}`);
    await engineer
      .patch(`/api/buildings/${id}`)
      .send({ version, number: String(version) })
      .expect(200);
    return (await agent.post(path).send({})).status;
  }
  if (line.action === 'acknowledgments.add') {
    return (await agent.post(path).send({ code: 'collectors', reason: 'designed with the slab' })).status;
  }
  if (line.action === 'schedule.edit') {
    const { rows } = (await server.as('engineer').get(`/api/buildings/${id}/schedule`)).body as ScheduleResource;
    const row = rows[0];
    const body = { version: row?.version, vertical: { curtains: 2, bar: 8, spacing: 6 + (row?.version ?? 0) } };
    return (await agent.patch(path.replace(':rowId', row?.id ?? '')).send(body)).status;
  }
  if (table !== undefined && line.method === 'PUT') {
    const stored = (await server.as('engineer').get(path)).body as { rows: object[]; version: number };
    return (await agent.put(path).set('If-Match', `"${stored.version}"`).send({ rows: stored.rows })).status;
  }
  if (line.method === 'GET') return (await agent.get(path)).status;
  if (line.method === 'DELETE') return (await agent.delete(path)).status;
  return (await agent.patch(path).send({})).status;
}

async function currentVersion(path: string): Promise<number> {
  return ((await server.as('engineer').get(path)).body as { version: number }).version;
}

const byDeed = (line: MatrixLine): number => (line.method === 'DELETE' ? 1 : 0);

describe('every route for every caller', () => {
  it.each(callers)('answers the %s as the matrix says', async (caller: CallerKind) => {
    const id = await newSmallBuilding(server.as('engineer'));
    const agent = caller === 'nobody' ? server.nobody() : server.as(caller);
    const expected: Record<string, number> = {};
    const seen: Record<string, number> = {};
    for (const line of [...matrix].sort((a, b) => byDeed(a) - byDeed(b))) {
      // signing in and out belongs to an agent of its own
      const own = line.path === '/api/session' && line.method !== 'GET' ? server.nobody() : agent;
      if (line.action === 'session.close' && caller !== 'nobody') {
        await own
          .post('/api/session')
          .send({ email: addressOf(caller), password: testPassword })
          .expect(200);
      }
      expected[line.action] = line.answers[caller];
      seen[line.action] = await call(own, line, id);
    }
    expect(seen).toEqual(expected);
  });
});

describe('order of refusals', () => {
  it('reads first, then asks for the header, the session, the building, the role, the body', async () => {
    const id = await newSmallBuilding(server.as('engineer'));
    const path = `/api/buildings/${id}/levels`;
    const json = { 'Content-Type': 'application/json' };
    const codeOf = (answer: { status: number; body: unknown }): [number, string] => [
      answer.status,
      (answer.body as { error: { code: string } }).error.code,
    ];
    const unreadable = await server.nobody().patch(path).set(json).set('X-Requested-With', '').send('{"edits":');
    expect(codeOf(unreadable)).toEqual([400, 'unreadable']);
    const foreign = await server.nobody().patch(path).set('X-Requested-With', '').send({ edits: 'none' });
    expect(codeOf(foreign)).toEqual([403, 'csrf']);
    expect(codeOf(await server.nobody().patch(path).send({ edits: 'none' }))).toEqual([401, 'no-session']);
    expect(codeOf(await server.as('stranger').patch(path).send({ edits: 'none' }))).toEqual([404, 'not-found']);
    expect(codeOf(await server.as('checker').patch(path).send({ edits: 'none' }))).toEqual([403, 'forbidden']);
    expect(codeOf(await server.as('engineer').patch(path).send({ edits: 'none' }))).toEqual([422, 'invalid']);
  });
});
