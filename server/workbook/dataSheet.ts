import type { Workbook, Worksheet } from 'exceljs';

import { caution } from './caution.ts';
import { printedTime } from './printedTime.ts';
import { addPrintableSheet } from './pageSetup.ts';
import { alignments, fonts, headFill, inkRule } from './workbookStyle.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

export interface DataColumn<Row> {
  /** with its unit, for example `Shear (kip)` */
  readonly head: string;
  readonly width: number;
  /** a number format makes the column right-aligned */
  readonly format?: string;
  readonly value: (row: Row) => string | number | boolean | null;
}

const headRow = 3;

/** A plain table: name and building, caution, one head row (frozen, filtered, repeated in print), typed cells below. */
export function addDataSheet<Row>(
  workbook: Workbook,
  content: WorkbookContent,
  name: string,
  columns: readonly DataColumn<Row>[],
  rows: readonly Row[],
): Worksheet {
  const sheet = addPrintableSheet(workbook, content, name, { rows: headRow, columns: 0, repeatFrom: headRow });
  columns.forEach(({ width, format }, index) => {
    const column = sheet.getColumn(index + 1);
    column.width = width;
    column.font = fonts.data;
    column.alignment = format === undefined ? alignments.line : alignments.number;
    if (format !== undefined) column.numFmt = format;
  });

  const { settings, printedAt } = content;
  titleCell(
    sheet,
    1,
    [name, settings.name, settings.number, printedTime(printedAt)].filter(Boolean).join('   '),
    fonts.mark,
  );
  titleCell(sheet, 2, caution, fonts.caution);
  sheet.getRow(1).height = 20;

  columns.forEach(({ head, format }, index) => {
    const cell = sheet.getCell(headRow, index + 1);
    cell.value = head;
    cell.font = fonts.head;
    cell.numFmt = '@';
    const inset = format === undefined ? { horizontal: 'left' as const } : { horizontal: 'right' as const, indent: 1 };
    cell.alignment = { vertical: 'bottom', wrapText: true, ...inset };
    cell.fill = headFill;
    cell.border = { bottom: inkRule };
  });
  sheet.getRow(headRow).height = 28;
  for (const row of rows) sheet.addRow(columns.map(({ value }) => value(row) ?? '–'));
  sheet.autoFilter = {
    from: { row: headRow, column: 1 },
    to: { row: headRow + rows.length, column: columns.length },
  };
  return sheet;
}

function titleCell(sheet: Worksheet, row: number, text: string, font: typeof fonts.mark | typeof fonts.caution): void {
  const cell = sheet.getCell(row, 1);
  cell.value = text;
  cell.font = font;
  cell.numFmt = '@';
  cell.alignment = { vertical: 'middle', horizontal: 'left' };
}
