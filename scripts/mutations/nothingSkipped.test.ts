import { readFileSync, readdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

/** Tests that do not run, or run until they pass, prove nothing: no file of the tree may hold a way to leave one out or to wait blindly. */
const root = resolve(import.meta.dirname, '../..');
const ways = [
  /\b(?:it|test|describe|suite)\.(?:only|skip|todo|fixme|fails)\b/,
  /\b(?:skipIf|runIf)\(/,
  /\bx(?:it|describe)\(/,
  /\bwaitForTime[o]ut\b/,
  /\bretr(?:ies|y):\s*[1-9]/,
  /\beslint-disabl[e]/,
  /@ts-(?:ignore|nocheck)/,
];

function filesOf(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return filesOf(path);
    return /\.(?:ts|tsx|mjs|cjs|js)$/.test(entry.name) ? [path] : [];
  });
}

function findings(name: string, text: string): string[] {
  return text.split('\n').flatMap((line, index) => {
    const found = ways.find((way) => way.test(line));
    return found ? [`${name}:${String(index + 1)}: ${line.trim()}`] : [];
  });
}

describe('nothing is skipped', () => {
  it('in any file of client, server, shared, scripts and e2e', () => {
    const files = ['client', 'server', 'shared', 'scripts', 'e2e'].flatMap((folder) => filesOf(join(root, folder)));
    expect(files.length).toBeGreaterThan(400);
    const own = import.meta.filename;
    expect(files.filter((file) => file !== own).flatMap((file) => findings(file, readFileSync(file, 'utf8')))).toEqual(
      [],
    );
  });
  it.each([
    'it.only(',
    'describe.skip(',
    'test.todo(',
    'await page.waitForTimeout(100)',
    'retries: 2',
    '// eslint-disable-line',
    '// @ts-ignore',
    'it.skipIf(x)(',
  ])('would see %s', (line) => {
    expect(findings('a', line)).toHaveLength(1);
  });
});
