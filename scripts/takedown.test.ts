import { spawn } from 'node:child_process';
import { join, resolve } from 'node:path';

import { expect, it } from 'vitest';

const root = resolve(import.meta.dirname, '..');

/** Runs the command with its output in a pipe that is not read before half a second has gone. */
function takedown(...args: string[]): Promise<{ code: number | null; out: string; problems: string }> {
  return new Promise((fulfill, reject) => {
    const child = spawn(
      process.execPath,
      [join(root, 'node_modules/tsx/dist/cli.mjs'), 'scripts/takedown.ts', ...args],
      {
        cwd: root,
      },
    );
    let out = '';
    let problems = '';
    child.stdout.pause();
    setTimeout(() => child.stdout.resume(), 500);
    child.stdout.on('data', (chunk) => (out += String(chunk)));
    child.stderr.on('data', (chunk) => (problems += String(chunk)));
    child.on('error', reject);
    child.on('close', (code) => fulfill({ code, out, problems }));
  });
}

it('writes the whole result into a pipe whose reader is slow', async () => {
  const { code, out } = await takedown('--in', 'fixtures/buildings/demo');
  expect(code).toBe(0);
  const result: unknown = JSON.parse(out);
  expect(result).toHaveProperty('levels.length', 15);
  expect(out.length).toBeGreaterThan(1_000_000);
});

it('lists problems as file:row:column: message, as JSON when asked, and ends with 2', async () => {
  const { code, out, problems } = await takedown('--in', 'fixtures/csv/broken/levels-text-height', '--json');
  expect(code).toBe(2);
  expect(problems).toContain('levels.csv:3:height: height reads "twelve"');
  const answer = JSON.parse(out) as { problems: { file: string; row: number | null; column: string | null }[] };
  expect(answer.problems).toContainEqual(expect.objectContaining({ file: 'levels.csv', row: 3, column: 'height' }));
});
