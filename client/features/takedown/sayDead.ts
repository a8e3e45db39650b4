import { unitLabels } from '#shared/contracts/quantities';
import type { GravityRow, UnitSystem } from '#shared/engineering/input';
import { formatForce } from '#shared/format/force';

/** Dead load at the foot of a wall taken apart: typed at its levels, self-weight once, assigned with transfers in the rest. */
export function sayDead(
  deadAtFoot: number,
  gravity: readonly GravityRow[],
  wall: string,
  selfWeight: boolean,
  units: UnitSystem,
): string {
  const typed = gravity.reduce((sum, row) => (row.wall === wall ? sum + row.dead : sum), 0);
  const unit = unitLabels.force[units];
  const whole = `${wall}: dead ${formatForce(deadAtFoot)} ${unit} at its foot, ${formatForce(typed)} of it typed`;
  return selfWeight
    ? `${whole}, ${formatForce(deadAtFoot - typed)} self-weight, counted once.`
    : `${whole}; self-weight is off.`;
}
