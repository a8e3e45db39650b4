import { useMemo } from 'react';

import type { BuildingInput } from '#shared/engineering/input';

import { useBuilding, useTable } from '../data/queries.ts';
import { buildingInput } from './buildingInput.ts';

/** Everything the engine starts from, once all of it is here; null until then. */
export function useBuildingInput(id: string): BuildingInput | null {
  const building = useBuilding(id).data;
  const levels = useTable(id, 'levels').data;
  const walls = useTable(id, 'walls').data;
  const forces = useTable(id, 'forces').data;
  const gravity = useTable(id, 'gravity').data;
  const combinations = useTable(id, 'combinations').data;
  const overrides = useTable(id, 'overrides').data;
  return useMemo(() => {
    if (!building || !levels || !walls || !forces || !gravity || !combinations || !overrides) return null;
    return buildingInput(building, { levels, walls, forces, gravity, combinations, overrides });
  }, [building, levels, walls, forces, gravity, combinations, overrides]);
}
