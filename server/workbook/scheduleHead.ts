import type { Cell, Worksheet } from 'exceljs';

import { caution } from './caution.ts';
import { printedTime } from './printedTime.ts';
import { codeNames, loadNames, unitSystemNames } from './resultUnits.ts';
import type { ScheduleColumn } from './scheduleColumns.ts';
import { scheduleLegend } from './scheduleLegend.ts';
import { alignments, fineRule, fonts, hatch, headFill, inkRule, ochreBar } from './workbookStyle.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

/** Rows of the sheet: 1 title, 2 and 3 title block, 4 caution, 5 legend, 6 to 8 column heads. */
export const scheduleHeadRows = 8;
export const scheduleRepeatFrom = 6;

/** Title block fields and the columns that each spans. */
const fields = (content: WorkbookContent): readonly (readonly [string, string, number, number])[] => [
  ['Building', content.settings.name, 1, 4],
  ['Number', content.settings.number === '' ? '–' : content.settings.number, 5, 6],
  ['Code', codeNames[content.document.code], 7, 8],
  ['Loads', loadNames[content.document.loads], 9, 10],
  ['Units', unitSystemNames[content.document.units], 11, 11],
  ['Bases of distribution', content.document.basis.join(', '), 12, 15],
  ['Engine', content.document.engine, 16, 18],
  ['Printed', printedTime(content.printedAt), 19, 20],
];

/** Writes title, title block, caution, legend and the repeated column heads. */
export function writeScheduleHead(
  sheet: Worksheet,
  content: WorkbookContent,
  columns: readonly ScheduleColumn[],
): void {
  const last = columns.length;
  put(sheet.getCell(1, 1), 'Wall schedule').font = fonts.title;
  sheet.getRow(1).height = 28;

  for (const [label, value, from, to] of fields(content)) {
    sheet.mergeCells(2, from, 2, to);
    sheet.mergeCells(3, from, 3, to);
    put(sheet.getCell(2, from), label).font = fonts.quiet;
    put(sheet.getCell(3, from), value).font = fonts.mark;
  }
  for (let column = 1; column <= last; column += 1) sheet.getCell(3, column).border = { bottom: inkRule };
  sheet.getRow(3).height = 18;

  sheet.mergeCells(4, 1, 4, last);
  put(sheet.getCell(4, 1), caution).font = fonts.caution;
  sheet.getRow(4).height = 16;
  writeLegend(sheet, content, last);
  writeColumnHeads(sheet, columns);
}

function writeLegend(sheet: Worksheet, content: WorkbookContent, last: number): void {
  sheet.mergeCells(5, 1, 5, 20);
  put(sheet.getCell(5, 1), scheduleLegend[content.document.units]).font = fonts.quiet;
  const over = put(sheet.getCell(5, 21), 'over');
  over.font = fonts.over;
  over.fill = hatch;
  over.alignment = alignments.center;
  sheet.mergeCells(5, 22, 5, last);
  const overwritten = put(sheet.getCell(5, 22), 'limit exceeded     bar at the left of a cell, as here: overwritten');
  overwritten.font = fonts.quiet;
  overwritten.alignment = { ...alignments.line, indent: 1 };
  overwritten.border = { left: ochreBar };
  sheet.getRow(5).height = 18;
}

function writeColumnHeads(sheet: Worksheet, columns: readonly ScheduleColumn[]): void {
  let groupStart = 1;
  columns.forEach((column, index) => {
    const position = index + 1;
    const next = columns[index + 1];
    if (next?.group !== column.group || column.group === '') {
      if (position > groupStart) sheet.mergeCells(6, groupStart, 6, position);
      const group = put(sheet.getCell(6, groupStart), column.group);
      group.font = fonts.quiet;
      if (column.group !== '') group.border = { bottom: fineRule };
      groupStart = position + 1;
    }
    const horizontal = column.look === 'number' ? 'right' : 'left';
    const inset = column.look === 'number' ? { indent: 1 } : {};
    const head = put(sheet.getCell(7, position), column.head);
    head.font = fonts.head;
    head.alignment = { vertical: 'bottom', horizontal, wrapText: true, ...inset };
    const unit = put(sheet.getCell(8, position), column.unit);
    unit.font = fonts.quiet;
    unit.alignment = { vertical: 'top', horizontal, wrapText: true, ...inset };
    unit.border = { bottom: inkRule };
    for (const row of [6, 7, 8]) sheet.getCell(row, position).fill = headFill;
  });
  sheet.getRow(7).height = 26;
  sheet.getRow(8).height = 24;
}

function put(cell: Cell, value: string): Cell {
  cell.value = value;
  cell.alignment = alignments.line;
  return cell;
}
