import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument } from '#shared/contracts/result';
import type { Basis } from '#shared/engineering/input';
import { formatForce } from '#shared/format/force';

import { gravityCases } from './wallStories.ts';

const isGravity = (name: string): boolean => gravityCases.some((one) => one === name);

/** Gravity brought in against what stands at the foot of the walls, all gravity cases together. */
export function sayGravityBalance(document: ResultDocument, basis: Basis, lowest: string): string {
  const lines = document.balance
    .filter((one) => one.level === lowest && one.basis === basis && isGravity(one.case))
    .flatMap((one) => one.lines.filter(({ line }) => line === 'vertical'));
  if (lines.length === 0) return '';
  const applied = lines.reduce((sum, line) => sum + line.applied, 0);
  const resisted = lines.reduce((sum, line) => sum + line.resisted, 0);
  return `Gravity in ${formatForce(applied)}, out ${formatForce(resisted)} ${unitLabels.force[document.units]}.`;
}
