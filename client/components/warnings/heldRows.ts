import type { ResultDocument, ResultRow } from '#shared/contracts/result';
import type { Warning } from '#shared/engineering/input';

type Row = Pick<ResultRow, 'wall' | 'from' | 'to'>;
type Levels = ResultDocument['levels'];

const elevationOf = (levels: Levels, name: string | undefined): number | null =>
  levels.find((level) => level.level === name)?.elevation ?? null;

/** Whether a warning keeps a row of the schedule from reading ok, by the rule that the engine goes by. */
export function holdsRow(warning: Warning, row: Row, levels: Levels): boolean {
  if (warning.code === 'ordinary-class') return true;
  if (warning.code === 'opening-solid') return warning.wall === row.wall;
  if (warning.code === 'transfer-not-assigned') {
    // what arrives on a floor is missing in the stories below it, in whichever wall should take it
    const [foot, arrival] = [elevationOf(levels, row.from), elevationOf(levels, warning.level)];
    return foot !== null && arrival !== null && foot <= arrival;
  }
  return false;
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

/** Warnings with those that hold rows first, otherwise in the order of the engine. Drift has a note of its own. */
export function weighWarnings(
  document: Pick<ResultDocument, 'warnings' | 'levels' | 'schedule'>,
): readonly WeighedWarning[] {
  const others = document.warnings.filter((warning) => warning.code !== 'drift-not-available');
  const weighed = others.map((warning) => ({
    warning,
    holds: document.schedule.filter((row) => holdsRow(warning, row, document.levels)).length,
  }));
  return [...weighed.filter((one) => one.holds > 0), ...weighed.filter((one) => one.holds === 0)];
}
