import type { SettingProblem } from '#shared/contracts/notDesignedYet';

import { HttpError } from '../../http/HttpError.ts';

/** All problems of a building.json; settings whose work is not built say so in the code. */
export function settingsRefusal(problems: readonly SettingProblem[]): HttpError {
  const notYet = problems.some((problem) => problem.code === 'not-designed-yet');
  return new HttpError(
    422,
    notYet ? 'not-designed-yet' : 'problems',
    notYet ? 'A setting asks for work that is not designed yet.' : 'The settings have problems.',
    { problems: problems.map((problem) => ({ table: 'building', row: null, ...problem })) },
  );
}
