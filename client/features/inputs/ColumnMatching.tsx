import { tableColumns, type EditableTable } from '#shared/contracts/tableColumns';

import type { ReadColumns } from './useUploadFlow.ts';

export interface ColumnMatchingProps {
  readonly table: EditableTable;
  readonly columns: ReadColumns;
  readonly samples: readonly string[];
  readonly disabled: boolean;
  readonly onMatch: (header: string, column: string | null) => void;
}

/** The file's own heads, each with the column that it was taken for; the person may say otherwise. */
export function ColumnMatching({ table, columns, samples, disabled, onMatch }: ColumnMatchingProps) {
  const ours = tableColumns[table];
  const taken = new Set(columns.flatMap((one) => (one.column === null ? [] : [one.column])));
  const missing = ours.filter((column) => column.required && !taken.has(column.name));
  return (
    <section className="mt-[20px]" aria-label="Columns in the file">
      <h3 className="border-b border-ink pb-1">Columns in the file</h3>
      <table className="gw-table">
        <tbody>
          {columns.map(({ header, column }, index) => (
            <tr key={`${header} ${index}`}>
              <td className="mono max-w-[140px] overflow-hidden text-ellipsis">{header === '' ? 'no head' : header}</td>
              <td className="text-graphite">to</td>
              <td>
                <select
                  className="gw-input h-[24px]! w-[132px]! px-2! text-data!"
                  aria-label={`Column for ${header}`}
                  disabled={disabled || header === ''}
                  value={column ?? ''}
                  onChange={(event) => onMatch(header, event.target.value === '' ? null : event.target.value)}
                >
                  <option value="">leave out</option>
                  {ours.map((one) => (
                    <option key={one.name} value={one.name}>
                      {one.name}
                    </option>
                  ))}
                </select>
              </td>
              <td className="note max-w-[128px] overflow-hidden text-ellipsis">{samples[index] ?? ''}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {missing.length === 0 ? null : (
        <p className="note mt-2">Still without a column: {missing.map((column) => column.name).join(', ')}.</p>
      )}
    </section>
  );
}
