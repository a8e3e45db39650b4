import { useMemo } from 'react';

import type { ResultDocument, ResultLevel } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { formatPlanLength } from '#shared/format/length';
import { printLevelRange } from '#shared/format/levelRange';

import { useChoice } from '../../app/useChoice.ts';
import { levelsDown } from '../../components/drawing/resultChoice.ts';

export interface ScheduleChoice {
  readonly down: readonly ResultLevel[];
  readonly wall: string | null;
  readonly level: string | null;
  readonly row: ScheduleResourceRow | null;
  /** levels of the chosen row's band, from the top down */
  readonly range: readonly string[];
  readonly title: string;
  readonly sub: string;
  readonly chooseLevel: (level: string) => void;
  readonly chooseRow: (row: ScheduleResourceRow) => void;
  readonly levelsOf: (row: Pick<ScheduleResourceRow, 'from' | 'to'>) => readonly ResultLevel[];
}

/** Levels of a band from its head down to its foot. */
export function levelsOfBand(
  down: readonly ResultLevel[],
  { from, to }: Pick<ScheduleResourceRow, 'from' | 'to'>,
): readonly ResultLevel[] {
  const first = down.findIndex((level) => level.level === to);
  const last = down.findIndex((level) => level.level === from);
  return first < 0 || last < 0 ? [] : down.slice(first, last + 1);
}

/** Wall, story and band in view: from the address where they exist, else the first wall's lowest band. */
export function useScheduleChoice(document: ResultDocument, rows: readonly ScheduleResourceRow[]): ScheduleChoice {
  const [choice, choose] = useChoice();
  const down = useMemo(() => levelsDown(document), [document]);
  const wall = rows.find((row) => row.wall === choice.wall)?.wall ?? rows[0]?.wall ?? null;
  const ofWall = rows.filter((row) => row.wall === wall);
  const holds = (row: ScheduleResourceRow): boolean =>
    levelsOfBand(down, row).some((level) => level.level === choice.level);
  const row = ofWall.find(holds) ?? (choice.level === null ? ofWall.at(-1) : undefined) ?? null;
  const band = row === null ? [] : levelsOfBand(down, row);
  const height = band.reduce((sum, level) => sum + level.height, 0);
  const unit = document.units === 'us' ? 'ft' : 'm';
  return {
    down,
    wall,
    level: choice.level,
    row,
    range: band.map((level) => level.level),
    title: row === null ? (choice.level ?? '') : printLevelRange(row.from, row.to),
    sub:
      row === null
        ? wall === null || choice.level === null
          ? ''
          : `${wall} does not stand in this story`
        : `band of ${row.wall}, ${formatPlanLength(height, document.units)} ${unit}`,
    chooseLevel: (level) => choose({ level, wall }),
    chooseRow: (next) => {
      const inside = levelsOfBand(down, next).some((level) => level.level === choice.level);
      if (next.wall !== choice.wall || !inside) choose({ wall: next.wall, ...(inside ? {} : { level: next.to }) });
    },
    levelsOf: (band) => levelsOfBand(down, band),
  };
}
