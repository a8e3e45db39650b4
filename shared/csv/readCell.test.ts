import { describe, expect, it } from 'vitest';

import { readCell, readCellValue } from './readCell.ts';

import type { Column } from '../contracts/tableColumns.ts';

const level: Column = { name: 'level', label: 'Level', type: 'text', required: true };
const name: Column = { name: 'name', label: 'Name', type: 'text', required: false };
const kind: Column = { name: 'kind', label: 'Kind', type: 'choice', required: true, choices: ['wind', 'seismic'] };
const share: Column = {
  name: 'share',
  label: 'Share',
  type: 'number',
  required: false,
  quantity: 'fraction',
  min: 0,
  max: 1,
};
const height: Column = {
  name: 'height',
  label: 'Height',
  type: 'number',
  required: true,
  quantity: 'length',
  above: 0,
};

describe('readCell', () => {
  it('trims, and reads an empty optional cell as null', () => {
    expect(readCell(level, '  L 1\u00a0')).toEqual({ ok: true, value: 'L 1' });
    expect(readCell(share, '   ')).toEqual({ ok: true, value: null });
    expect(readCell(level, '  ').ok).toBe(false);
  });

  it('takes choices in any letter case', () => {
    expect(readCell(kind, 'Wind')).toEqual({ ok: true, value: 'wind' });
    expect(readCell(kind, 'windy')).toMatchObject({ ok: false, message: expect.stringContaining('wind, seismic') });
  });

  it('holds numbers to their limits, ends included where the contract includes them', () => {
    expect(readCell(share, '0')).toEqual({ ok: true, value: 0 });
    expect(readCell(share, '1')).toEqual({ ok: true, value: 1 });
    expect(readCell(share, '1.0001').ok).toBe(false);
    expect(readCell(share, '40')).toMatchObject({ ok: false, message: expect.stringContaining('40 percent is 0.4') });
    expect(readCell(height, '0').ok).toBe(false);
    expect(readCell(height, '1e-9').ok).toBe(true);
  });

  it('takes one apostrophe off text that a spreadsheet would run', () => {
    expect(readCell(level, "'=A1")).toEqual({ ok: true, value: '=A1' });
    expect(readCell(level, "'-1")).toEqual({ ok: true, value: '-1' });
    expect(readCell(level, "''@x")).toEqual({ ok: true, value: "'@x" });
    expect(readCell(level, "'quoted'")).toEqual({ ok: true, value: "'quoted'" });
  });

  it('limits text to 500 characters', () => {
    expect(readCell(name, 'x'.repeat(500)).ok).toBe(true);
    expect(readCell(name, 'x'.repeat(501)).ok).toBe(false);
  });
});

describe('readCellValue', () => {
  it('holds JSON to the same rules', () => {
    expect(readCellValue(height, 3.5)).toEqual({ ok: true, value: 3.5 });
    expect(readCellValue(height, -1).ok).toBe(false);
    expect(readCellValue(height, Number.NaN).ok).toBe(false);
    expect(readCellValue(height, '3,5').ok).toBe(false);
    expect(readCellValue(height, '1,250')).toEqual({ ok: true, value: 1250 });
    expect(readCellValue(height, null).ok).toBe(false);
    expect(readCellValue(share, null)).toEqual({ ok: true, value: null });
    expect(readCellValue(level, 7)).toEqual({ ok: true, value: '7' });
  });

  it('keeps the apostrophe of typed text', () => {
    expect(readCellValue(level, "'=A1")).toEqual({ ok: true, value: "'=A1" });
    expect(readCellValue(level, '=A1')).toEqual({ ok: true, value: '=A1' });
  });
});
