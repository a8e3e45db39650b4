import { mkdtempSync, readdirSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { settingsDefaults } from '#shared/contracts/settingsDefaults';
import type { BuildingInput } from '#shared/engineering/input';

import { Computing } from './Computing.ts';
import { contentKey } from './contentKey.ts';
import { Lru } from './Lru.ts';
import { ResultFiles } from './ResultFiles.ts';
import type { Computed, RunAnswer, Runner } from './Runner.ts';

const input: BuildingInput = {
  settings: { ...settingsDefaults('us'), name: 'B' },
  tables: { levels: [], walls: [], forces: [], gravity: [], combinations: [], overrides: [] },
};

let folder: string;
let runs: number;
let answer: RunAnswer;
const runner: Runner = {
  run: () => {
    runs += 1;
    return Promise.resolve(answer);
  },
  workbook: () => Promise.resolve(new Uint8Array()),
  close: () => Promise.resolve(),
};
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'groundward-cache-'));
  runs = 0;
  answer = { ok: true, result: new Uint8Array([1, 2, 3]), schedule: [], rows: [], warnings: [] };
});
afterEach(() => {
  rmSync(folder, { recursive: true, force: true });
});

describe('Computing', () => {
  it('runs once a key, for callers at the same time and later ones', async () => {
    const computing = new Computing(runner, null);
    await Promise.all([computing.compute('k', input, []), computing.compute('k', input, [])]);
    await computing.compute('k', input, []);
    expect(runs).toBe(1);
    await computing.compute('other', input, []);
    expect(runs).toBe(2);
  });

  it('finds in files what another process computed, and computes again when they are gone or broken', async () => {
    await new Computing(runner, new ResultFiles(folder)).compute('k', input, []);
    expect(readdirSync(folder).sort()).toEqual(['k.result.json.gz', 'k.schedule.json.gz']);
    const found = await new Computing(runner, new ResultFiles(folder)).compute('k', input, []);
    expect(found).toEqual(answer);
    expect(runs).toBe(1);
    writeFileSync(join(folder, 'k.schedule.json.gz'), 'no gzip');
    await new Computing(runner, new ResultFiles(folder)).compute('k', input, []);
    expect(runs).toBe(2);
    rmSync(folder, { recursive: true });
    await new Computing(runner, new ResultFiles(folder)).compute('k', input, []);
    expect(runs).toBe(3);
  });

  it('lets the oldest files go when the folder holds more than it may', async () => {
    for (const [nth, key] of ['old', 'older'].entries()) {
      const file = join(folder, `${key}.result.json.gz`);
      writeFileSync(file, Buffer.alloc(1000));
      utimesSync(file, 1000 - nth, 1000 - nth);
    }
    await new ResultFiles(folder, 1500).write('new', answer as Computed);
    expect(readdirSync(folder).sort()).toEqual(['new.result.json.gz', 'new.schedule.json.gz', 'old.result.json.gz']);
  });

  it('keeps refusals in memory and writes no file of them', async () => {
    answer = { ok: false, problems: [{ table: 'walls', row: 1, column: 'wall', message: 'no' }] };
    const computing = new Computing(runner, new ResultFiles(folder));
    expect(await computing.compute('k', input, [])).toBe(answer);
    expect(await computing.compute('k', input, [])).toBe(answer);
    expect(runs).toBe(1);
    expect(readdirSync(folder)).toEqual([]);
  });

  it('asks again after a run that failed', async () => {
    const failing: Runner = {
      ...runner,
      run: () => (runs++ === 0 ? Promise.reject(new Error('no')) : runner.run({ kind: 'run', input, pinned: [] })),
    };
    const computing = new Computing(failing, null);
    await expect(computing.compute('k', input, [])).rejects.toThrow('no');
    expect(await computing.compute('k', input, [])).toBe(answer);
  });
});

describe('contentKey', () => {
  const key = (change: Partial<BuildingInput> = {}, build = 'one'): string =>
    contentKey(build, { ...input, ...change }, []);

  it('moves with settings, tables, pinned bands and the build, and not with the order of keys', () => {
    const forces = [{ level: 'R', case: 'W', kind: 'wind', fx: 1, fy: 0, x: null, y: null, mz: null }] as const;
    const reversed = Object.fromEntries(
      Object.entries(input.settings).reverse(),
    ) as unknown as BuildingInput['settings'];
    expect(key({ settings: reversed })).toBe(key());
    const pinned = contentKey('one', input, [{ wall: 'W', fromLevel: 'L1', toLevel: 'L1', own: { ends: null } }]);
    const keys = [
      key(),
      key({}, 'two'),
      key({ settings: { ...input.settings, fc: 5001 } }),
      key({ tables: { ...input.tables, forces } }),
      pinned,
    ];
    expect(new Set(keys).size).toBe(5);
  });
});

describe('Lru', () => {
  it('lets go of what was used longest ago when the sum of sizes is reached', () => {
    const lru = new Lru<string>(10);
    lru.set('a', 'A', 4);
    lru.set('b', 'B', 4);
    expect(lru.get('a')).toBe('A');
    lru.set('c', 'C', 4);
    expect([lru.get('a'), lru.get('b'), lru.get('c')]).toEqual(['A', undefined, 'C']);
    lru.set('large', 'L', 50);
    expect([lru.get('a'), lru.get('c'), lru.get('large')]).toEqual([undefined, undefined, 'L']);
  });
});
