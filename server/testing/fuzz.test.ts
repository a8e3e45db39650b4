import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { editableTables, type EditableTable } from '#shared/contracts/tableColumns';
import type { ScheduleResource } from '#shared/contracts/schedule';

import { Mutator, seededRandom } from './fuzzBodies.ts';
import { newSmallBuilding, smallBuilding, upload } from './smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from './startTestServer.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

type Row = Readonly<Record<string, string | number | null>>;
interface Seen {
  readonly status: number;
  readonly body: unknown;
}
type Deed = (agent: Agent, path: string, id: string, by: Mutator) => Promise<Seen | null>;

const uploaded = ['levels', 'walls', 'forces', 'gravity'] as const;

async function rowsOf(agent: Agent, path: string, table: EditableTable): Promise<{ rows: Row[]; version: number }> {
  return (await agent.get(`${path}/${table}`)).body as { rows: Row[]; version: number };
}

/** A valid body of every changing route, mutated. JSON by hand, so that __proto__ and lone halves of pairs arrive. */
const send = (call: ReturnType<Agent['post']>, body: unknown): Promise<Seen> =>
  call.set('Content-Type', 'application/json').send(JSON.stringify(body) ?? 'null');

const deeds: readonly Deed[] = [
  (agent, _path, _id, by) => {
    const bars = { web: { sizes: [4, 5], spacings: [12] } };
    const valid = {
      name: 'Fuzz',
      units: by.pick(['us', 'si']),
      stiffness: { flexure: 0.7 },
      sds: 1,
      bandStories: 2,
      bars,
    };
    return send(agent.post('/api/buildings'), by.mutate(valid));
  },
  async (agent, path, _id, by) => {
    const { version } = (await agent.get(path)).body as { version: number };
    const changes = [
      { fc: 6000 },
      { number: '9' },
      { stiffness: { flexure: 0.4 } },
      { units: 'si' },
      { bandStories: 1 },
    ];
    return send(agent.patch(path), by.mutate({ version, ...by.pick<object>(changes) }));
  },
  async (agent, path, _id, by) => {
    const table = by.pick(uploaded);
    const { rows } = await rowsOf(agent, path, table);
    if (rows.length === 0) return null;
    const row = by.pick(rows);
    const column = by.pick(Object.keys(row).filter((name) => name !== 'id' && name !== 'version'));
    const edits = [{ id: row.id, column, was: row[column], to: by.mutate(row[column] ?? 1) }];
    return send(agent.patch(`${path}/${table}`), by.chance(0.15) ? by.mutate({ edits }) : { edits });
  },
  async (agent, path, _id, by) => {
    const rows = [
      { level: 'New', height: 10 },
      { level: 'Roof', case: 'WX', kind: 'wind', fx: 1, fy: 0 },
      { level: 'Roof', wall: 'A', dead: 3 },
      { name: 'c', expression: '1.2D+1.6L' },
    ];
    const body = { inserts: [{ after: null, row: by.pick<object>(rows) }] };
    return send(agent.patch(`${path}/${by.pick(editableTables)}`), by.mutate(body));
  },
  async (agent, path, _id, by) => {
    const table = by.pick(editableTables);
    const { rows } = await rowsOf(agent, path, table);
    if (rows.length === 0) return null;
    const { id, version } = by.pick(rows);
    return send(agent.patch(`${path}/${table}`), by.mutate({ deletes: [{ id, version }] }));
  },
  async (agent, path, _id, by) => {
    const table = by.pick(editableTables);
    const { rows, version } = await rowsOf(agent, path, table);
    const call = agent.put(`${path}/${table}`).set('If-Match', `"${version}"`);
    return send(call, by.chance(0.5) ? by.mutate({ rows }) : { rows });
  },
  async (agent, _path, id, by) => {
    const table = by.pick(uploaded);
    return upload(agent, id, table, by.mutateText(smallBuilding[table]), { dryRun: by.pick(['true', 'false']) });
  },
  async (agent, path, _id, by) => {
    const answer = await agent.get(`${path}/schedule`);
    if (answer.status !== 200) return answer.status === 422 ? null : answer;
    const row = by.pick((answer.body as ScheduleResource).rows);
    const cells = [
      { vertical: { curtains: 2, bar: by.pick([4, 5, 8, 18]), spacing: by.pick([1, 6, 12, 120]) } },
      { horizontal: { curtains: 2, bar: 5, spacing: 8, end: 'hook' } },
      { ends: { bar: 9, count: by.pick([2, 8, 80]), length: by.pick([12, 60, 200]) } },
      {
        ties: {
          bar: 4,
          spacing: 6,
          legsAlong: 2,
          legsAcross: 4,
          fromElevation: 0,
          toElevation: 13,
          kind: 'confinement',
        },
      },
      { laps: { web: 24, ends: 40, horizontal: 20, splice: 'coupler' } },
      { notes: ['one', 'two'] },
      { release: ['vertical', 'ends'] },
    ];
    return send(
      agent.patch(`${path}/schedule/${row.id}`),
      by.mutate({ version: row.version, ...by.pick<object>(cells) }),
    );
  },
  (agent, path, _id, by) => send(agent.post(`${path}/undo`), by.mutate({})),
  (_agent, _path, _id, by) => {
    const valid = { email: 'engineer@test.example', password: 'a password of the tests' };
    return send(server.nobody().post('/api/session'), by.mutate(valid));
  },
];

describe('500 mutated bodies on the changing routes, signed in', () => {
  it('are taken or refused in the contract’s words, never answered by a failure', async () => {
    const by = new Mutator(seededRandom(20_261_201));
    const agent = server.as('engineer');
    const failures: unknown[] = [];
    let sent = 0;
    let taken = 0;
    let id = '';
    for (let turn = 0; sent < 500; turn += 1) {
      if (turn % 60 === 0) id = await newSmallBuilding(agent);
      const path = `/api/buildings/${id}`;
      const seen = await deeds[turn % deeds.length]?.(agent, path, id, by);
      if (seen === null || seen === undefined) continue;
      sent += 1;
      if (seen.status < 300) taken += 1;
      const { error } = (seen.body ?? {}) as { error?: { code?: unknown; message?: unknown } };
      const inWords = typeof error?.code === 'string' && typeof error.message === 'string';
      if (seen.status >= 500 || (seen.status >= 400 && !inWords)) failures.push({ turn, status: seen.status, error });
      if (turn % 10 !== 9) continue;
      for (const what of ['results', 'schedule', 'schedule.xlsx']) {
        const read = await agent.get(`${path}/${what}`);
        if (read.status !== 200 && read.status !== 422) failures.push({ turn, what, status: read.status });
      }
    }
    expect(failures).toEqual([]);
    expect(taken / sent).toBeGreaterThan(0.2);
  }, 120_000);
});
