import { describe, expect, it } from 'vitest';

import type { LevelRow, WallRow } from '#shared/engineering/input';
import type { DesignRow, OverwritableCell, ScheduleCells } from '#shared/engineering/wall-design/designTypes';

import type { Computed } from '../../compute/Runner.ts';
import type { ScheduleRecord } from '../../db/repositories/ScheduleRepository.ts';

import { matchBands } from './matchBands.ts';
import { pinnedBands, wallStories } from './pinnedBands.ts';

const levels = ['L5', 'L4', 'L3', 'L2', 'L1'].map((level) => ({ level, height: 10, elevation: null }) as LevelRow);
const wall = (name: string, from_level: string, to_level: string): WallRow =>
  ({ wall: name, from_level, to_level }) as WallRow;
const tables = { levels, walls: [wall('W', 'L1', 'L5')] };

const cells = { vertical: { curtains: 2, bar: 5, spacing: 12 }, notes: [] } as unknown as ScheduleCells;
const design = (from: string, to: string, overwritten: readonly OverwritableCell[] = []): DesignRow =>
  ({ wall: 'W', from, to, cells, automatic: cells, overwritten, ratio: 0.5, ok: true }) as unknown as DesignRow;
const computed = (...rows: DesignRow[]): Computed => ({
  ok: true,
  result: new Uint8Array(),
  schedule: [],
  rows,
  warnings: [],
});

const record = (id: string, stories: readonly string[], own: ScheduleRecord['own'] = {}): ScheduleRecord => ({
  id,
  wall: 'W',
  fromLevel: stories[0] ?? '',
  toLevel: stories.at(-1) ?? '',
  position: 0,
  stories,
  auto: {},
  own,
  reason: Object.keys(own).length > 0 ? 'because' : null,
  ratio: null,
  ok: true,
  governing: null,
  computedKey: 'old',
  version: 3,
});
const own = { vertical: cells.vertical };
const brief = (rows: readonly ScheduleRecord[]) =>
  rows.map(({ id, fromLevel, toLevel, version, position }) => [id, fromLevel, toLevel, version, position]);

describe('wallStories', () => {
  it('joins the bands of a wall from the base up', () => {
    const walls = [wall('W', 'L4', 'L5'), wall('W', 'L2', 'L3'), wall('V', 'L1', 'L1')];
    expect(wallStories({ levels, walls })).toEqual(
      new Map([
        ['W', ['L2', 'L3', 'L4', 'L5']],
        ['V', ['L1']],
      ]),
    );
  });
});

describe('pinnedBands', () => {
  it('pins overwritten rows only, on those of their stories that still stand', () => {
    const records = [record('a', ['L1', 'L2']), record('b', ['L0', 'L3', 'L4'], own), record('c', ['gone'], own)];
    expect(pinnedBands(records, tables)).toEqual([{ wall: 'W', fromLevel: 'L3', toLevel: 'L4', own }]);
  });
});

describe('matchBands', () => {
  const make = () => 'new';

  it('keeps ids and versions where nothing moved', () => {
    const rows = [record('top', ['L4', 'L5']), record('low', ['L1', 'L2', 'L3'])];
    const next = matchBands(rows, computed(design('L4', 'L5'), design('L1', 'L3')), tables, 'key', make);
    expect(brief(next)).toEqual([
      ['top', 'L4', 'L5', 3, 0],
      ['low', 'L1', 'L3', 3, 1],
    ]);
    expect(next.every((row) => row.computedKey === 'key')).toBe(true);
  });

  it('follows most of the stories when band limits move, and moves the version', () => {
    const rows = [record('top', ['L3', 'L4', 'L5']), record('low', ['L1', 'L2'])];
    const next = matchBands(
      rows,
      computed(design('L5', 'L5'), design('L3', 'L4'), design('L1', 'L2')),
      tables,
      'key',
      make,
    );
    expect(brief(next)).toEqual([
      ['new', 'L5', 'L5', 1, 0],
      ['top', 'L3', 'L4', 4, 1],
      ['low', 'L1', 'L2', 3, 2],
    ]);
  });

  it('gives an overwritten row its stories before others, with its reason', () => {
    const rows = [record('auto', ['L1', 'L2', 'L3', 'L4']), record('own', ['L5'], own)];
    const next = matchBands(rows, computed(design('L1', 'L5', ['vertical'])), tables, 'key', make);
    expect(next).toHaveLength(1);
    expect(next[0]).toMatchObject({ id: 'own', own, reason: 'because', version: 4 });
  });

  it('keeps an overwritten row without stories behind the others', () => {
    const next = matchBands([record('own', ['gone'], own)], computed(design('L1', 'L5')), tables, 'key', make);
    expect(brief(next)).toEqual([
      ['new', 'L1', 'L5', 1, 0],
      ['own', 'gone', 'gone', 3, 1],
    ]);
  });
});
