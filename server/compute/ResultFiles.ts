import { mkdir, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { gunzipSync, gzipSync } from 'node:zlib';

import type { Computed } from './Runner.ts';

type ScheduleFile = Pick<Computed, 'schedule' | 'rows' | 'warnings'>;

const gigabyte = 1024 * 1024 * 1024;
/** writes between two looks at the size of the folder */
const prunedEvery = 100;

/** Computed results under their content key. The folder may be deleted at any time; a file that can't be read is no file. */
export class ResultFiles {
  private written = 0;

  /** `mostBytes`: what the folder may hold; the oldest files go first */
  constructor(
    private readonly folder: string,
    private readonly mostBytes = gigabyte,
  ) {}

  async read(key: string): Promise<Computed | null> {
    try {
      const result = await readFile(this.place(key, 'result'));
      const { schedule, rows, warnings } = JSON.parse(
        gunzipSync(await readFile(this.place(key, 'schedule'))).toString('utf8'),
      ) as ScheduleFile;
      return { ok: true, result: new Uint8Array(result), schedule, rows, warnings };
    } catch {
      return null;
    }
  }

  /** Complete or not there: written beside, then renamed. A full disk costs the file and nothing else. */
  async write(key: string, { result, schedule, rows, warnings }: Computed): Promise<void> {
    try {
      await mkdir(this.folder, { recursive: true });
      await this.put(this.place(key, 'result'), result);
      await this.put(this.place(key, 'schedule'), gzipSync(JSON.stringify({ schedule, rows, warnings })));
      if (this.written % prunedEvery === 0) await this.prune();
      this.written += 1;
    } catch {
      return;
    }
  }

  private async prune(): Promise<void> {
    const files = await Promise.all(
      (await readdir(this.folder)).map(async (name) => {
        const { size, mtimeMs } = await stat(join(this.folder, name));
        return { name, size, mtimeMs };
      }),
    );
    let held = 0;
    for (const { name, size } of files.sort((a, b) => b.mtimeMs - a.mtimeMs)) {
      held += size;
      if (held > this.mostBytes) await rm(join(this.folder, name), { force: true });
    }
  }

  private async put(file: string, body: Uint8Array): Promise<void> {
    const beside = `${file}.${process.pid}.tmp`;
    await writeFile(beside, body);
    await rename(beside, file);
  }

  private place(key: string, part: string): string {
    return join(this.folder, `${key}.${part}.json.gz`);
  }
}
