import type { Settings } from '../engineering/input.ts';

export const buildingStates = ['in progress', 'ready for check', 'checked'] as const;
export type BuildingState = (typeof buildingStates)[number];

/** GET /api/buildings/:id: building.json with defaults filled in, plus what the office knows of it. */
export type BuildingResource = Omit<Settings, 'given'> & {
  readonly id: string;
  readonly state: BuildingState;
  readonly seq: number;
  readonly version: number;
};

/** GET /api/buildings: {rows} of these; `elevation` is what the little drawing needs. */
export interface BuildingListRow {
  readonly id: string;
  readonly name: string;
  readonly number: string;
  readonly units: 'us' | 'si';
  readonly code: string;
  readonly state: BuildingState;
  readonly seq: number;
  readonly version: number;
  readonly levels: number;
  readonly walls: number;
  readonly changedAt: string;
  readonly changedBy: string | null;
}
