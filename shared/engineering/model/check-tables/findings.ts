import type { Problem, TableName, UnitSystem, Warning } from '../../input.ts';

/** What the checks across cells and tables gather. */
export class Findings {
  readonly problems: Problem[] = [];
  readonly notices: Warning[] = [];

  /** `index` is the row's place in its table, 0 for the first. */
  refuse(table: TableName, index: number, column: string, message: string): void {
    this.problems.push({ table, row: index + 1, column, message });
  }
}

export interface CheckResult {
  readonly problems: readonly Problem[];
  readonly notices: readonly Warning[];
}

/** 1 mm or 1/16 in, in the unit of plan and heights (engineering.md section 1): m or ft. */
export const geometryTolerance: Readonly<Record<UnitSystem, number>> = { us: 1 / 16 / 12, si: 0.001 };

/** Names in a message: the first few, then how many more. */
export function listNames(names: readonly string[]): string {
  const shown = names.slice(0, 6).join(', ');
  return names.length > 6 ? `${shown} and ${names.length - 6} more` : shown;
}
