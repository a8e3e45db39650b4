import type { UnitSystem } from '../engineering/input.ts';

import type { Quantity } from './tableColumns.ts';

/** The unit of each quantity in the building's own system, as printed in headers. */
export const unitLabels: Readonly<Record<Quantity, Readonly<Record<UnitSystem, string>>>> = {
  length: { us: 'ft', si: 'm' },
  thickness: { us: 'in', si: 'mm' },
  area: { us: 'ft2', si: 'm2' },
  force: { us: 'kip', si: 'kN' },
  moment: { us: 'kip-ft', si: 'kN-m' },
  concreteStrength: { us: 'psi', si: 'MPa' },
  steelStrength: { us: 'ksi', si: 'MPa' },
  density: { us: 'pcf', si: 'kN/m3' },
  fraction: { us: '', si: '' },
  plain: { us: '', si: '' },
};
