import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ScheduleResource, ScheduleResourceRow } from '#shared/contracts/schedule';

import { inlineRunner } from '../../compute/createRunner.ts';
import type { Runner } from '../../compute/Runner.ts';
import { newSmallBuilding } from '../../testing/smallBuilding.ts';
import { startTestServer, type Agent, type TestServer } from '../../testing/startTestServer.ts';

const pause = (milliseconds: number): Promise<void> =>
  new Promise((resolve) => {
    setTimeout(resolve, milliseconds);
  });

let server: TestServer;
let agents: Agent[];
let id: string;
beforeAll(async () => {
  const inline = inlineRunner();
  // as in a pool: all callers have read the row before the first of them writes
  const slow: Runner = {
    ...inline,
    run: async (task) => {
      await pause(150);
      return inline.run(task);
    },
  };
  server = await startTestServer({ runner: slow });
  agents = [server.as('engineer')];
  const second = await server.secondProcess();
  if (second !== null) agents.push(second('engineer'));
  id = await newSmallBuilding(server.as('engineer'));
});
afterAll(() => server.close());

const schedule = async (): Promise<readonly ScheduleResourceRow[]> =>
  ((await server.as('engineer').get(`/api/buildings/${id}/schedule`)).body as ScheduleResource).rows;
const patch = (nth: number, row: ScheduleResourceRow | undefined) =>
  (agents[nth % agents.length] ?? server.as('engineer'))
    .patch(`/api/buildings/${id}/schedule/${row?.id ?? ''}`)
    .send({ version: row?.version, vertical: { curtains: 2, bar: 9, spacing: 6 + nth / 4 } });

describe('parallel edits of the schedule', () => {
  it('of one row: one is taken, the others get the row as it stands', async () => {
    const row = (await schedule())[0];
    const answers = await Promise.all(Array.from({ length: 20 }, (_, nth) => patch(nth, row)));
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, ...Array.from({ length: 19 }, () => 409)]);
    const taken = answers.find((answer) => answer.status === 200);
    const refused = answers.find((answer) => answer.status === 409);
    const { current } = (refused?.body as { error: { current: ScheduleResourceRow } }).error;
    const stands = (taken?.body as { row: ScheduleResourceRow }).row;
    expect(current.vertical).toEqual(stands.vertical);
    expect(current.version).toBe((row?.version ?? 0) + 1);
  });

  it('of different rows: all are taken, and all stand', async () => {
    const rows = (await schedule()).slice(1);
    const answers = await Promise.all(rows.map((row, nth) => patch(nth, row)));
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200]);
    const after = (await schedule()).slice(1);
    expect(after.map((row) => row.vertical.spacing)).toEqual([6, 6.25, 6.5]);
    expect(after.map((row) => row.id)).toEqual(rows.map((row) => row.id));
  });
});
