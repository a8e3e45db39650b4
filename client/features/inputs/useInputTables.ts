import { useMemo } from 'react';

import { useTable } from '../../data/queries.ts';
import type { AllRows } from './tableSummary.ts';

const none: readonly never[] = [];

/** The six tables of a building: the queries, and the rows that are there so far. */
export function useInputTables(id: string) {
  const levels = useTable(id, 'levels');
  const walls = useTable(id, 'walls');
  const forces = useTable(id, 'forces');
  const gravity = useTable(id, 'gravity');
  const combinations = useTable(id, 'combinations');
  const overrides = useTable(id, 'overrides');
  const rows = useMemo<AllRows>(
    () => ({
      levels: levels.data?.rows ?? none,
      walls: walls.data?.rows ?? none,
      forces: forces.data?.rows ?? none,
      gravity: gravity.data?.rows ?? none,
      combinations: combinations.data?.rows ?? none,
      overrides: overrides.data?.rows ?? none,
    }),
    [levels.data, walls.data, forces.data, gravity.data, combinations.data, overrides.data],
  );
  return { queries: { levels, walls, forces, gravity, combinations, overrides }, rows };
}
