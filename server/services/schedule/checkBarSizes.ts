import type { ApiProblem } from '#shared/contracts/errors';
import type { SchedulePatch } from '#shared/contracts/schedule';
import { barSizes } from '#shared/contracts/settingsDefaults';
import type { UnitSystem } from '#shared/engineering/input';

import { HttpError } from '../../http/HttpError.ts';

/** Bars that do not exist in the building's units are refused. */
export function checkBarSizes(patch: SchedulePatch, units: UnitSystem): void {
  const sizes = barSizes[units];
  const problems = (['vertical', 'horizontal', 'ends', 'ties'] as const).flatMap((cell): ApiProblem[] => {
    const bar = patch[cell]?.bar;
    if (bar === undefined || sizes.includes(bar)) return [];
    const message = `bar reads ${bar}, expected one of ${sizes.join(' ')} (units ${units})`;
    return [{ table: 'schedule', row: null, column: `${cell}.bar`, message }];
  });
  if (problems.length > 0) throw new HttpError(422, 'invalid', 'A bar does not exist in these units.', { problems });
}
