import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { checkSection } from '#shared/result/checkSection';

/** Sections by themselves: strain compatibility and shear of the engine against checkSection.mjs, which shares no code. */
const scripts = import.meta.dirname;
let workFolder = '';

beforeAll(() => {
  workFolder = mkdtempSync(join(tmpdir(), 'section-'));
});
afterAll(() => {
  rmSync(workFolder, { recursive: true });
});

function judge(seed: number, spoil: (text: string) => string): { status: number | null; output: string } {
  const file = join(workFolder, `${String(seed)}.json`);
  const printed = join(workFolder, `${String(seed)}.output.json`);
  spawnSync(process.execPath, [join(scripts, 'generateSection.mjs'), String(seed), file]);
  const outcome = checkSection(JSON.parse(readFileSync(file, 'utf8')));
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  writeFileSync(printed, spoil(JSON.stringify(outcome.output)));
  const program = spawnSync(process.execPath, [join(scripts, 'checkSection.mjs'), file, printed], { encoding: 'utf8' });
  return { status: program.status, output: program.stdout + program.stderr };
}

describe('a section agrees with the independent solver within 0.1 %', () => {
  it.each(Array.from({ length: 25 }, (_, index) => index + 1))('generated section %d', (seed) => {
    const { status, output } = judge(seed, (text) => text);
    expect(output).toContain('no difference');
    expect(status).toBe(0);
  });

  it('sees a strength that is 1 % off', () => {
    const { status, output } = judge(1, (text) =>
      text.replace(/"phiMn":([\d.]+)/, (_, value: string) => `"phiMn":${String(Number(value) * 1.01)}`),
    );
    expect(output).toContain('phiMn');
    expect(status).toBe(1);
  });
});
