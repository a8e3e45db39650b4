import type { UnitSystem } from '#shared/engineering/input';
import type { OwnCells } from '#shared/engineering/wall-design/designTypes';
import { barTables } from '#shared/engineering/wall-design/bars';
import { millimetersPerInch } from '#shared/engineering/units';
import { sayBar } from '#shared/format/barNumbers';
import { formatBarLength } from '#shared/format/length';

const horizontalEnds = {
  hook: 'hooked at the ends',
  'u-bar': 'closed by U-bars at the ends',
  'in-core': 'straight into the core of the end zone',
} as const;

/** What was typed, in words: `2 curtains, No. 5 at 10 in`. */
export function sayCells(cells: OwnCells, units: UnitSystem): string {
  const unit = units === 'us' ? 'in' : 'mm';
  const length = (value: number): string => `${formatBarLength(value, units)} ${unit}`;
  const curtains = cells.vertical ?? cells.horizontal;
  if (curtains) {
    const faces = curtains.curtains === 2 ? '2 curtains' : '1 curtain';
    const end = cells.horizontal && !cells.vertical ? `, ${horizontalEnds[cells.horizontal.end]}` : '';
    return `${faces}, ${sayBar(curtains.bar)} at ${length(curtains.spacing)}${end}`;
  }
  if (cells.ends === null) return 'no end zone';
  if (cells.ends) return `${cells.ends.count} bars ${sayBar(cells.ends.bar)} in ${length(cells.ends.length)}, each end`;
  if (cells.ties === null) return 'no ties';
  if (cells.ties) {
    const { bar, spacing, legsAcross, legsAlong } = cells.ties;
    return `${sayBar(bar)} at ${length(spacing)}, ${legsAcross} legs through the thickness, ${legsAlong} along`;
  }
  if (cells.laps) {
    const { web, ends, horizontal, splice } = cells.laps;
    const across = `horizontal laps ${horizontal === null ? 'none' : length(horizontal)}`;
    if (splice === 'no lap') return `vertical bars run through the row without a lap; ${across}`;
    if (splice === 'coupler')
      return `end bars coupled; vertical laps ${web === null ? 'none' : length(web)}, ${across}`;
    const part = (name: string, value: number | null): string => `${name} ${value === null ? 'none' : length(value)}`;
    return `laps: ${part('vertical', web)}, ${part('ends', ends)}, ${part('horizontal', horizontal)}`;
  }
  return '';
}

/** Steel ratio of distributed bars over the whole thickness: curtains x area of a bar / (spacing x thickness). */
export function distributedSteelRatio(
  cell: { readonly curtains: number; readonly bar: number; readonly spacing: number },
  thickness: number,
  units: UnitSystem,
): number | null {
  const bar = barTables[units].find((one) => one.number === cell.bar);
  if (!bar || !(cell.spacing > 0) || !(thickness > 0)) return null;
  const perInch = units === 'us' ? 1 : millimetersPerInch;
  return (cell.curtains * bar.areaIn2 * perInch * perInch) / (cell.spacing * thickness);
}
