import type { UnitSystem, WallRow } from '../../input.ts';

import { geometryTolerance } from './findings.ts';

import type { WallSpan } from './checkWalls.ts';
import type { Findings } from './findings.ts';
import type { LevelIndex } from './levelIndex.ts';

interface Band {
  readonly index: number;
  readonly row: WallRow;
  readonly span: WallSpan | null;
}

/**
 * Bands of one wall: one above the other without gap or overlap, on one line and in one direction within 1 mm or 1/16 in
 * (engineering.md section 1). The upper of two bands that do not meet is to blame, and the band that leaves the line of the lowest.
 */
export function checkBands(
  walls: readonly WallRow[],
  spans: readonly (WallSpan | null)[],
  levels: LevelIndex,
  units: UnitSystem,
  findings: Findings,
): void {
  const byName = new Map<string, Band[]>();
  walls.forEach((row, index) => {
    if (row.wall === '') return;
    const bands = byName.get(row.wall) ?? [];
    bands.push({ index, row, span: spans[index] ?? null });
    byName.set(row.wall, bands);
  });
  for (const bands of byName.values()) {
    if (bands.length < 2) continue;
    // bands whose levels are unknown keep their place in the file behind the others
    const ordered = [...bands].sort(
      (a, b) => (a.span?.from ?? Infinity) - (b.span?.from ?? Infinity) || a.index - b.index,
    );
    checkSequence(ordered, levels, findings);
    checkLine(ordered, geometryTolerance[units], units, findings);
  }
}

function checkSequence(bands: readonly Band[], levels: LevelIndex, findings: Findings): void {
  // a band that could not be placed may well fill a gap: nothing is said then
  const placed = bands.every((band) => band.span !== null);
  let top: number | null = null;
  for (const { index, row, span } of bands) {
    if (!span) continue;
    if (top !== null && span.from <= top) {
      findings.refuse(
        'walls',
        index,
        'from_level',
        `from_level reads ${row.from_level}, but wall ${row.wall} already stands there in another row up to ${levels.names[top]}; expected bands one above the other; start at the next level up`,
      );
    } else if (top !== null && placed && span.from > top + 1) {
      findings.refuse(
        'walls',
        index,
        'from_level',
        `from_level reads ${row.from_level}, expected ${levels.names[top + 1]}, the level above the band below; wall ${row.wall} has a gap there: close it or name the upper part as another wall`,
      );
    }
    top = Math.max(top ?? 0, span.to);
  }
}

function checkLine(bands: readonly Band[], tolerance: number, units: UnitSystem, findings: Findings): void {
  const reference = bands[0]?.row;
  if (!reference) return;
  const dx = reference.x2 - reference.x1;
  const dy = reference.y2 - reference.y1;
  const length = Math.sqrt(dx * dx + dy * dy);
  if (!(length > tolerance)) return;
  const cos = dx / length;
  const sin = dy / length;
  const alongX = Math.abs(cos) >= Math.abs(sin);
  const off = (x: number, y: number): boolean =>
    Math.abs((y - reference.y1) * cos - (x - reference.x1) * sin) > tolerance * (1 + 1e-9);
  for (const { index, row } of bands.slice(1)) {
    const across = alongX ? 'y' : 'x';
    const leaving = off(row.x1, row.y1)
      ? (`${across}1` as const)
      : off(row.x2, row.y2)
        ? (`${across}2` as const)
        : null;
    if (leaving) {
      findings.refuse(
        'walls',
        index,
        leaving,
        `${leaving} reads ${row[leaving]}, which leaves the line of the band below by more than ${units === 'us' ? '1/16 in' : '1 mm'}; expected all bands of wall ${row.wall} on one line; correct it or name this part as another wall`,
      );
    } else if ((row.x2 - row.x1) * cos + (row.y2 - row.y1) * sin < -tolerance) {
      const start = alongX ? 'x1' : 'y1';
      findings.refuse(
        'walls',
        index,
        start,
        `${start} reads ${row[start]}: this band of wall ${row.wall} runs against the one below; expected one direction; exchange its two ends`,
      );
    }
  }
}
