import type { ResultDocument, ResultRow } from '#shared/contracts/result';
import type { Warning } from '#shared/engineering/input';

type Row = Pick<ResultRow, 'wall' | 'from' | 'to'>;
type Levels = ResultDocument['levels'];

const elevationOf = (levels: Levels, name: string | undefined): number | null =>
  levels.find((level) => level.level === name)?.elevation ?? null;

/** Whether a warning keeps a row of the schedule from reading ok: it names walls and stories, and nobody has settled it. */
export function holdsRow({ holds, settled }: Warning, row: Row, levels: Levels): boolean {
  if (holds === undefined || settled) return false;
  if (holds.walls !== null && !holds.walls.includes(row.wall)) return false;
  const [foot, top] = [elevationOf(levels, row.from), elevationOf(levels, row.to)];
  const [from, to] = [elevationOf(levels, holds.from), elevationOf(levels, holds.to)];
  if (foot === null || top === null || from === null || to === null) return false;
  return foot <= to && top >= from;
}

/** Why a row is not settled, each reason in words. */
export function reasonsOf(
  row: Row & Pick<ResultRow, 'notDesigned'>,
  { warnings, levels }: Pick<ResultDocument, 'warnings' | 'levels'>,
): readonly string[] {
  const open = row.notDesigned.map((part) => `Not designed: ${part}.`);
  const held = warnings.filter((warning) => holdsRow(warning, row, levels)).map((warning) => warning.message);
  return [...new Set([...open, ...held])];
}

export interface WeighedWarning {
  readonly warning: Warning;
  /** rows that wait for it */
  readonly holds: number;
}

/**
 * Warnings with those that hold rows first, then those that held some until they were settled, otherwise in the order of the engine: what
 * was just accepted stays where it can be seen. Drift has a note of its own.
 */
export function weighWarnings(
  document: Pick<ResultDocument, 'warnings' | 'levels' | 'schedule'>,
): readonly WeighedWarning[] {
  const others = document.warnings.filter((warning) => warning.code !== 'drift-not-available');
  const weighed = others.map((warning) => ({
    warning,
    holds: document.schedule.filter((row) => holdsRow(warning, row, document.levels)).length,
  }));
  const rank = ({ warning, holds }: WeighedWarning): number => (holds > 0 ? 0 : warning.holds ? 1 : 2);
  return [0, 1, 2].flatMap((place) => weighed.filter((one) => rank(one) === place));
}
