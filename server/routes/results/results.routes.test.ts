import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ResultDocument } from '#shared/contracts/result';
import type { BuildingInput } from '#shared/engineering/input';
import { runBuilding } from '#shared/result/runBuilding';

import { inlineRunner } from '../../compute/createRunner.ts';
import type { Runner } from '../../compute/Runner.ts';
import { newBuilding, newSmallBuilding, smallBuilding, upload } from '../../testing/smallBuilding.ts';
import { startTestServer, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let runs = 0;
beforeAll(async () => {
  const inline = inlineRunner();
  const counting: Runner = {
    ...inline,
    run: (task) => {
      runs += 1;
      return inline.run(task);
    },
  };
  server = await startTestServer({ runner: counting });
});
afterAll(() => server.close());

const results = (id: string) => server.as('engineer').get(`/api/buildings/${id}/results`);

describe('results', () => {
  it('refuses callers without session, of another office, and drafters', async () => {
    const id = await newSmallBuilding(server.as('engineer'));
    const path = `/api/buildings/${id}/results`;
    expect((await server.nobody().get(path)).status).toBe(401);
    expect((await server.as('stranger').get(path)).status).toBe(404);
    expect((await server.as('drafter').get(path)).status).toBe(403);
  });

  it('gives the document of the stored building, computed once', async () => {
    const id = await newSmallBuilding(server.as('engineer'), { ...smallBuilding.settings, fc: 4100 });
    const before = runs;
    const answer = await results(id);
    expect(answer.status).toBe(200);
    const document = answer.body as ResultDocument;
    // WX: 24 kip at the roof and 26 at L2, on two equal walls along y and two along x: those along x share it, 25 each at the base
    const shear = document.lateral.filter((row) => row.case === 'WX' && row.level === 'L2' && row.wall === 'C');
    expect(shear.map((row) => row.basis)).toEqual(['rigid', 'compatible']);
    for (const row of shear) expect(row.shear).toBeCloseTo(25, 9);
    // 12 kip over 11 + 13 ft and 13 kip over 13 ft: 457 kip-ft
    for (const row of shear) expect(row.moment).toBeCloseTo(457, 7);
    await Promise.all([results(id), results(id), server.as('checker').get(`/api/buildings/${id}/schedule`)]);
    expect(runs).toBe(before + 1);
  });

  it('says nothing new to whom holds the tag, and something new after an edit', async () => {
    const id = await newSmallBuilding(server.as('engineer'), { ...smallBuilding.settings, fc: 4200 });
    const tag = String((await results(id)).headers.etag);
    expect((await results(id).set('If-None-Match', tag)).status).toBe(304);
    await upload(server.as('engineer'), id, 'forces', smallBuilding.forces.replace(',24,0', ',25,0')).expect(200);
    const moved = await results(id).set('If-None-Match', tag);
    expect(moved.status).toBe(200);
    expect(moved.headers.etag).not.toBe(tag);
    await server.as('engineer').post(`/api/buildings/${id}/undo`).send({}).expect(200);
    expect((await results(id).set('If-None-Match', tag)).status).toBe(304);
  });

  it('reads without gzip too', async () => {
    const id = await newSmallBuilding(server.as('engineer'));
    const plain = await results(id).set('Accept-Encoding', 'identity');
    expect(plain.headers['content-encoding']).toBeUndefined();
    expect((plain.body as ResultDocument).units).toBe('us');
  });

  it('says what an empty building lacks', async () => {
    const id = await newBuilding(server.as('engineer'));
    const answer = await results(id);
    expect(answer.status).toBe(422);
    const { error } = answer.body as { error: { code: string; problems: { table: string; row: null }[] } };
    expect(error.code).toBe('does-not-compute');
    expect(error.problems.map((problem) => problem.table)).toEqual(['levels', 'walls', 'forces']);
  });

  it('is the same as the chain run on what was typed', async () => {
    const id = await newSmallBuilding(server.as('engineer'));
    const seen: { input: BuildingInput | null } = { input: null };
    await server.gate.read(async (store) => {
      const { settings } = await store.buildings.get(id);
      const cells = async (table: 'levels' | 'walls' | 'forces' | 'gravity'): Promise<unknown> =>
        (await store.tables.rows(id, table)).map((row) => row.cells);
      seen.input = {
        settings,
        tables: {
          levels: await cells('levels'),
          walls: await cells('walls'),
          forces: await cells('forces'),
          gravity: await cells('gravity'),
          combinations: [],
          overrides: [],
        },
      } as BuildingInput;
    });
    if (seen.input === null) throw new Error('nothing was read');
    const outcome = runBuilding(seen.input);
    if (!outcome.ok) throw new Error('the building does not compute');
    const { timing: _here, ...here } = outcome.document;
    const { timing: _there, ...there } = (await results(id)).body as ResultDocument;
    expect(there).toEqual(JSON.parse(JSON.stringify(here)));
  });
});
