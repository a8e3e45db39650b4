import { tableColumns, type Column, type EditableTable } from '#shared/contracts/tableColumns';
import type { UploadAnswer } from '#shared/contracts/tables';

import { cellText, columnDecimals } from './cellText.ts';
import { valueOf } from './inputColumns.ts';

export interface UploadPreviewProps {
  readonly table: EditableTable;
  readonly answer: UploadAnswer;
  readonly units: 'us' | 'si';
}

const shownRows = 8;

/** The first rows as they would be stored, in the building's units; only columns that the file fills. */
export function UploadPreview({ table, answer, units }: UploadPreviewProps) {
  const ours: readonly Column[] = tableColumns[table];
  const filled = ours.filter((column) => answer.rows.some((row) => valueOf(row, column.name) !== null));
  const rows = answer.rows.slice(0, shownRows);
  return (
    <section className="mt-[20px]" aria-label="Preview">
      <h3 className="flex border-b border-ink pb-1">
        Preview
        <span className="note ml-auto">
          {rows.length} of {answer.rows.length.toLocaleString('en-US')} rows
        </span>
      </h3>
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="First rows">
        <table className="gw-table">
          <thead>
            <tr>
              {filled.map((column) => (
                <th key={column.name} className={column.type === 'number' ? 'num' : ''}>
                  {column.label}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row, index) => (
              <tr key={index}>
                {filled.map((column) => (
                  <td key={column.name} className={column.type === 'number' ? 'num' : ''}>
                    {cellText(
                      valueOf(row, column.name),
                      columnDecimals(
                        column,
                        rows.map((one) => valueOf(one, column.name)),
                        units,
                      ),
                    )}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
