import type { ResultLevel } from '#shared/contracts/result';
import type { UnitSystem } from '#shared/engineering/input';
import { formatShare } from '#shared/format/force';
import { formatPlanLength } from '#shared/format/length';

/** Distance between the centers in both directions, and as part of the extent. */
export function sayCenters(level: ResultLevel, massName: string, units: UnitSystem): string {
  if (level.rigidity === null) return `Story of ${level.level}: no center of rigidity.`;
  const unit = units === 'us' ? 'ft' : 'm';
  const [ex, ey] = [level.rigidity.x - level.point.x, level.rigidity.y - level.point.y];
  const part = (distance: number, axis: string): string =>
    `${formatPlanLength(Math.abs(distance), units)} ${unit} toward ${distance < 0 ? '−' : '+'}${axis}`;
  const shares = `${formatShare(Math.abs(ex) / level.extent.x)} and ${formatShare(Math.abs(ey) / level.extent.y)}`;
  return `Story of ${level.level}: center of rigidity ${part(ex, 'x')} and ${part(ey, 'y')} of the ${massName}, ${shares} of the extent.`;
}
