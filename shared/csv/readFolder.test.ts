import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { readFolder } from './readFolder.ts';

const valid = join(import.meta.dirname, '../../fixtures/csv/valid/us');
const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);
const files = (changes: Record<string, string | null> = {}): Map<string, Uint8Array> => {
  const all = new Map<string, Uint8Array>(readdirSync(valid).map((name) => [name, readFileSync(join(valid, name))]));
  for (const [name, text] of Object.entries(changes)) {
    if (text === null) all.delete(name);
    else all.set(name, bytes(text));
  }
  return all;
};
const problemsOf = (changes: Record<string, string | null>) => {
  const reading = readFolder(files(changes));
  if (reading.ok) throw new Error('the folder was taken');
  return reading.problems;
};
const placesOf = (changes: Record<string, string | null>) =>
  problemsOf(changes).map(({ file, row, column }) => [file, row, column]);

describe('readFolder', () => {
  it('names every file that is missing', () => {
    const reading = readFolder(new Map());
    if (reading.ok) throw new Error('an empty folder was taken');
    expect(reading.problems.map(({ file }) => file)).toEqual([
      'building.json',
      'levels.csv',
      'walls.csv',
      'forces.csv',
    ]);
  });

  it('goes without gravity, with a notice, and without combinations in silence', () => {
    const reading = readFolder(files({ 'gravity.csv': null, 'combinations.csv': null }));
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
    expect(reading.notices.map(({ code }) => code)).toEqual(['no-gravity']);
    expect(reading.input.tables.gravity).toEqual([]);
  });

  it('finds files whose names differ in letter case and reports them by their own name', () => {
    const all = files({ 'forces.csv': null });
    all.set('Forces.CSV', bytes('level,case,kind,fx,fy\nRoof,WX,wind,a,0\n'));
    const reading = readFolder(all);
    if (reading.ok) throw new Error('the folder was taken');
    expect(reading.problems.map(({ file, row, column }) => [file, row, column])).toEqual([['Forces.CSV', 2, 'fx']]);
  });

  it('gathers problems of building.json, cells and references at once, in order', () => {
    const places = placesOf({
      'building.json': '{"name": "Two", "units": "us", "fc": "x", "mergeShare": 0.1}',
      'forces.csv': 'level,case,kind,fx,fy\nL9,WX,wind,1,0\nL1,WX,wind,1,b\n\nL8,WX,seismic,1,0\nL2,WX,wind,1,0\n',
      'gravity.csv': 'level,wall,dead\nL1,W9,4\n',
    });
    expect(places).toEqual([
      ['building.json', null, 'fc'],
      ['building.json', null, 'mergeShare'],
      ['forces.csv', 2, 'level'],
      ['forces.csv', 3, 'fy'],
      ['forces.csv', 5, 'level'],
      ['forces.csv', 5, 'kind'],
      ['gravity.csv', 2, 'wall'],
    ]);
  });

  it('does not blame other tables for names that could not be read', () => {
    expect(placesOf({ 'levels.csv': 'level,height\nRoof,11.5\n,12\nL1,13\n' })).toEqual([['levels.csv', 3, 'level']]);
    expect(placesOf({ 'levels.csv': 'level,heigth\nRoof,11.5\n' })).toEqual([['levels.csv', 1, 'height']]);
    expect(
      placesOf({ 'walls.csv': 'wall,x1,y1,x2,y2,thickness,from_level,to_level\n,10,0,30,0,12,L1,Roof\n' }),
    ).toEqual([['walls.csv', 2, 'wall']]);
  });

  it('turns rows into physical lines where cells run over several', () => {
    expect(
      placesOf({ 'forces.csv': '\nlevel,case,kind,fx,fy,note\nRoof,WX,wind,1,0,"a\nb\nc"\n\nL9,WX,wind,1,0,\n' }),
    ).toEqual([['forces.csv', 7, 'level']]);
  });

  it('stops at 500 problems over all files and counts the rest', () => {
    const problems = problemsOf({
      'forces.csv': 'level,case,kind,fx,fy\n' + 'L1,WX,wind,a,b\n'.repeat(300),
      'gravity.csv': 'level,wall,dead\n' + 'L1,W9,4\n'.repeat(40),
    });
    expect(problems).toHaveLength(501);
    expect(problems[500]?.message).toBe('and 140 more problems');
  });

  it('carries the code of what is not designed yet', () => {
    expect(problemsOf({ 'building.json': '{"name": "Two", "units": "us", "wallClass": "special"}' })[0]?.code).toBe(
      'not-designed-yet',
    );
  });

  it('reads overrides and holds them against walls and cases', () => {
    const overrides = 'kind,level,wall,axial,reason\ntransfer,L1,W9,12,ring beam\n';
    expect(placesOf({ 'overrides.csv': overrides })).toEqual([['overrides.csv', 2, 'wall']]);
    const reading = readFolder(files({ 'overrides.csv': overrides.replace('W9', 'W1') }));
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
    expect(reading.input.tables.overrides).toEqual([
      {
        kind: 'transfer',
        level: 'L1',
        wall: 'W1',
        case: null,
        shear: null,
        axial: 12,
        moment: null,
        share: null,
        reason: 'ring beam',
      },
    ]);
    expect(reading.lines.overrides).toEqual([2]);
  });

  it('passes on notices of files and rows', () => {
    const reading = readFolder(
      files({
        'forces.csv': 'level,case,kind,fx,fy,by\nRoof,WX,wind,1,0,me\nRoof,WX,wind,2,0,me\nL1,EY,seismic,0,3,me\n',
      }),
    );
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
    expect(reading.notices.map(({ code }) => code)).toEqual(['file-notice', 'forces-added']);
  });

  it('refuses a building.json that nests without end', () => {
    const text = `{"name":"a","units":"us","basis":${'['.repeat(20_000)}${']'.repeat(20_000)}}`;
    const reading = readFolder(new Map([['building.json', new TextEncoder().encode(text)]]));
    const problems = reading.ok ? [] : reading.problems;
    expect(problems.find(({ file }) => file === 'building.json')?.message).toContain('deeper than 32 levels');
  });

  it('never throws, whatever one of its files holds or loses', () => {
    const name = fc.constantFrom(
      'building.json',
      'levels.csv',
      'walls.csv',
      'forces.csv',
      'gravity.csv',
      'combinations.csv',
      'overrides.csv',
    );
    fc.assert(
      fc.property(name, fc.nat(), fc.nat(), fc.uint8Array({ maxLength: 6 }), (file, at, cut, patch) => {
        const all = files();
        const own = all.get(file) ?? new Uint8Array();
        const start = at % (own.length + 1);
        const end = Math.min(own.length, start + (cut % 8));
        all.set(file, new Uint8Array([...own.slice(0, start), ...patch, ...own.slice(end)]));
        const reading = readFolder(all);
        if (reading.ok) {
          expect(reading.lines.walls).toHaveLength(reading.input.tables.walls.length);
          expect(reading.input.tables.walls.every(({ wall, x1 }) => wall !== '' && Number.isFinite(x1))).toBe(true);
        } else expect(reading.problems.length).toBeGreaterThan(0);
      }),
      { numRuns: 400 },
    );
  });
});
