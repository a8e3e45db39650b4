import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { newSmallBuilding } from '../../testing/smallBuilding.ts';
import { startTestServer, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let id: string;
beforeAll(async () => {
  server = await startTestServer();
  id = await newSmallBuilding(server.as('engineer'));
});
afterAll(() => server.close());

describe('update', () => {
  it('stands under the version: another one changes nothing and says so', async () => {
    const seen = await server.gate.write(async (store) => {
      const [row] = await store.tables.rows(id, 'levels');
      if (row === undefined) throw new Error('no rows');
      const stale = await store.tables.update('levels', row.id, row.version + 1, { height: 99 });
      const fresh = await store.tables.update('levels', row.id, row.version, { height: 15 });
      const again = await store.tables.update('levels', row.id, row.version, { height: 98 });
      const [after] = await store.tables.rows(id, 'levels');
      return { stale, fresh, again, height: after?.cells.height, moved: (after?.version ?? 0) - row.version };
    });
    expect(seen).toEqual({ stale: false, fresh: true, again: false, height: 15, moved: 1 });
  });

  it('writes no column that is not of the table', async () => {
    const changed = await server.gate.write(async (store) => {
      const [row] = await store.tables.rows(id, 'walls');
      if (row === undefined) throw new Error('no rows');
      await store.tables.update('walls', row.id, row.version, { 'fc" = 1, "thickness': 5, thickness: 11 });
      return (await store.tables.rows(id, 'walls'))[0]?.cells;
    });
    expect(changed).toMatchObject({ thickness: 11, fc: null });
  });
});

describe('rowsByIds', () => {
  it('gives rows in the order of the table, many ids and unknown ones too', async () => {
    await server.gate.read(async (store) => {
      const all = await store.tables.rows(id, 'gravity');
      const ids = all.map((row) => row.id);
      const some = await store.tables.rowsByIds(id, 'gravity', [ids[4] ?? '', 'unknown', ids[1] ?? '']);
      expect(some.map((row) => row.id)).toEqual([ids[1], ids[4]]);
      const many = [...Array.from({ length: 1500 }, (_, nth) => `unknown ${nth}`), ...ids.slice(2)];
      expect((await store.tables.rowsByIds(id, 'gravity', many)).map((row) => row.id)).toEqual(ids.slice(2));
      expect(await store.tables.rowsByIds(id, 'gravity', [])).toEqual([]);
    });
  });
});
