import { unitLabels } from '../contracts/quantities.ts';
import type { UnitSystem } from '../engineering/input.ts';
import { unitFactors } from '../engineering/units.ts';
import type { CheckQuantity } from '../engineering/wall-design/designTypes.ts';

/** Unit of a check's numbers in a section file's system, and how many engine units (kip, in, psi) one of it is. */
export function sectionCheckUnit(quantity: CheckQuantity, system: UnitSystem): { unit: string; factor: number } {
  const factors = unitFactors[system];
  switch (quantity) {
    case 'force':
      return { unit: unitLabels.force[system], factor: factors.force };
    case 'moment':
      return { unit: unitLabels.moment[system], factor: factors.moment };
    case 'barLength':
      return { unit: unitLabels.thickness[system], factor: factors.barLength };
    case 'stress':
      return { unit: unitLabels.concreteStrength[system], factor: factors.concreteStrength };
    case 'steelRatio':
    case 'count':
    case 'none':
      return { unit: '', factor: 1 };
  }
}
