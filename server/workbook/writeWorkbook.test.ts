import ExcelJS from 'exceljs';
import type { Worksheet } from 'exceljs';
import { beforeAll, describe, expect, it } from 'vitest';

import { caution } from './caution.ts';
import { inventedContent } from './inventedContent.ts';
import { writeWorkbook } from './writeWorkbook.ts';

type Cells = (string | number | boolean)[];

async function readBack(file: Buffer): Promise<ExcelJS.Workbook> {
  const workbook = new ExcelJS.Workbook();
  const bytes = new Uint8Array(file);
  await workbook.xlsx.load(bytes.buffer);
  return workbook;
}

const sheetOf = (workbook: ExcelJS.Workbook, name: string): Worksheet => {
  const sheet = workbook.getWorksheet(name);
  if (sheet === undefined) throw new Error(`no sheet ${name}`);
  return sheet;
};

function cellsBelow(sheet: Worksheet, headRow: number, columns: number): Cells[] {
  const rows: Cells[] = [];
  for (let row = headRow + 1; row <= sheet.rowCount && sheet.getCell(row, 1).value !== null; row += 1) {
    const values = Array.from({ length: columns }, (_, index) => sheet.getCell(row, index + 1).value);
    rows.push(values.map((value) => (typeof value === 'object' ? JSON.stringify(value) : (value as string))));
  }
  return rows;
}

const heads = (sheet: Worksheet, row: number): unknown[] => {
  const { values } = sheet.getRow(row);
  return Array.isArray(values) ? values.slice(1) : [];
};

describe.each(['us', 'si'] as const)('writeWorkbook in %s', (units) => {
  const content = inventedContent(units);
  const { document } = content;
  let workbook: ExcelJS.Workbook;

  beforeAll(async () => {
    workbook = await readBack(await writeWorkbook(content));
  });

  it('has the sheets in reading order, each with the caution in full and one page wide', () => {
    expect(workbook.worksheets.map((sheet) => sheet.name)).toEqual([
      'Wall schedule',
      'Shares',
      'Takedown',
      'Checks',
      'Balance',
      'Quantities',
      'Inputs',
      'Warnings',
    ]);
    for (const sheet of workbook.worksheets) {
      const row = sheet.name === 'Wall schedule' ? 4 : 2;
      expect(sheet.getCell(row, 1).value).toBe(caution);
      expect(sheet.headerFooter.oddFooter).toContain(caution);
      expect((sheet.headerFooter.oddFooter ?? '').length).toBeLessThan(256);
      expect(sheet.pageSetup.fitToWidth).toBe(1);
      expect(sheet.pageSetup.orientation).toBe('landscape');
      expect(Number(sheet.pageSetup.paperSize)).toBe(units === 'us' ? 3 : 8);
      expect(sheet.views[0]?.state).toBe('frozen');
    }
  });

  it('prints a title block with building, number, code, units, engine and time', () => {
    const sheet = sheetOf(workbook, 'Wall schedule');
    const block = new Set(heads(sheet, 3));
    for (const value of ['Larkspur Terrace, east block & annex', 'GW-0417', 'ACI 318-19', 'ASCE 7-22', '0.1.0']) {
      expect(block).toContain(value);
    }
    expect(block).toContain(units === 'us' ? 'US' : 'SI');
    expect(block).toContain('2026-03-04 15:20 UTC');
    expect(sheet.pageSetup.printTitlesRow).toBe('6:8');
  });

  it('has units in the heads of the schedule', () => {
    const unitRow = heads(sheetOf(workbook, 'Wall schedule'), 8);
    expect(unitRow[3]).toBe(units === 'us' ? 'in' : 'mm');
    expect(unitRow[4]).toBe(units === 'us' ? 'psi' : 'MPa');
    expect(unitRow[5]).toBe(units === 'us' ? 'size @ in' : 'size @ mm');
  });

  it('lists every band, the top one first, with the document’s numbers typed and unrounded', () => {
    const read = cellsBelow(sheetOf(workbook, 'Wall schedule'), 8, 23);
    expect(read).toHaveLength(content.rows.length);
    expect(read.slice(0, 4).map((cells) => cells[1])).toEqual(['L8 – Roof', 'L6 – L7', 'L4 – L5', 'L2 – L3']);
    content.rows.forEach((row, index) => {
      const cells = read[index] ?? [];
      expect(cells[0]).toBe(row.wall);
      expect(cells[2]).toBe(row.levels);
      expect([cells[3], cells[4]]).toEqual([row.thickness, row.fc]);
      expect(cells[8]).toBe(row.ends?.length ?? 'none');
      expect(cells.slice(12, 15)).toEqual([row.laps.web, row.laps.ends ?? '–', row.laps.horizontal]);
      expect(cells[16]).toBe(row.extendAbove);
      expect(cells[20]).toBe(row.ratio ?? 'none');
      expect(cells[22]).toBe(row.state);
    });
  });

  it('writes bars in the notation of the trade', () => {
    const read = cellsBelow(sheetOf(workbook, 'Wall schedule'), 8, 23);
    const base = read[3] ?? [];
    expect([base[5], base[6], base[7]]).toEqual(
      units === 'us' ? ['#5@12 EF', '#5@10 EF', 'hook'] : ['16@300 EF', '16@250 EF', 'hook'],
    );
    expect([base[9], base[10]]).toEqual(units === 'us' ? ['(8)#9', '#3@3.5, 4 legs'] : ['8-29', '10@90, 4 legs']);
    expect(base[17]).toBe(units === 'us' ? '(8)#9, embed 28' : '8-29, embed 700');
    expect(read[0]?.slice(8, 12)).toEqual(['none', 'none', 'none', '–']);
  });

  it('marks overwritten cells in ochre at the left edge and says what automatic choice would be', () => {
    const sheet = sheetOf(workbook, 'Wall schedule');
    const row = 8 + 3;
    expect(sheet.getCell(row, 7).border.left?.style).toBe('thick');
    expect(sheet.getCell(row, 7).border.left?.color?.argb).toBe('FF745608');
    expect(sheet.getCell(row, 6).border.left).toBeUndefined();
    expect(sheet.getCell(row, 7).value).toBe(units === 'us' ? '#5@8 EF' : '16@200 EF');
    expect(sheet.getCell(row, 20).value).toContain(units === 'us' ? 'auto #5@10 EF' : 'auto 16@250 EF');
    expect(sheet.getCell(row, 20).value).toContain('One spacing for both faces of the stair');
  });

  it('marks a row over a limit by the word and by hatch, and never prints its ratio as 1.000', () => {
    const sheet = sheetOf(workbook, 'Wall schedule');
    const row = 8 + 4 + 3;
    expect(sheet.getCell(row, 23).value).toBe('over');
    expect(sheet.getCell(row, 23).fill).toMatchObject({ pattern: 'lightUp' });
    expect(sheet.getCell(row, 1).fill).toMatchObject({ pattern: 'lightUp' });
    expect(sheet.getCell(row, 21).value).toBe(1.00042);
    expect(sheet.getCell(row, 21).numFmt).toBe('0.0000');
    expect(sheet.getCell(row - 1, 23).fill).not.toMatchObject({ pattern: 'lightUp' });
  });

  it('numbers the notes that rows share and lists them below, and keeps a row’s own note with it', () => {
    const sheet = sheetOf(workbook, 'Wall schedule');
    expect(sheet.getCell(8 + 4, 20).value).toBe('1\nBase of W1: see the footing plan');
    const below = 8 + content.rows.length + 2;
    expect(sheet.getCell(below, 2).value).toBe('Notes');
    expect(sheet.getCell(below + 1, 2).value).toBe('1  Horizontals hooked 90 degrees at the ends');
    expect(sheet.headerFooter.oddFooter).toContain('&R&8 GW-0417');
  });

  it('carries shares and rigidities unrounded', () => {
    const sheet = sheetOf(workbook, 'Shares');
    const force = units === 'us' ? 'kip' : 'kN';
    expect(heads(sheet, 3)).toContain(`Direct (${force})`);
    const rigidity = new Map(document.rigidities.map((row) => [`${row.level} ${row.wall}`, row.k]));
    expect(cellsBelow(sheet, 3, 9)).toEqual(
      document.distribution.map((row) => [
        row.basis,
        row.case,
        row.variant,
        row.level,
        row.wall,
        rigidity.get(`${row.level} ${row.wall}`),
        row.direct,
        row.torsional,
        row.total,
      ]),
    );
  });

  it('carries lateral, gravity and transferred effects unrounded', () => {
    const expected = [
      ...document.lateral.map((row) => [
        'lateral',
        row.basis,
        row.case,
        row.variant,
        row.level,
        row.wall,
        '–',
        row.shear,
        row.moment,
      ]),
      ...document.gravity.map((row) => [
        'gravity',
        '–',
        row.case,
        '–',
        row.level,
        row.wall,
        row.axial,
        '–',
        row.moment,
      ]),
      ...document.transferred.map((row) => [
        'transferred',
        row.basis,
        row.case,
        row.variant,
        row.level,
        row.wall,
        row.axial,
        row.shear,
        row.moment,
      ]),
    ];
    expect(cellsBelow(sheetOf(workbook, 'Takedown'), 3, 9)).toEqual(expected);
  });

  it('carries checks, balance and quantities unrounded', () => {
    expect(cellsBelow(sheetOf(workbook, 'Checks'), 3, 9)).toEqual(
      document.checks.map((row) => [
        row.wall,
        row.level,
        row.basis,
        row.check,
        row.demand,
        row.capacity ?? '–',
        row.unit,
        row.ratio ?? '–',
        row.ok ? 'ok' : 'over',
      ]),
    );
    const balance = cellsBelow(sheetOf(workbook, 'Balance'), 3, 9);
    expect(balance).toHaveLength(document.balance.length * 6);
    expect(balance[7]?.slice(3)).toEqual(['L3', 'force y', units === 'us' ? 'kip' : 'kN', 201, 201, 3e-15]);
    expect(cellsBelow(sheetOf(workbook, 'Quantities'), 3, 7).slice(0, 3)).toEqual([
      ['building', '–', '–', '–', 411.25, 61234.5, 148.9],
      ['wall', 'W1', '–', '–', 81.5, 12000.25, 147.2],
      ['band', 'W1', 'L2', 'L3', 20.75, 3100.125, 149.4],
    ]);
  });

  it('lists settings with unit and origin', () => {
    const rows = cellsBelow(sheetOf(workbook, 'Inputs'), 3, 5);
    expect(rows).toContainEqual(
      units === 'us' ? ['setting', 'fc', 5000, 'psi', 'default'] : ['setting', 'fc', 35, 'MPa', 'default'],
    );
    expect(rows).toContainEqual(['setting', 'sds', 0.4, '–', 'typed']);
    expect(rows).toContainEqual(['level', 'L2: extent x', 81, units === 'us' ? 'ft' : 'm', '–']);
    expect(cellsBelow(sheetOf(workbook, 'Warnings'), 3, 3)[0]).toEqual(['plan-size-assumed', 'L2', '–']);
  });
});

describe('writeWorkbook', () => {
  it('keeps text that looks like a formula as text', async () => {
    const content = inventedContent('us', 1, 2);
    const rows = content.rows.map((row) => ({ ...row, wall: '=1+1', from: '-1', to: '-1', notes: ['+A1', '@x'] }));
    const workbook = await readBack(await writeWorkbook({ ...content, rows }));
    const sheet = sheetOf(workbook, 'Wall schedule');
    expect(sheet.getCell(9, 1).value).toBe('=1+1');
    expect(sheet.getCell(9, 1).type).toBe(ExcelJS.ValueType.String);
    expect(sheet.getCell(9, 2).value).toBe('-1');
  });

  it('writes a building without rows', async () => {
    const workbook = await readBack(await writeWorkbook({ ...inventedContent('si', 1, 2), rows: [] }));
    expect(sheetOf(workbook, 'Wall schedule').rowCount).toBe(8);
  });
});
