import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'groundward-start-'));
});
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

interface Started {
  readonly process: ChildProcess;
  readonly output: () => string;
}

function start(variables: Readonly<Record<string, string>>): Started {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    cwd: resolve(import.meta.dirname, '..'),
    env: { PATH: process.env.PATH ?? '', DATABASE_URL: `sqlite:${join(folder, 'start.sqlite')}`, ...variables },
  });
  let text = '';
  child.stdout.on('data', (part: Buffer) => (text += part.toString('utf8')));
  child.stderr.on('data', (part: Buffer) => (text += part.toString('utf8')));
  return { process: child, output: () => text };
}

async function portOf({ process: child, output }: Started): Promise<number> {
  for (;;) {
    const found = /"port":(\d+),.*"listening"/.exec(output());
    if (found?.[1] !== undefined) return Number(found[1]);
    if (child.exitCode !== null) throw new Error(output());
    await once(child.stdout ?? child, 'data');
  }
}

describe('the server process', () => {
  it('refuses to start without a session secret', async () => {
    const started = start({});
    const [code] = (await once(started.process, 'exit')) as [number];
    expect(code).toBe(1);
    expect(started.output()).toContain('SESSION_SECRET');
  });

  it('migrates, seeds the demo once, serves, and stops at SIGTERM', async () => {
    const variables = { SESSION_SECRET: 'a secret of this test', DEMO: '1', PORT: '0' };
    const first = start(variables);
    const base = `http://127.0.0.1:${await portOf(first)}/api`;
    const sign = await fetch(`${base}/session`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'X-Requested-With': 'groundward' },
      body: JSON.stringify({ email: 'engineer@demo.example', password: 'groundward-demo' }),
    });
    expect(sign.status).toBe(200);
    const cookie = (sign.headers.get('set-cookie') ?? '').split(';')[0] ?? '';
    const list = (await (await fetch(`${base}/buildings`, { headers: { cookie } })).json()) as {
      rows: { levels: number }[];
    };
    expect(list.rows).toHaveLength(1);
    expect(list.rows[0]?.levels).toBeGreaterThanOrEqual(14);
    first.process.kill('SIGTERM');
    expect(await once(first.process, 'exit')).toEqual([0, null]);
    expect(first.output()).not.toContain('groundward-demo');

    const second = start(variables);
    const again = await fetch(`http://127.0.0.1:${await portOf(second)}/api/buildings`, { headers: { cookie } });
    expect(((await again.json()) as { rows: unknown[] }).rows).toHaveLength(1);
    second.process.kill('SIGTERM');
    expect(await once(second.process, 'exit')).toEqual([0, null]);
  }, 120_000);
});
