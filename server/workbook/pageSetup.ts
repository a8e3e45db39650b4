import type { Workbook, Worksheet } from 'exceljs';

import { caution } from './caution.ts';
import type { WorkbookContent } from './WorkbookContent.ts';

/** Codes of the paper list of ECMA-376 18.3.1.63: 3 tabloid, 8 A3. */
const paperSizes: Readonly<Record<'us' | 'si', number>> = { us: 3, si: 8 };

/**
 * `&` starts a code in a sheet's foot; doubled it prints as itself. Cut short: a foot holds 255 characters. The space after a
 * size keeps a number that begins with a digit apart from it.
 */
const inFoot = (text: string): string => text.slice(0, 20).replaceAll('&', '&&');

/** A sheet that prints on tabloid or A3 landscape, one page wide, with frozen and repeated heads and the caution in its foot. */
export function addPrintableSheet(
  workbook: Workbook,
  content: WorkbookContent,
  name: string,
  heads: { readonly rows: number; readonly columns: number; readonly repeatFrom: number },
): Worksheet {
  const { settings } = content;
  return workbook.addWorksheet(name, {
    views: [{ state: 'frozen', xSplit: heads.columns, ySplit: heads.rows, showGridLines: false, zoomScale: 90 }],
    properties: { defaultRowHeight: 15 },
    pageSetup: {
      paperSize: paperSizes[settings.units],
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      horizontalCentered: false,
      margins: { left: 0.5, right: 0.5, top: 0.5, bottom: 0.75, header: 0.3, footer: 0.3 },
      printTitlesRow: `${String(heads.repeatFrom)}:${String(heads.rows)}`,
    },
    headerFooter: {
      oddFooter: `&L&8 ${caution}&R&8 ${[settings.number, name].map(inFoot).filter(Boolean).join('  ')}  &P / &N`,
    },
  });
}
