import type { UnitSystem } from '../input.ts';
import { inchesPerFoot, inchesPerMeter, kilonewtonsPerKip, megapascalsPerPsi } from '../units.ts';

/** Amounts in a warning's sentence, in the building's own units. */
export const sayLength = (lengthIn: number, units: UnitSystem): string =>
  units === 'si' ? `${(lengthIn / inchesPerMeter).toFixed(2)} m` : `${(lengthIn / inchesPerFoot).toFixed(1)} ft`;

export const sayStress = (stressPsi: number, units: UnitSystem): string =>
  units === 'si' ? `${(stressPsi * megapascalsPerPsi).toFixed(2)} MPa` : `${stressPsi.toFixed(0)} psi`;

export const sayForce = (forceKip: number, units: UnitSystem): string =>
  units === 'si' ? `${(forceKip * kilonewtonsPerKip).toFixed(0)} kN` : `${forceKip.toFixed(1)} kip`;

export const sayPercent = (part: number): string => `${(100 * part).toFixed(0)} %`;

/** Names in a sentence: all of a few, else the first and a count. */
export function sayNames(names: readonly string[]): string {
  if (names.length > 6) return `${names.slice(0, 5).join(', ')} and ${names.length - 5} more`;
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;
}
