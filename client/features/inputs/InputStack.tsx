import type { StoredRow } from '#shared/contracts/tables';
import { formatNumber } from '#shared/format/number';

import { Stack } from '../../components/drawing/Stack.tsx';
import type { ElevationView } from '../../data/elevationView.ts';

export interface InputStackProps {
  readonly view: ElevationView;
  readonly forces: readonly StoredRow<'forces'>[];
  readonly units: 'us' | 'si';
  readonly case: string | null;
  readonly chosen: string | null;
  readonly chosenWall: string | null;
  readonly onChoose: (level: string) => void;
}

/** Force of one case at each level, in the direction in which the case is larger. */
export function forceByLevel(
  forces: readonly StoredRow<'forces'>[],
  wanted: string | null,
): { readonly case: string; readonly byLevel: ReadonlyMap<string, number> } | null {
  const first = forces[0];
  if (first === undefined) return null;
  const name = forces.some((row) => row.case === wanted) && wanted !== null ? wanted : first.case;
  const ofCase = forces.filter((row) => row.case === name);
  const sum = (direction: 'fx' | 'fy') => ofCase.reduce((total, row) => total + Math.abs(row[direction]), 0);
  const direction = sum('fx') >= sum('fy') ? 'fx' : 'fy';
  const byLevel = new Map<string, number>();
  for (const row of ofCase) byLevel.set(row.level, (byLevel.get(row.level) ?? 0) + row[direction]);
  return { case: name, byLevel };
}

export function InputStack({ view, forces, units, case: wanted, chosen, chosenWall, onChoose }: InputStackProps) {
  const force = forceByLevel(forces, wanted);
  const stories = view.stories.map((story) => {
    const value = force?.byLevel.get(story.level) ?? null;
    return { ...story, value, text: value === null ? '' : formatNumber(value, 1) };
  });
  return (
    <Stack
      stories={stories}
      walls={view.walls}
      caption={force === null ? 'Levels' : `Force ${force.case} at the level`}
      unit={force === null ? '' : units === 'us' ? 'kip' : 'kN'}
      units={units}
      chosen={chosen}
      chosenWall={chosenWall}
      onChoose={onChoose}
    />
  );
}
