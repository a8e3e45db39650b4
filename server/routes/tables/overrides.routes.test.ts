import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import type { BuildingResource } from '#shared/contracts/buildings';
import type { ResultDocument } from '#shared/contracts/result';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { TableResource, UploadAnswer } from '#shared/contracts/tables';

import { newSmallBuilding, upload } from '../../testing/smallBuilding.ts';
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

const path = (table: string): string => `/api/buildings/${id}/${table}`;
const get = async <T extends EditableTable>(table: T): Promise<TableResource<T>> =>
  (await engineer.get(path(table)).expect(200)).body as TableResource<T>;
const text =
  'kind,level,wall,case,shear,axial,share,reason\n' +
  'transfer,L2,A,WY,7,30,,hangs on the ring beam\nshare,L2,C,WX,,,0.6,stiffer base\n';
const take = () => upload(engineer, id, 'overrides', text).expect(200);
const lateral = async (wall: string): Promise<number> => {
  const { body } = await engineer.get(path('results')).expect(200);
  const { lateral: rows } = body as ResultDocument;
  return (
    rows.find(
      (row) =>
        row.basis === 'rigid' && row.level === 'L2' && row.wall === wall && row.case === (wall === 'A' ? 'WY' : 'WX'),
    )?.shear ?? NaN
  );
};

describe('overrides', () => {
  it('are refused to callers without session, of another office, and to readers who edit', async () => {
    expect((await server.nobody().get(path('overrides'))).status).toBe(401);
    expect((await server.as('stranger').get(path('overrides'))).status).toBe(404);
    expect((await server.as('drafter').get(path('overrides'))).status).toBe(403);
    expect((await server.as('checker').patch(path('overrides')).send({})).status).toBe(403);
  });

  it('come in as a file and move the result by what they say', async () => {
    // two equal walls each way, load in the middle: half of 64 and half of 50 kip
    expect(await lateral('A')).toBeCloseTo(32, 9);
    expect(await lateral('C')).toBeCloseTo(25, 9);
    await take();
    expect(await lateral('A')).toBeCloseTo(39, 9);
    expect(await lateral('C')).toBeCloseTo(30, 9);
  });

  it('say in a dry run what would change, matched by kind, level, wall and case', async () => {
    await take();
    const answer = await upload(engineer, id, 'overrides', text.replace('0.6', '0.7'), { dryRun: 'true' }).expect(200);
    expect((answer.body as UploadAnswer).changes).toEqual({ added: 0, removed: 0, changed: 1, same: 1 });
    expect((await get('overrides')).rows.map((row) => row.share)).toEqual([null, 0.6]);
  });

  it('are refused with the cell to blame, by file, PUT and PATCH', async () => {
    const file = await upload(engineer, id, 'overrides', text.replace(',C,', ',Q,'));
    expect(file.body).toMatchObject({ error: { problems: [{ row: 3, column: 'wall', table: 'overrides' }] } });
    const put = await engineer
      .put(path('overrides'))
      .set('If-Match', '"1"')
      .send({ rows: [{ kind: 'share', level: 'L2', wall: 'C', reason: 'stiffer base' }] });
    expect(put.body).toMatchObject({ error: { problems: [{ row: 1, column: 'share' }] } });
    const patch = await engineer
      .patch(path('overrides'))
      .send({ inserts: [{ after: null, row: { kind: 'share', level: 'L2', wall: 'C', share: 0.5, reason: ' ' } }] });
    expect(patch.body).toMatchObject({ error: { problems: [{ column: 'reason' }] } });
  });

  it('follow renames of levels, walls and cases, and come back with undo', async () => {
    await take();
    const rename = async (table: EditableTable, column: string, was: string, to: string): Promise<void> => {
      const rows = (await get(table)).rows as unknown as readonly Record<string, unknown>[];
      const edits = rows.filter((row) => row[column] === was).map((row) => ({ id: row.id, column, was, to }));
      const answer = await engineer.patch(path(table)).send({ edits }).expect(200);
      expect((answer.body as { alsoChanged: string[] }).alsoChanged).toContain('overrides');
    };
    const names = async () => (await get('overrides')).rows.map((row) => [row.level, row.wall, row.case]);
    await rename('levels', 'level', 'L2', 'Second');
    await rename('walls', 'wall', 'A', 'A1');
    await rename('forces', 'case', 'WX', 'W90');
    expect(await names()).toEqual([
      ['Second', 'A1', 'WY'],
      ['Second', 'C', 'W90'],
    ]);
    for (let step = 0; step < 3; step += 1) await engineer.post(path('undo')).send({}).expect(200);
    expect(await names()).toEqual([
      ['L2', 'A', 'WY'],
      ['L2', 'C', 'WX'],
    ]);
    await engineer.post(path('undo')).send({}).expect(200);
    expect((await get('overrides')).rows).toEqual([]);
  });

  it('let a base spring follow the name of its wall', async () => {
    const { version } = (await engineer.get(`/api/buildings/${id}`)).body as BuildingResource;
    const springs = { version, baseSprings: { A: 4e6 } };
    await engineer.patch(`/api/buildings/${id}`).send(springs).expect(200);
    const [row] = (await get('walls')).rows;
    const edit = { id: row?.id, column: 'wall', was: 'A', to: 'North' };
    await engineer
      .patch(path('walls'))
      .send({ edits: [edit] })
      .expect(200);
    const { baseSprings } = (await engineer.get(`/api/buildings/${id}`)).body as BuildingResource;
    expect(baseSprings).toEqual({ North: 4e6 });
  });

  it('story shears with a level left out are refused as they come in', async () => {
    const { version } = (await engineer.get(`/api/buildings/${id}`)).body as BuildingResource;
    await engineer.patch(`/api/buildings/${id}`).send({ version, forcesAre: 'story-shear' }).expect(200);
    const answer = await upload(engineer, id, 'forces', 'level,case,kind,fx,fy\nRoof,WX,wind,24,0\n');
    expect(answer.body).toMatchObject({ error: { problems: [{ row: 2, column: 'level', table: 'forces' }] } });
  });
});
