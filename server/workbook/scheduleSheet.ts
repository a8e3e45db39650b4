import type { Cell, Workbook, Worksheet } from 'exceljs';

import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { isOver } from '#shared/format/ratio';

import { listedFormat } from './listedFormat.ts';
import { addPrintableSheet } from './pageSetup.ts';
import type { ScheduleColumn } from './scheduleColumns.ts';
import { scheduleColumns } from './scheduleColumns.ts';
import { numberNotes } from './scheduleText.ts';
import { scheduleHeadRows, scheduleRepeatFrom, writeScheduleHead } from './scheduleHead.ts';
import { ratioFormat } from './ratioFormat.ts';
import { alignments, fonts, hairline, hatch, inkRule, ochreBar } from './workbookStyle.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

const lineHeight = 12;
const leastHeight = 20;

/** The sheet that goes to the drafter: one row a band, the top band first, one block a wall. */
export function addScheduleSheet(workbook: Workbook, content: WorkbookContent): Worksheet {
  const rows = inReadingOrder(content);
  const noteKey = numberNotes(rows);
  const columns = scheduleColumns(content.document.units, noteKey);
  const sheet = addPrintableSheet(workbook, content, 'Wall schedule', {
    rows: scheduleHeadRows,
    columns: 2,
    repeatFrom: scheduleRepeatFrom,
  });
  columns.forEach((column, index) => {
    sheet.getColumn(index + 1).width = column.width;
  });
  writeScheduleHead(sheet, content, columns);

  let position = scheduleHeadRows;
  let wall: string | null = null;
  for (const row of rows) {
    position += 1;
    writeRow(sheet, position, columns, row, row.wall !== wall);
    wall = row.wall;
  }
  for (let column = 1; column <= columns.length; column += 1) {
    if (wall === null) continue;
    const cell = sheet.getCell(position, column);
    cell.border = { ...cell.border, bottom: inkRule };
  }
  writeNotes(sheet, position + 2, columns.length, noteKey);
  return sheet;
}

/** The numbered notes, after an empty row, so that whoever reads rows by their wall stops before them. */
function writeNotes(sheet: Worksheet, from: number, columns: number, noteKey: ReadonlyMap<string, number>): void {
  if (noteKey.size === 0) return;
  const head = sheet.getCell(from, 2);
  head.value = 'Notes';
  head.font = fonts.head;
  for (const [note, number] of noteKey) {
    sheet.mergeCells(from + number, 2, from + number, columns);
    const cell = sheet.getCell(from + number, 2);
    cell.value = `${String(number)}  ${note}`;
    cell.font = fonts.data;
    cell.alignment = alignments.line;
  }
}

/** Walls as they come, the bands of each from the top down. */
function inReadingOrder(content: WorkbookContent): ScheduleResourceRow[] {
  const elevations = new Map(content.document.levels.map((level) => [level.level, level.elevation]));
  const walls = [...new Set(content.rows.map((row) => row.wall))];
  const places = new Map(walls.map((wall, index) => [wall, index]));
  const place = (row: ScheduleResourceRow): number => places.get(row.wall) ?? 0;
  const height = (row: ScheduleResourceRow): number => elevations.get(row.to) ?? 0;
  return [...content.rows].sort((a, b) => place(a) - place(b) || height(b) - height(a));
}

function writeRow(
  sheet: Worksheet,
  position: number,
  columns: readonly ScheduleColumn[],
  row: ScheduleResourceRow,
  first: boolean,
): void {
  const line = sheet.getRow(position);
  let lines = 1;
  columns.forEach((column, index) => {
    const cell = line.getCell(index + 1);
    cell.value = column.value(row);
    dress(cell, column, row, first);
    if (typeof cell.value === 'string' && column.look === 'quiet')
      lines = Math.max(lines, countLines(cell.value, column));
  });
  line.height = Math.max(leastHeight, lines * lineHeight + 4);
}

function dress(cell: Cell, column: ScheduleColumn, row: ScheduleResourceRow, first: boolean): void {
  const own = column.cell !== undefined && row.overwritten.includes(column.cell);
  const over = isOver(row.ratio) || row.state === 'over';
  const marksOver = over && (column.head === 'Worst ratio' || column.head === 'State');
  cell.font =
    column.look === 'mark'
      ? first
        ? fonts.mark
        : fonts.quiet
      : column.look === 'quiet'
        ? fonts.quiet
        : marksOver
          ? fonts.over
          : column.head === 'State' && row.state !== 'ok'
            ? fonts.firm
            : own
              ? fonts.overwritten
              : column.look === 'notation'
                ? fonts.notation
                : fonts.data;
  cell.alignment =
    column.look === 'number' ? alignments.number : column.look === 'quiet' ? alignments.text : alignments.line;
  cell.border = { top: first ? inkRule : hairline, ...(own ? { left: ochreBar } : {}) };
  if (column.head === 'Worst ratio') cell.numFmt = ratioFormat(row.ratio);
  else if (typeof cell.value === 'number') cell.numFmt = listedFormat(cell.value);
  if (over && (column.look === 'mark' || column.head === 'State')) cell.fill = hatch;
}

/** Lines that a wrapped text takes in its column; a quiet character is narrower than the column's measure. */
function countLines(text: string, column: ScheduleColumn): number {
  const fit = Math.max(1, Math.floor(column.width * 0.95));
  return text.split('\n').reduce((sum, part) => sum + Math.max(1, Math.ceil(part.length / fit)), 0);
}
