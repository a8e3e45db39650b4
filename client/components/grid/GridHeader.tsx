import { tableFeatures, useTable, type ColumnDef } from '@tanstack/react-table';
import { useMemo } from 'react';

import type { GridColumn } from './gridTypes.ts';

const features = tableFeatures({});
type Features = typeof features;

/** Columns of one group stand under one head; the library works out the rows of heads. */
function toDefinitions<Row extends object>(columns: readonly GridColumn<Row>[]): ColumnDef<Features, Row>[] {
  const leaf = (column: GridColumn<Row>): ColumnDef<Features, Row> => ({
    id: column.id,
    header: column.header,
    accessorFn: (row: Row) => column.text(row),
  });
  const definitions: ColumnDef<Features, Row>[] = [];
  let index = 0;
  while (index < columns.length) {
    const column = columns[index];
    if (column === undefined) break;
    const { group } = column;
    if (group === undefined) {
      definitions.push(leaf(column));
      index += 1;
      continue;
    }
    const members: ColumnDef<Features, Row>[] = [];
    for (let next = columns[index]; next !== undefined && next.group === group; next = columns[index]) {
      members.push(leaf(next));
      index += 1;
    }
    definitions.push({ id: `group ${group} ${index}`, header: group, columns: members });
  }
  return definitions;
}

const noRows: never[] = [];

export interface GridHeaderProps<Row> {
  readonly columns: readonly GridColumn<Row>[];
}

/**
 * The column heads; they stick while the rows scroll. Heads of groups stand above for the eye only: each column says its group as
 * a description, so that heads and cells count alike.
 */
export function GridHeader<Row extends object>({ columns }: GridHeaderProps<Row>) {
  const definitions = useMemo(() => toDefinitions(columns), [columns]);
  const byId = useMemo(() => new Map(columns.map((column) => [column.id, column])), [columns]);
  const table = useTable<Features, Row>({ features, columns: definitions, data: noRows });
  return (
    <div role="rowgroup" className="gw-grid-head">
      {table.getHeaderGroups().map((headerGroup, level, all) => {
        const grouping = level < all.length - 1;
        return (
          <div
            key={headerGroup.id}
            role={grouping ? 'presentation' : 'row'}
            aria-hidden={grouping}
            aria-rowindex={grouping ? undefined : 1}
            className="gw-grid-row"
          >
            {headerGroup.headers.map((header) => {
              const column = byId.get(header.column.id);
              const span = { gridColumn: `span ${header.colSpan}` };
              if (column === undefined || grouping) {
                return (
                  <div key={header.id} className={header.isPlaceholder ? undefined : 'gw-grid-group'} style={span}>
                    {header.isPlaceholder ? null : <span>{String(header.column.columnDef.header)}</span>}
                  </div>
                );
              }
              return (
                <div
                  key={header.id}
                  role="columnheader"
                  aria-description={column.group}
                  className={`gw-grid-heading ${column.align === 'right' ? 'num' : ''}`}
                  style={span}
                >
                  {column.header}
                  {column.unit === undefined || column.unit === '' ? null : <span className="u">{column.unit}</span>}
                </div>
              );
            })}
          </div>
        );
      })}
    </div>
  );
}
