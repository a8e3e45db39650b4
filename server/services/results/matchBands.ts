import type { Tables } from '#shared/engineering/input';
import type { DesignRow, OverwritableCell, OwnCells, ScheduleCells } from '#shared/engineering/wall-design/designTypes';

import type { Computed } from '../../compute/Runner.ts';
import type { ScheduleRecord } from '../../db/repositories/ScheduleRepository.ts';

import { wallStories } from './pinnedBands.ts';

interface Band {
  readonly place: number;
  readonly stories: readonly string[];
  readonly row: DesignRow;
}

function ownCells(cells: ScheduleCells, names: readonly OverwritableCell[]): OwnCells {
  return Object.fromEntries(names.map((name) => [name, cells[name]]));
}

function storiesBetween(all: readonly string[], from: string, to: string): string[] {
  return all.slice(all.indexOf(from), all.indexOf(to) + 1);
}

/**
 * Stored rows for a computed schedule. A row keeps its id, its reason and its version while most of its stories stay together:
 * pairs of old and new bands of one wall are taken by the number of stories they share, overwritten ones first. The version moves
 * with band limits and overwritten cells only. An overwritten row whose stories are all gone stays, behind the others.
 */
export function matchBands(
  records: readonly ScheduleRecord[],
  { schedule, rows }: Computed,
  tables: Pick<Tables, 'levels' | 'walls'>,
  key: string,
  newId: () => string,
): ScheduleRecord[] {
  const walls = wallStories(tables);
  const bands = rows.map((row, place): Band => {
    return { row, place, stories: storiesBetween(walls.get(row.wall) ?? [], row.from, row.to) };
  });
  const pairs = records.flatMap((record) =>
    bands
      .filter((band) => band.row.wall === record.wall)
      .map((band) => ({
        record,
        band,
        shared: record.stories.filter((level) => band.stories.includes(level)).length,
        own: Object.keys(record.own).length > 0 ? 1 : 0,
      }))
      .filter((pair) => pair.shared > 0),
  );
  pairs.sort((a, b) => b.own - a.own || b.shared - a.shared || a.band.place - b.band.place);
  const recordOf = new Map<number, ScheduleRecord>();
  const used = new Set<string>();
  for (const { record, band } of pairs) {
    if (recordOf.has(band.place) || used.has(record.id)) continue;
    recordOf.set(band.place, record);
    used.add(record.id);
  }
  const standing = bands.map(({ row, place, stories }): ScheduleRecord => {
    const old = recordOf.get(place);
    const own = ownCells(row.cells, row.overwritten);
    const sameBand = old !== undefined && old.fromLevel === row.from && old.toLevel === row.to;
    const sameOwn =
      old !== undefined && JSON.stringify(Object.keys(old.own).sort()) === JSON.stringify(Object.keys(own).sort());
    return {
      id: old?.id ?? newId(),
      wall: row.wall,
      fromLevel: row.from,
      toLevel: row.to,
      position: place,
      stories,
      auto: row.automatic,
      own,
      reason: Object.keys(own).length > 0 ? (old?.reason ?? null) : null,
      ratio: row.ratio,
      ok: row.ok,
      governing: schedule[place]?.governs ?? null,
      computedKey: key,
      version: old === undefined ? 1 : old.version + (sameBand && sameOwn ? 0 : 1),
    };
  });
  const left = records
    .filter((record) => !used.has(record.id) && Object.keys(record.own).length > 0)
    .map((record, place) => ({ ...record, position: bands.length + place, computedKey: key }));
  return [...standing, ...left];
}
