import type { EditableTable } from '#shared/contracts/tableColumns';
import type { StoredRow } from '#shared/contracts/tables';
import { formatNumber } from '#shared/format/number';

import type { ElevationView } from '../../data/elevationView.ts';

export interface AllRows {
  readonly levels: readonly StoredRow<'levels'>[];
  readonly walls: readonly StoredRow<'walls'>[];
  readonly forces: readonly StoredRow<'forces'>[];
  readonly gravity: readonly StoredRow<'gravity'>[];
  readonly combinations: readonly StoredRow<'combinations'>[];
  readonly overrides: readonly StoredRow<'overrides'>[];
}

const plural = (count: number, one: string, many: string): string =>
  `${formatNumber(count, 0)} ${count === 1 ? one : many}`;

/** The totals beneath a table: what a load sheet can be held against. */
export function tableSummary(table: EditableTable, rows: AllRows, view: ElevationView, units: 'us' | 'si'): string {
  const force = units === 'us' ? 'kip' : 'kN';
  switch (table) {
    case 'levels':
      return `${plural(rows.levels.length, 'level', 'levels')}, ${formatNumber(view.height, units === 'us' ? 1 : 2)} ${units === 'us' ? 'ft' : 'm'} above the base`;
    case 'walls': {
      const names = new Set(rows.walls.map((row) => row.wall));
      return `${plural(names.size, 'wall line', 'wall lines')} in ${plural(rows.walls.length, 'row', 'rows')}`;
    }
    case 'forces': {
      const cases = [...new Set(rows.forces.map((row) => row.case))];
      const totals = cases.slice(0, 6).map((name) => {
        const ofCase = rows.forces.filter((row) => row.case === name);
        const x = ofCase.reduce((sum, row) => sum + row.fx, 0);
        const y = ofCase.reduce((sum, row) => sum + row.fy, 0);
        return `${name} ${formatNumber(Math.abs(x) >= Math.abs(y) ? x : y, 1)}`;
      });
      return `Sum ${totals.join(', ')} ${force}`;
    }
    case 'gravity': {
      const sum = (pick: (row: StoredRow<'gravity'>) => number | null) =>
        formatNumber(
          rows.gravity.reduce((total, row) => total + (pick(row) ?? 0), 0),
          0,
        );
      return `Sum of dead ${sum((row) => row.dead)}, live ${sum((row) => row.live)}, roof live ${sum((row) => row.roof_live)}, snow ${sum((row) => row.snow)} ${force}`;
    }
    case 'combinations':
      return plural(rows.combinations.length, 'combination', 'combinations');
    case 'overrides': {
      const shares = rows.overrides.filter((row) => row.kind === 'share').length;
      return `${plural(rows.overrides.length - shares, 'transfer', 'transfers')}, ${plural(shares, 'share', 'shares')}`;
    }
  }
}
