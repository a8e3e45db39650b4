import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { startTestServer, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
let pages: string;
beforeAll(async () => {
  pages = mkdtempSync(join(tmpdir(), '.groundward-pages-'));
  mkdirSync(join(pages, 'assets'));
  writeFileSync(join(pages, 'index.html'), '<!doctype html><title>page</title>');
  writeFileSync(join(pages, 'assets', 'main-abc.js'), 'export {};');
  server = await startTestServer({ pagesRoot: pages });
});
afterAll(async () => {
  await server.close();
  rmSync(pages, { recursive: true, force: true });
});

describe('health and headers', () => {
  it('answers without a session', async () => {
    expect((await server.nobody().get('/api/health')).body).toEqual({ ok: true });
    expect((await server.nobody().get('/api/ready')).body).toMatchObject({ ok: true, migrations: 'current' });
  });

  it('sends the policy of the architecture note and nothing that plain HTTP can not bear', async () => {
    const { headers } = await server.nobody().get('/');
    expect(headers['content-security-policy']).toBe(
      "default-src 'self';script-src 'self';worker-src 'self';style-src 'self';img-src 'self' data: blob:;" +
        "object-src 'none';frame-ancestors 'none';base-uri 'none'",
    );
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['x-content-type-options']).toBe('nosniff');
  });

  it('gives the page for every address that is not of the API, and assets for a year', async () => {
    const page = await server.nobody().get('/buildings/some/schedule');
    expect(page.status).toBe(200);
    expect(page.text).toContain('<title>page</title>');
    expect(page.headers['cache-control']).toBe('no-cache');
    const asset = await server.nobody().get('/assets/main-abc.js');
    expect(asset.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect((await server.nobody().get('/assets/main-gone.js')).status).toBe(404);
    expect((await server.nobody().get('/api/unknown')).body).toMatchObject({ error: { code: 'not-found' } });
  });

  it('refuses what is too large or unreadable before anything else', async () => {
    const large = await server
      .nobody()
      .post('/api/buildings')
      .send({ name: 'x'.repeat(17_000_000) });
    expect(large.status).toBe(413);
    expect(large.body).toMatchObject({ error: { code: 'too-large' } });
    const broken = await server.nobody().post('/api/buildings').set('Content-Type', 'application/json').send('{');
    expect(broken.status).toBe(400);
    expect((await server.nobody().get('/api/buildings/%ZZ')).status).toBe(400);
  });
});
