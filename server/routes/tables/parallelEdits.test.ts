import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { StoredRow, TableResource } from '#shared/contracts/tables';

import { newSmallBuilding } from '../../testing/smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let agents: Agent[];
let id: string;
beforeAll(async () => {
  server = await startTestServer();
  // on PostgreSQL a second process with connections of its own; SQLite has one process
  agents = [server.as('engineer')];
  const second = await server.secondProcess();
  if (second !== null) agents.push(second('engineer'));
  id = await newSmallBuilding(server.as('engineer'));
});
afterAll(() => server.close());

const agent = (nth: number): Agent => agents[nth % agents.length] ?? server.as('engineer');
const walls = async (): Promise<readonly StoredRow<'walls'>[]> =>
  ((await agent(0).get(`/api/buildings/${id}/walls`)).body as TableResource<'walls'>).rows;
const patch = (nth: number, row: StoredRow<'walls'> | undefined, column: string, to: number) =>
  agent(nth)
    .patch(`/api/buildings/${id}/walls`)
    .send({ edits: [{ id: row?.id, column, was: row?.[column as 'thickness'] ?? null, to }] });

describe('parallel edits', () => {
  it('of one cell: one is taken', async () => {
    const row = (await walls())[0];
    const answers = await Promise.all(Array.from({ length: 20 }, (_, nth) => patch(nth, row, 'thickness', 12 + nth)));
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, ...Array.from({ length: 19 }, () => 409)]);
  });

  it('of different rows and of different cells of one row: all are taken', async () => {
    const rows = await walls();
    const byRow = await Promise.all(rows.map((row, nth) => patch(nth, row, 'opening', 0.1)));
    expect(byRow.map((answer) => answer.status)).toEqual([200, 200, 200, 200]);
    const cells = ['opening', 'fc', 'flexure_factor', 'shear_factor'];
    const row = (await walls())[1];
    const byCell = await Promise.all(cells.map((column, nth) => patch(nth, row, column, 0.5)));
    expect(byCell.map((answer) => answer.status)).toEqual([200, 200, 200, 200]);
  });

  it('number the changes without gaps or doubles', async () => {
    const seqs: { seq: number }[] = await server.database.dataSource.query(
      `SELECT "seq" FROM "change" WHERE "buildingId" = '${id}' ORDER BY "seq"`,
    );
    expect(seqs.map((row) => row.seq)).toEqual(Array.from({ length: seqs.length }, (_, nth) => nth + 1));
    expect(seqs).toHaveLength(14);
  });
});
