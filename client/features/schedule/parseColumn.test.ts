import { describe, expect, it } from 'vitest';

import { sample } from '../../engine/testing/sampleBuilding.ts';
import { columnText, showsOverwrite } from './cellText.ts';
import { parseColumn, type RowCells } from './parseColumn.ts';

const found = sample.rows[1];
if (!found) throw new Error('the sample has no second row');
const row = found;
const band = { from: 0, to: 27 };
const ends = { bar: 8, count: 8, length: 30 };
const laps = { web: 16, ends: 40, horizontal: 20, splice: 'lap' } as const;
const withEnds: RowCells = { ...row, ends, laps, ties: null };

describe('parseColumn', () => {
  it('reads distributed steel, horizontal bars with what they do at the ends', () => {
    expect(parseColumn('vertical', 'no. 5 @ 12" ef', row, 'us', band)).toEqual({
      ok: true,
      value: { vertical: { curtains: 2, bar: 5, spacing: 12 } },
    });
    expect(parseColumn('horizontal', '#5@10 EF', row, 'us', band)).toEqual({
      ok: true,
      value: { horizontal: { curtains: 2, bar: 5, spacing: 10, end: 'hook' } },
    });
    const closed = { ...row, horizontal: { ...row.horizontal, bar: 5, spacing: 10, end: 'u-bar' as const } };
    expect(columnText('horizontal', closed, 'us')).toBe('#5@10 EF u-bar');
    expect(parseColumn('horizontal', '#5@10 EF U-bars', row, 'us', band)).toEqual({
      ok: true,
      value: { horizontal: closed.horizontal },
    });
  });

  it('keeps the length of an end zone with its bars, and the bars with its length', () => {
    expect(parseColumn('endsBars', '(10)#9', withEnds, 'us', band)).toEqual({
      ok: true,
      value: { ends: { bar: 9, count: 10, length: 30 } },
    });
    expect(parseColumn('endsLength', '36 in', withEnds, 'us', band)).toEqual({
      ok: true,
      value: { ends: { bar: 8, count: 8, length: 36 } },
    });
    expect(parseColumn('endsBars', 'none', withEnds, 'us', band)).toEqual({ ok: true, value: { ends: null } });
  });

  it('gives a new end zone the automatic length, or 24 in and 600 mm', () => {
    const automatic = { ...row.automatic, ends: { bar: 7, count: 6, length: 22 } };
    expect(parseColumn('endsBars', '(8)#9', { ...row, automatic }, 'us', band)).toMatchObject({
      value: { ends: { length: 22 } },
    });
    expect(parseColumn('endsBars', '(8)#9', row, 'us', band)).toMatchObject({ value: { ends: { length: 24 } } });
    expect(parseColumn('endsBars', '8-25', row, 'si', band)).toMatchObject({ value: { ends: { length: 600 } } });
  });

  it('asks for the bars before a length', () => {
    expect(parseColumn('endsLength', '30', row, 'us', band)).toMatchObject({ ok: false });
  });

  it('runs new ties over the band and keeps the extent of old ones', () => {
    expect(parseColumn('ties', '#4@4, 7 legs', withEnds, 'us', band)).toEqual({
      ok: true,
      value: {
        ties: {
          bar: 4,
          spacing: 4,
          legsAcross: 7,
          legsAlong: 2,
          fromElevation: 0,
          toElevation: 27,
          kind: 'hoop and crossties',
        },
      },
    });
    const ties = { bar: 3, spacing: 5, legsAcross: 2, legsAlong: 2, fromElevation: 3, toElevation: 9, kind: 'hoop' };
    expect(parseColumn('ties', '#4@4, 2 legs', { ...withEnds, ties }, 'us', band)).toMatchObject({
      value: { ties: { fromElevation: 3, toElevation: 9, kind: 'hoop' } },
    });
  });

  it('changes one lap and keeps the others', () => {
    expect(parseColumn('lapEnds', '44', withEnds, 'us', band)).toEqual({
      ok: true,
      value: { laps: { ...laps, ends: 44 } },
    });
    expect(parseColumn('lapEnds', 'none', withEnds, 'us', band)).toEqual({
      ok: true,
      value: { laps: { ...laps, ends: null } },
    });
  });

  it('couples end bars, and laps them again', () => {
    const coupled = { ...withEnds, laps: { ...laps, ends: null, splice: 'coupler' as const } };
    expect(parseColumn('lapEnds', 'Coupler', withEnds, 'us', band)).toEqual({
      ok: true,
      value: { laps: coupled.laps },
    });
    expect(columnText('lapEnds', coupled, 'us')).toBe('coupler');
    expect(parseColumn('lapEnds', '44', coupled, 'us', band)).toMatchObject({
      value: { laps: { ends: 44, splice: 'lap' } },
    });
  });

  it('runs vertical bars through the row without a lap, and laps them again', () => {
    const through = { ...withEnds, laps: { ...laps, web: null, ends: null, splice: 'no lap' as const } };
    expect(parseColumn('lapWeb', 'No lap', withEnds, 'us', band)).toEqual({ ok: true, value: { laps: through.laps } });
    expect(parseColumn('lapEnds', 'no laps', withEnds, 'us', band)).toEqual({
      ok: true,
      value: { laps: through.laps },
    });
    expect(columnText('lapWeb', through, 'us')).toBe('no lap');
    expect(columnText('lapEnds', through, 'us')).toBe('no lap');
    expect(columnText('lapEnds', { ...through, ends: null }, 'us')).toBe('–');
    const automatic = { ...through.automatic, laps: { ...laps, ends: 41 } };
    expect(parseColumn('lapWeb', '20', { ...through, automatic }, 'us', band)).toEqual({
      ok: true,
      value: { laps: { web: 20, ends: 41, horizontal: 20, splice: 'lap' } },
    });
    expect(parseColumn('lapEnds', 'coupler', { ...through, automatic }, 'us', band)).toEqual({
      ok: true,
      value: { laps: { web: 16, ends: null, horizontal: 20, splice: 'coupler' } },
    });
    expect(parseColumn('lapHorizontal', 'no lap', withEnds, 'us', band).ok).toBe(false);
  });

  it('says what it expected', () => {
    expect(parseColumn('lapEnds', 'long', withEnds, 'us', band)).toEqual({
      ok: false,
      expected: 'a length up to 240 in, none, no lap or coupler',
    });
    expect(parseColumn('lapHorizontal', 'long', withEnds, 'si', band)).toEqual({
      ok: false,
      expected: 'a length up to 6,000 mm, or none',
    });
    expect(parseColumn('lapWeb', 'long', withEnds, 'us', band)).toEqual({
      ok: false,
      expected: 'a length up to 240 in, none or no lap',
    });
    expect(parseColumn('lapWeb', '900', withEnds, 'us', band).ok).toBe(false);
    expect(parseColumn('vertical', '#16@12', row, 'us', band).ok).toBe(false);
  });
});

describe('columns of one cell', () => {
  const overwritten = {
    ...row,
    ends: { bar: 8, count: 10, length: 30 },
    automatic: { ...row.automatic, ends },
    overwritten: ['ends'] as const,
  };

  it('print their own part', () => {
    expect(columnText('endsBars', overwritten, 'us')).toBe('(10)#8');
    expect(columnText('endsLength', overwritten, 'us')).toBe('30');
    expect(columnText('ties', row, 'us')).toBe('–');
    expect(columnText('ties', overwritten, 'us')).toBe('none');
  });

  it('mark the part that differs from the automatic choice', () => {
    expect(showsOverwrite('endsBars', overwritten, 'us')).toBe(true);
    expect(showsOverwrite('endsLength', overwritten, 'us')).toBe(false);
  });

  it('never hide an overwrite that equals the automatic choice', () => {
    const same = { ...overwritten, ends };
    expect(showsOverwrite('endsBars', same, 'us')).toBe(true);
    expect(showsOverwrite('endsLength', same, 'us')).toBe(false);
  });
});
