import ExcelJS from 'exceljs';

import { addInputsSheet } from './inputsSheet.ts';
import {
  addBalanceSheet,
  addChecksSheet,
  addQuantitiesSheet,
  addSharesSheet,
  addTakedownSheet,
  addWarningsSheet,
} from './resultSheets.ts';
import { addScheduleSheet } from './scheduleSheet.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

/** The workbook of a building: the schedule ready to print, and behind it every number that led to it, unrounded. */
export async function writeWorkbook(content: WorkbookContent): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  workbook.creator = 'Groundward';
  workbook.title = `${content.settings.name}, wall schedule`;
  addScheduleSheet(workbook, content);
  addSharesSheet(workbook, content);
  addTakedownSheet(workbook, content);
  addChecksSheet(workbook, content);
  addBalanceSheet(workbook, content);
  addQuantitiesSheet(workbook, content);
  addInputsSheet(workbook, content);
  addWarningsSheet(workbook, content);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}
