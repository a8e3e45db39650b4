import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { settingsDefaults } from '#shared/contracts/settingsDefaults';

import { inlineRunner, pooledRunner } from './createRunner.ts';
import type { RunTask } from './Runner.ts';

let folder: string;
let file: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'groundward-pool-'));
  file = join(folder, 'worker.mjs');
  writeFileSync(
    file,
    `export default async (task) => {
       await new Promise((resolve) => setTimeout(resolve, 100));
       return { ok: false, problems: [{ table: 'walls', row: null, column: null, message: task.input.settings.name }] };
     };`,
  );
});
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

const task: RunTask = {
  kind: 'run',
  input: {
    settings: { ...settingsDefaults('us'), name: 'In the thread' },
    tables: { levels: [], walls: [], forces: [], gravity: [], combinations: [], overrides: [] },
  },
  pinned: [],
};

const limits = { threads: 1, longestQueue: 8, longestRunSeconds: 60, mostMegabytes: 256 };

describe('pooledRunner', () => {
  it.each([
    ['takes too long', 'for (;;);', { longestRunSeconds: 1 }],
    ['takes too much memory', 'const all = []; for (;;) all.push(Array.from({ length: 1000 }, Math.random));', {}],
  ])('stops a run that %s, and computes the next', async (_what, deed, own) => {
    const other = join(folder, `stuck-${Object.keys(own).length}.mjs`);
    writeFileSync(
      other,
      `export default (task) => { if (task.pinned.length > 0) return { ok: false, problems: [] }; ${deed} };`,
    );
    const runner = pooledRunner(other, { ...limits, mostMegabytes: 64, ...own });
    await expect(runner.run(task)).rejects.toMatchObject({ status: 422, code: 'does-not-compute' });
    const pinned = [{}] as unknown as RunTask['pinned'];
    expect(await runner.run({ ...task, pinned })).toMatchObject({ ok: false });
    await runner.close();
  });

  it('computes in a thread, and turns away what would wait behind too many', async () => {
    const runner = pooledRunner(file, { ...limits, longestQueue: 2 });
    const all = await Promise.allSettled(Array.from({ length: 6 }, () => runner.run(task)));
    const done = all.filter((one) => one.status === 'fulfilled');
    const refused = all.filter((one) => one.status === 'rejected');
    expect(done.length).toBeGreaterThanOrEqual(2);
    expect(done[0]?.value).toMatchObject({ problems: [{ message: 'In the thread' }] });
    expect(refused.length).toBeGreaterThanOrEqual(3);
    expect(refused[0]?.reason).toMatchObject({ status: 503, code: 'busy', details: { retryAfterSeconds: 2 } });
    expect(await runner.run(task)).toMatchObject({ ok: false });
    await runner.close();
  });
});

describe('inlineRunner', () => {
  it('gives the problems of a building that does not compute', async () => {
    const answer = await inlineRunner().run(task);
    expect(answer).toMatchObject({
      ok: false,
      problems: [{ table: 'levels' }, { table: 'walls' }, { table: 'forces' }],
    });
  });
});
