import type { OverwritableCell, OwnCells } from '#shared/engineering/wall-design/designTypes';

/** What a person did to one row: cells of their own, or cells given back to the automatic choice. */
export interface ScheduleChange {
  readonly rowId: string;
  readonly own?: OwnCells;
  readonly release?: readonly OverwritableCell[];
}
