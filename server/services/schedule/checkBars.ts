import type { ApiProblem } from '#shared/contracts/errors';
import type { SchedulePatch } from '#shared/contracts/schedule';
import { barSizes, spacingLimits } from '#shared/contracts/settingsDefaults';
import type { UnitSystem } from '#shared/engineering/input';

import { HttpError } from '../../http/HttpError.ts';

/** Bars that do not exist in the building's units, and spacings that no bar is placed at, are refused. */
export function checkBars(patch: SchedulePatch, units: UnitSystem): void {
  const sizes = barSizes[units];
  const [least, most, unit] = spacingLimits[units];
  const problems: ApiProblem[] = [];
  const refuse = (column: string, message: string): void => {
    problems.push({ table: 'schedule', row: null, column, message });
  };
  for (const cell of ['vertical', 'horizontal', 'ends', 'ties'] as const) {
    const bar = patch[cell]?.bar;
    if (bar === undefined || sizes.includes(bar)) continue;
    refuse(`${cell}.bar`, `bar reads ${bar}, expected one of ${sizes.join(' ')} (units ${units})`);
  }
  for (const cell of ['vertical', 'horizontal', 'ties'] as const) {
    const spacing = patch[cell]?.spacing;
    if (spacing === undefined || (spacing >= least && spacing <= most)) continue;
    refuse(`${cell}.spacing`, `spacing reads ${spacing}, expected ${least} to ${most} ${unit}`);
  }
  if (problems.length > 0) {
    throw new HttpError(422, 'invalid', 'Bars can not be placed so in these units.', { problems });
  }
}
