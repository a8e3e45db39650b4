import ExcelJS from 'exceljs';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import type { SchedulePatchAnswer, ScheduleResource, ScheduleResourceRow } from '#shared/contracts/schedule';
import type { TableResource } from '#shared/contracts/tables';

import { newSmallBuilding, smallBuilding, upload } from '../../testing/smallBuilding.ts';
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
  id = await newSmallBuilding(engineer);
});

const path = (rest: string): string => `/api/buildings/${id}/${rest}`;
const schedule = async (): Promise<ScheduleResource> =>
  (await engineer.get(path('schedule')).expect(200)).body as ScheduleResource;
const rowOf = async (wall: string): Promise<ScheduleResourceRow> => {
  const row = (await schedule()).rows.find((one) => one.wall === wall);
  if (row === undefined) throw new Error(`no row of wall ${wall}`);
  return row;
};
const patch = (rowId: string, body: object, agent: Agent = engineer) =>
  agent.patch(path(`schedule/${rowId}`)).send(body);
const edit = async (rowId: string, body: object): Promise<SchedulePatchAnswer> =>
  (await patch(rowId, body).expect(200)).body as SchedulePatchAnswer;

/** Far more steel than needed, and far less than the least allowed (0.0012 t = 0.144 in2/ft; one No. 3 at 48 in gives 0.0275). */
const heavy = { curtains: 2, bar: 9, spacing: 6 } as const;
const light = { curtains: 1, bar: 3, spacing: 48 } as const;

describe('schedule', () => {
  it('refuses callers without session, of another office, and readers', async () => {
    const row = await rowOf('A');
    const body = { version: row.version, vertical: heavy };
    expect((await patch(row.id, body, server.nobody())).status).toBe(401);
    expect((await patch(row.id, body, server.as('stranger'))).status).toBe(404);
    expect((await patch(row.id, body, server.as('checker'))).status).toBe(403);
    expect((await patch('unknown', body)).status).toBe(404);
    expect((await server.as('drafter').get(path('schedule'))).status).toBe(403);
  });

  it('lists a row a wall and band, with what automatic choice says beside what stands', async () => {
    const { rows, orphans } = await schedule();
    expect(rows.map((row) => [row.wall, row.from, row.to, row.version])).toEqual([
      ['A', 'L2', 'Roof', 1],
      ['B', 'L2', 'Roof', 1],
      ['C', 'L2', 'Roof', 1],
      ['D', 'L2', 'Roof', 1],
    ]);
    for (const row of rows) {
      expect(row.overwritten).toEqual([]);
      expect(row.automatic.vertical).toEqual(row.vertical);
      expect(row.ok).toBe(true);
    }
    expect(orphans).toEqual([]);
    expect((await schedule()).rows.map((row) => row.id)).toEqual(rows.map((row) => row.id));
  });

  it('overwrites a cell, shows the automatic value beside it, and releases it again', async () => {
    const before = await rowOf('A');
    const { row, alsoChanged, seq } = await edit(before.id, {
      version: before.version,
      vertical: heavy,
      reason: 'bars on site',
    });
    expect(row).toMatchObject({
      id: before.id,
      version: before.version + 1,
      vertical: heavy,
      overwritten: ['vertical'],
      reason: 'bars on site',
      ok: true,
    });
    expect(row?.automatic.vertical).toEqual(before.vertical);
    expect(alsoChanged).toEqual([]);
    expect(seq).toBe(6);
    const released = await edit(before.id, { version: before.version + 1, release: ['vertical'] });
    expect(released.row).toMatchObject({ vertical: before.vertical, overwritten: [], reason: null });
  });

  it('keeps a row that fails, and never repairs it', async () => {
    const before = await rowOf('C');
    const { row } = await edit(before.id, { version: before.version, vertical: light });
    expect(row).toMatchObject({ vertical: light, ok: false, state: 'over' });
    expect(await rowOf('C')).toMatchObject({ vertical: light, ok: false, state: 'over' });
    expect((await rowOf('A')).ok).toBe(true);
  });

  it('answers 409 with the row as it stands to an old version', async () => {
    const before = await rowOf('A');
    await edit(before.id, { version: before.version, vertical: heavy });
    const old = await patch(before.id, { version: before.version, vertical: light }, server.as('colleague'));
    expect(old.status).toBe(409);
    expect(old.body).toMatchObject({
      error: { code: 'version', current: { id: before.id, version: before.version + 1, vertical: heavy } },
    });
  });

  it('lets one of twenty edits of one row through, and all edits of two rows', async () => {
    const [first, second, third] = (await schedule()).rows;
    const body = (row: ScheduleResourceRow | undefined, nth: number): object => ({
      version: row?.version,
      vertical: { ...heavy, spacing: 5 + nth / 4 },
    });
    const same = await Promise.all(Array.from({ length: 20 }, (_, nth) => patch(first?.id ?? '', body(first, nth))));
    expect(same.map((answer) => answer.status).sort()).toEqual([200, ...Array.from({ length: 19 }, () => 409)]);
    const two = await Promise.all([second, third].map((row, nth) => patch(row?.id ?? '', body(row, nth))));
    expect(two.map((answer) => answer.status)).toEqual([200, 200]);
  });

  it('refuses cells that are inputs, bars that do not exist, and cells that do not fit', async () => {
    const row = await rowOf('A');
    for (const cell of [{ thickness: 12 }, { fc: 6000 }, { from: 'L2' }, { to: 'Roof' }]) {
      const answer = await patch(row.id, { version: row.version, ...cell });
      expect(answer.status).toBe(422);
      expect(answer.body).toMatchObject({ error: { code: 'input-cell', problems: [{ table: 'walls' }] } });
    }
    const bar = await patch(row.id, { version: row.version, vertical: { ...heavy, bar: 16 } });
    expect(bar.body).toMatchObject({ error: { code: 'invalid', problems: [{ column: 'vertical.bar' }] } });
    const text = await patch(row.id, { version: row.version, vertical: '#5@12 EF' });
    expect(text.body).toMatchObject({ error: { code: 'invalid', problems: [{ column: 'vertical' }] } });
    expect((await patch(row.id, { vertical: heavy })).status).toBe(422);
    expect((await rowOf('A')).version).toBe(row.version);
  });

  it('undoes an edit, with its reason', async () => {
    const before = await rowOf('A');
    await edit(before.id, { version: before.version, vertical: heavy, reason: 'first' });
    await edit(before.id, { version: before.version + 1, ends: { bar: 6, count: 4, length: 16 }, reason: 'second' });
    await engineer.post(path('undo')).send({}).expect(200);
    expect(await rowOf('A')).toMatchObject({ overwritten: ['vertical'], vertical: heavy, reason: 'first' });
    await engineer.post(path('undo')).send({}).expect(200);
    expect(await rowOf('A')).toMatchObject({ overwritten: [], vertical: before.vertical, reason: null });
  });

  it('has a tag that moves with an edit', async () => {
    const tag = String((await engineer.get(path('schedule'))).headers.etag);
    expect((await engineer.get(path('schedule')).set('If-None-Match', tag)).status).toBe(304);
    const row = await rowOf('A');
    await edit(row.id, { version: row.version, vertical: heavy });
    expect((await engineer.get(path('schedule')).set('If-None-Match', tag)).status).toBe(200);
  });
});

describe('overwrites', () => {
  it('survive larger forces, an inserted level, shorter bands and a restart', async () => {
    const before = await rowOf('A');
    await edit(before.id, { version: before.version, vertical: light, reason: 'as built' });
    const stands = async (expected: object): Promise<void> => {
      const row = (await schedule()).rows.find((one) => one.id === before.id);
      expect(row).toMatchObject({
        wall: 'A',
        vertical: light,
        overwritten: ['vertical'],
        ok: false,
        reason: 'as built',
        ...expected,
      });
      expect(row?.automatic.vertical).not.toEqual(light);
    };
    const larger = smallBuilding.forces.replace(
      /wind,(\d+),(\d+)/g,
      (_all, x: string, y: string) => `wind,${Number(x) * 1.5},${Number(y) * 1.5}`,
    );
    await upload(engineer, id, 'forces', larger).expect(200);
    await stands({ from: 'L2', to: 'Roof' });

    const levels = (await engineer.get(path('levels'))).body as TableResource<'levels'>;
    await engineer
      .patch(path('levels'))
      .send({
        inserts: [
          {
            after: levels.rows[0]?.id,
            row: { level: 'Mezzanine', height: 9, x: 30, y: 20, extent_x: 60, extent_y: 40 },
          },
        ],
      })
      .expect(200);
    await stands({ from: 'L2', to: 'Roof' });

    await engineer.patch(`/api/buildings/${id}`).send({ version: 1, bandStories: 2 }).expect(200);
    await stands({ from: 'L2', to: 'Roof' });
    const others = (await schedule()).rows.filter((row) => row.wall === 'B');
    expect(others.map((row) => [row.from, row.to])).toEqual([
      ['Roof', 'Roof'],
      ['L2', 'Mezzanine'],
    ]);

    const again = await server.restart();
    const row = ((await again('engineer').get(path('schedule'))).body as ScheduleResource).rows.find(
      (one) => one.id === before.id,
    );
    expect(row).toMatchObject({ vertical: light, overwritten: ['vertical'], ok: false });
  });

  it('follow a renamed level and a renamed wall', async () => {
    const before = await rowOf('A');
    await edit(before.id, { version: before.version, vertical: heavy });
    const levels = (await engineer.get(path('levels'))).body as TableResource<'levels'>;
    const walls = (await engineer.get(path('walls'))).body as TableResource<'walls'>;
    await engineer
      .patch(path('levels'))
      .send({ edits: [{ id: levels.rows[0]?.id, column: 'level', was: 'Roof', to: 'Attic' }] })
      .expect(200);
    await engineer
      .patch(path('walls'))
      .send({ edits: [{ id: walls.rows[0]?.id, column: 'wall', was: 'A', to: 'North' }] })
      .expect(200);
    const row = (await schedule()).rows.find((one) => one.id === before.id);
    expect(row).toMatchObject({ wall: 'North', to: 'Attic', vertical: heavy, overwritten: ['vertical'] });
  });

  it('without stories stay as a notice until they are released', async () => {
    const before = await rowOf('D');
    await edit(before.id, { version: before.version, vertical: heavy });
    const walls = smallBuilding.walls.replace('\nD,20,40,40,40', '\nE,20,40,40,40');
    await upload(engineer, id, 'gravity', smallBuilding.gravity.replaceAll(',D,', ',E,')).expect(422);
    await upload(engineer, id, 'walls', walls).expect(200);
    await upload(engineer, id, 'gravity', smallBuilding.gravity.replaceAll(',D,', ',E,')).expect(200);
    const { rows, orphans } = await schedule();
    expect(rows.map((row) => row.wall)).toEqual(['A', 'B', 'C', 'E']);
    expect(orphans).toMatchObject([{ id: before.id, wall: 'D', own: { vertical: heavy } }]);
    const released = await edit(before.id, { version: orphans[0]?.version, release: ['vertical'] });
    expect(released.row).toBeNull();
    expect((await schedule()).orphans).toEqual([]);
  });
});

describe('schedule.xlsx', () => {
  it('is a workbook of what stands now', async () => {
    const row = await rowOf('A');
    await edit(row.id, { version: row.version, vertical: heavy });
    const answer = await engineer
      .get(path('schedule.xlsx'))
      .buffer(true)
      .parse((response, done) => {
        const parts: Buffer[] = [];
        response.on('data', (part: Buffer) => parts.push(part));
        response.on('end', () => done(null, Buffer.concat(parts)));
      });
    expect(answer.status).toBe(200);
    expect(answer.headers['content-disposition']).toContain('Two-stories-wall-schedule.xlsx');
    const workbook = new ExcelJS.Workbook();
    await workbook.xlsx.load(answer.body as ArrayBuffer);
    const texts: string[] = [];
    workbook.getWorksheet('Wall schedule')?.eachRow((line) => line.eachCell((cell) => texts.push(cell.text)));
    expect(texts).toContain('#9@6 EF');
    const tag = String(answer.headers.etag);
    expect((await engineer.get(path('schedule.xlsx')).set('If-None-Match', tag)).status).toBe(304);
  });
});
