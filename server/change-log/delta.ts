import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue } from '#shared/contracts/tables';

import type { AcknowledgmentState } from '../db/repositories/AcknowledgmentRepository.ts';

/** The changed cells of one row; `position` stands among them where the row is new, gone or moved. Null: no such row. */
export type RowState = Readonly<Record<string, CellValue>> | null;
export type TableState = Readonly<Record<string, RowState>>;

/** Overwritten cells of a schedule row: {value} or null where automatic choice stands. */
export interface ScheduleState {
  readonly own: Readonly<Record<string, { readonly value: unknown } | null>>;
  readonly reason: string | null;
}

export interface Rename {
  readonly kind: 'level' | 'wall' | 'case';
  readonly from: string;
  readonly to: string;
}

/** One side of an edit: what the change log keeps before and after, and what undo turns around. */
export interface DeltaSide {
  readonly tables?: Readonly<Partial<Record<EditableTable, TableState>>>;
  readonly schedule?: Readonly<Record<string, ScheduleState>>;
  /** building.json as typed */
  readonly settings?: Readonly<Record<string, unknown>>;
  /** by id; null: no such acknowledgment */
  readonly acknowledgments?: Readonly<Record<string, AcknowledgmentState | null>>;
  /** names of schedule rows follow without a guard */
  readonly renames?: readonly Rename[];
}

export interface Delta {
  readonly before: DeltaSide;
  readonly after: DeltaSide;
}

/** What an edit touched: names of tables, `schedule`, `settings`, `acknowledgments`. */
export function targetsOf(side: DeltaSide): string[] {
  const targets: string[] = Object.keys(side.tables ?? {});
  if (side.schedule !== undefined) targets.push('schedule');
  if (side.settings !== undefined) targets.push('settings');
  if (side.acknowledgments !== undefined) targets.push('acknowledgments');
  return targets;
}

export const isEmpty = (delta: Delta): boolean => targetsOf(delta.after).length === 0;
