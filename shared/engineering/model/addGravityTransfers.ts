import type { GravityColumns, LoadCase, Override } from './model.ts';
import { gravityCases } from './model.ts';

/**
 * Transfers typed for D, L, Lr or S enter the gravity of their level and go down with it: what a wall that starts above the base brings is
 * listed by case, gravity cases with it, and an engineer assigns it by case (engineering.md section 4). Live load that is handed over so
 * is not reduced. A case of forces.csv of the same name comes first.
 */
export function addGravityTransfers(
  gravity: GravityColumns,
  overrides: readonly Override[],
  cases: readonly LoadCase[],
  walls: number,
): void {
  for (const { kind, caseName, story, wallIndex, axialKip, momentKipIn } of overrides) {
    if (kind !== 'transfer' || cases.some(({ name }) => name === caseName)) continue;
    const name = gravityCases.find((candidate) => candidate === caseName);
    if (name === undefined) continue;
    const at = story * walls + wallIndex;
    gravity.axialKip[name][at] = (gravity.axialKip[name][at] ?? 0) + axialKip;
    gravity.momentKipIn[name][at] = (gravity.momentKipIn[name][at] ?? 0) + momentKipIn;
  }
}
