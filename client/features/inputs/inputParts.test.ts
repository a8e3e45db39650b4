import { describe, expect, it } from 'vitest';

import { tableColumns } from '#shared/contracts/tableColumns';

import { cellText, columnDecimals } from './cellText.ts';
import { columnSamples } from './columnSamples.ts';
import { guessTable, inTableOrder } from './guessTable.ts';
import { inputColumns, type InputRow } from './inputColumns.ts';
import { forceByLevel } from './InputStack.tsx';
import { newRow } from './newRow.ts';
import { putAt, readDraft } from './settingDraft.ts';

const columnOf = (name: string) => {
  const found = tableColumns.walls.find((column) => column.name === name);
  if (found === undefined) throw new Error(`walls has no ${name}`);
  return found;
};

describe('cellText', () => {
  it('gives a column one number of decimals and hides nothing typed', () => {
    expect(columnDecimals(columnOf('x1'), [12, 10.25, null], 'us')).toBe(2);
    expect(columnDecimals(columnOf('x1'), [12], 'us')).toBe(1);
    expect(columnDecimals(columnOf('x1'), [12], 'si')).toBe(2);
    expect(columnDecimals(columnOf('thickness'), [12, 14], 'us')).toBe(0);
    expect(columnDecimals(columnOf('thickness'), [12.5], 'us')).toBe(1);
  });
  it('prints commas, a true minus and a dash for nothing', () => {
    expect(cellText(-1234.5, 1)).toBe('−1,234.5');
    expect(cellText(null, 1)).toBe('–');
    expect(cellText('L2', 0)).toBe('L2');
  });
});

describe('guessTable', () => {
  it.each([
    ['levels.csv', 'levels'],
    ['Quay 12 wall lines.csv', 'walls'],
    ['wind_forces.csv', 'forces'],
    ['gravity by wall.csv', 'gravity'],
    ['combos.csv', 'combinations'],
    ['story heights.tsv', 'levels'],
    ['export.csv', null],
  ])('%s is for %s', (name, table) => {
    expect(guessTable(name)).toBe(table);
  });
  it('puts files in the order in which tables refer to each other', () => {
    const files = ['gravity.csv', 'x.csv', 'levels.csv', 'walls.csv'].map((name) => new File([''], name));
    expect(inTableOrder(files).map((file) => file.name)).toEqual(['levels.csv', 'walls.csv', 'gravity.csv', 'x.csv']);
  });
});

describe('inputColumns', () => {
  const rows = [{ id: 'g1', version: 1, level: 'L2', wall: 'W1', dead: 10 }] as unknown as InputRow[];
  const context = {
    units: 'us' as const,
    rows,
    levels: ['Roof', 'L10', 'L2'],
    walls: ['W1'],
    cases: ['WX'],
    elevations: new Map(),
  };
  const level = inputColumns('gravity', context)[0];
  const row = rows[0];
  if (level === undefined || row === undefined) throw new Error('gravity has no level column');

  it('refuses a level that is not there and names the nearest', () => {
    expect(level.parse('L11', row)).toEqual({ ok: false, expected: 'one of the 3 levels. Nearest: L10' });
    expect(level.parse('L10', row)).toEqual({ ok: true, value: 'L10' });
  });
  it('does not hold an empty table against a name', () => {
    const free = inputColumns('gravity', { ...context, levels: [] })[0];
    expect(free?.parse('Mezzanine', row)).toEqual({ ok: true, value: 'Mezzanine' });
  });
  it('names units in the heads', () => {
    expect(inputColumns('gravity', { ...context, units: 'si' }).map((column) => column.unit)).toContain('kN');
  });
});

describe('newRow', () => {
  it('takes a free name and after its neighbor', () => {
    const rows = [{ id: 'a', version: 1, level: 'L4', height: 11.5 }] as unknown as InputRow[];
    const context = { rows, beside: rows[0] ?? null, levels: [], walls: [], units: 'us' as const };
    expect(newRow('levels', context)).toEqual({ level: 'L3', height: 11.5 });
  });
});

describe('settings', () => {
  const list = { path: 'bars.web.sizes', label: '', kind: 'list' } as const;
  it('reads lists of bars as people type them', () => {
    expect(readDraft(list, '#4, #5 6')).toEqual({ ok: true, value: [4, 5, 6] });
    expect(readDraft(list, '4 five')).toEqual({ ok: false, expected: 'numbers with spaces between, read five' });
    expect(readDraft(list, ' ')).toEqual({ ok: true, value: null });
  });
  it('puts nested keys beside each other', () => {
    const body: Record<string, unknown> = { version: 1 };
    putAt(body, 'stiffness.flexure', 0.35);
    putAt(body, 'stiffness.shear', null);
    expect(body).toEqual({ version: 1, stiffness: { flexure: 0.35, shear: null } });
  });
});

describe('forceByLevel', () => {
  const force = (level: string, loadCase: string, fx: number, fy: number) => ({
    id: `${level}${loadCase}`,
    version: 1,
    level,
    case: loadCase,
    kind: 'wind' as const,
    fx,
    fy,
    x: null,
    y: null,
    mz: null,
  });
  it('adds a level and case that stands twice, in the larger direction', () => {
    const rows = [force('L2', 'WY', 1, 10), force('L2', 'WY', 1, 5), force('L3', 'WX', 9, 0)];
    const found = forceByLevel(rows, 'WY');
    expect(found?.case).toBe('WY');
    expect([...(found?.byLevel ?? [])]).toEqual([['L2', 15]]);
    expect(forceByLevel(rows, 'none')?.case).toBe('WY');
    expect(forceByLevel([], null)).toBeNull();
  });
});

describe('columnSamples', () => {
  it('shows different values and counts blanks', () => {
    const bytes = new TextEncoder().encode('level,kind\nL2,wind\nL3,wind\nL4,\nL5,wind\n');
    expect(columnSamples(bytes, ',')).toEqual(['L2  L3  L4 …', 'wind, 1 blank']);
  });
});
