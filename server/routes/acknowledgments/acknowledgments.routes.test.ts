import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import type { AcknowledgmentList, AcknowledgmentRow } from '#shared/contracts/acknowledgments';
import type { ResultDocument } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';
import type { UndoAnswer } from '#shared/contracts/undo';

import { newBuilding, smallBuilding, upload } from '../../testing/smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let engineer: Agent;
let id: string;
beforeAll(async () => {
  server = await startTestServer();
  engineer = server.as('engineer');
});
afterAll(() => server.close());
beforeEach(async () => {
  id = await newBuilding(engineer);
  const walls = smallBuilding.walls
    .replace('to_level\n', 'to_level,opening\n')
    .replace('L2,Roof\nB', 'L2,Roof,0.15\nB')
    .replace(/L2,Roof\n/g, 'L2,Roof,\n');
  for (const table of ['levels', 'forces', 'gravity'] as const) {
    await upload(engineer, id, table, smallBuilding[table]).expect(200);
  }
  await upload(engineer, id, 'walls', walls).expect(200);
});

const path = (): string => `/api/buildings/${id}/acknowledgments`;
const opening = { code: 'opening-solid', level: 'L2', wall: 'A', reason: 'two doors of 3 ft, piers designed apart' };
const post = (body: object, agent: Agent = engineer) => agent.post(path()).send(body);
const list = async (agent: Agent = engineer): Promise<AcknowledgmentList> =>
  (await agent.get(path()).expect(200)).body as AcknowledgmentList;
const result = async (): Promise<ResultDocument> =>
  (await engineer.get(`/api/buildings/${id}/results`).expect(200)).body as ResultDocument;
const stateOf = async (wall: string): Promise<readonly string[]> =>
  (await result()).schedule.filter((row) => row.wall === wall).map((row) => row.state);
const changeWall = async (column: string, was: number | null, to: number, wall = 'A'): Promise<void> => {
  const { rows } = (await engineer.get(`/api/buildings/${id}/walls`)).body as TableResource<'walls'>;
  const row = rows.find((one) => one.wall === wall);
  await engineer
    .patch(`/api/buildings/${id}/walls`)
    .send({ edits: [{ id: row?.id, column, was, to }] })
    .expect(200);
};

describe('acknowledgments', () => {
  it('are refused to callers without session, of another office, to drafters, and to readers who settle', async () => {
    expect((await server.nobody().get(path())).status).toBe(401);
    expect((await server.as('stranger').get(path())).status).toBe(404);
    expect((await server.as('drafter').get(path())).status).toBe(403);
    expect((await post(opening, server.nobody())).status).toBe(401);
    expect((await post(opening, server.as('stranger'))).status).toBe(404);
    expect((await post(opening, server.as('checker'))).status).toBe(403);
    expect((await post(opening, server.as('admin'))).status).toBe(403);
    expect((await list(server.as('checker'))).rows).toEqual([]);
  });

  it('need a code and a reason, and know no other keys', async () => {
    for (const body of [{}, { code: 'opening-solid' }, { ...opening, reason: '  ' }, { ...opening, by: 'me' }]) {
      const answer = await post(body);
      expect(answer.status).toBe(422);
      expect(answer.body).toMatchObject({ error: { code: 'invalid' } });
    }
  });

  it('settle a warning, so that its rows read ok, and say who and why', async () => {
    expect(new Set(await stateOf('A'))).toEqual(new Set(['not settled']));
    const answer = await post(opening);
    expect(answer.status).toBe(201);
    const row = answer.body as AcknowledgmentRow;
    expect(row).toMatchObject({ code: 'opening-solid', level: 'L2', wall: 'A', reason: opening.reason, stands: true });
    expect(new Set(await stateOf('A'))).toEqual(new Set(['ok']));
    const { warnings } = await result();
    expect(warnings.filter((warning) => warning.settled).map(({ code }) => code)).toEqual(['opening-solid']);
    expect((await list()).rows).toEqual([row]);
  });

  it('are refused for warnings that do not stand and for settled ones', async () => {
    const elsewhere = await post({ ...opening, wall: 'B' });
    expect(elsewhere.status).toBe(409);
    expect(elsewhere.body).toMatchObject({
      error: { code: 'no-such-warning', current: [{ code: 'opening-solid', wall: 'A' }] },
    });
    await post(opening).expect(201);
    const again = await post({ ...opening, reason: 'another' });
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ error: { code: 'already-settled' } });
    expect((await list()).rows).toHaveLength(1);
  });

  it('need a building that computes', async () => {
    await post(opening).expect(201);
    await upload(engineer, id, 'levels', smallBuilding.levels.replace('\nL2', '\nSecond')).expect(200);
    const answer = await post({ code: 'collectors', reason: 'designed with the slab' });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { code: 'does-not-compute' } });
    expect((await list()).rows.map(({ stands }) => stands)).toEqual([null]);
  });

  it('lapse when the facts move, and come back with them', async () => {
    await post(opening).expect(201);
    await changeWall('thickness', 10, 11, 'B');
    expect((await list()).rows.map(({ stands }) => stands)).toEqual([true]);
    await changeWall('opening', 0.15, 0.2);
    expect((await list()).rows.map(({ stands }) => stands)).toEqual([false]);
    expect(new Set(await stateOf('A'))).toEqual(new Set(['not settled']));
    await changeWall('opening', 0.2, 0.15);
    expect(new Set(await stateOf('A'))).toEqual(new Set(['ok']));
  });

  it('replace one that has lapsed, and undo brings that one back', async () => {
    const first = (await post(opening)).body as AcknowledgmentRow;
    await changeWall('opening', 0.15, 0.2);
    const second = (await post({ ...opening, reason: 'three doors now' })).body as AcknowledgmentRow;
    expect((await list()).rows.map((row) => [row.id, row.stands])).toEqual([[second.id, true]]);
    const undone = (await engineer.post(`/api/buildings/${id}/undo`).send({}).expect(200)).body as UndoAnswer;
    expect(undone.targets).toEqual(['acknowledgments']);
    expect((await list()).rows.map((row) => [row.id, row.reason, row.stands])).toEqual([
      [first.id, opening.reason, false],
    ]);
    await engineer.post(`/api/buildings/${id}/undo`).send({}).expect(200);
    await engineer.post(`/api/buildings/${id}/undo`).send({}).expect(200);
    expect((await list()).rows).toEqual([]);
    expect(new Set(await stateOf('A'))).toEqual(new Set(['not settled']));
  });

  it('that a colleague has replaced can not be undone', async () => {
    await post(opening).expect(201);
    await changeWall('opening', 0.15, 0.2);
    await engineer.post(`/api/buildings/${id}/undo`).send({}).expect(200);
    await server.as('colleague').patch(`/api/buildings/${id}`).send({ version: 1, number: '9' }).expect(200);
    const { rows } = (await engineer.get(`/api/buildings/${id}/walls`)).body as TableResource<'walls'>;
    const wall = rows.find((one) => one.wall === 'A');
    const colleague = server.as('colleague');
    const edit = { id: wall?.id, column: 'opening', was: 0.15, to: 0.3 };
    await colleague
      .patch(`/api/buildings/${id}/walls`)
      .send({ edits: [edit] })
      .expect(200);
    await post({ ...opening, reason: 'by the colleague' }, colleague).expect(201);
    const refused = await engineer.post(`/api/buildings/${id}/undo`).send({});
    expect(refused.status).toBe(409);
    expect(refused.body).toMatchObject({ error: { code: 'moved-on', current: [{ table: 'acknowledgments' }] } });
  });
});
