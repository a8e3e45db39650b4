import { mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { gunzipSync, gzipSync } from 'node:zlib';

import type { Computed } from './Runner.ts';

type ScheduleFile = Pick<Computed, 'schedule' | 'rows'>;

/** Computed results under their content key. The folder may be deleted at any time; a file that can't be read is no file. */
export class ResultFiles {
  constructor(private readonly folder: string) {}

  async read(key: string): Promise<Computed | null> {
    try {
      const result = await readFile(this.place(key, 'result'));
      const { schedule, rows } = JSON.parse(
        gunzipSync(await readFile(this.place(key, 'schedule'))).toString('utf8'),
      ) as ScheduleFile;
      return { ok: true, result: new Uint8Array(result), schedule, rows };
    } catch {
      return null;
    }
  }

  /** Complete or not there: written beside, then renamed. A full disk costs the file and nothing else. */
  async write(key: string, { result, schedule, rows }: Computed): Promise<void> {
    try {
      await mkdir(this.folder, { recursive: true });
      await this.put(this.place(key, 'result'), result);
      await this.put(this.place(key, 'schedule'), gzipSync(JSON.stringify({ schedule, rows })));
    } catch {
      return;
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
