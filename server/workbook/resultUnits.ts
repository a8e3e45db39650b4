import type { UnitSystem } from '#shared/engineering/input';

/** Units of the result document, as printed in headers: contract, `result.json`. */
export interface ResultUnits {
  readonly planLength: string;
  readonly barLength: string;
  readonly force: string;
  readonly moment: string;
  readonly stiffness: string;
  readonly concreteStrength: string;
  readonly steelStrength: string;
  readonly density: string;
  readonly volume: string;
  readonly mass: string;
  readonly rate: string;
}

export const resultUnits: Readonly<Record<UnitSystem, ResultUnits>> = {
  us: {
    planLength: 'ft',
    barLength: 'in',
    force: 'kip',
    moment: 'kip-ft',
    stiffness: 'kip/in',
    concreteStrength: 'psi',
    steelStrength: 'ksi',
    density: 'pcf',
    volume: 'yd³',
    mass: 'lb',
    rate: 'lb/yd³',
  },
  si: {
    planLength: 'm',
    barLength: 'mm',
    force: 'kN',
    moment: 'kN-m',
    stiffness: 'kN/mm',
    concreteStrength: 'MPa',
    steelStrength: 'MPa',
    density: 'kN/m³',
    volume: 'm³',
    mass: 'kg',
    rate: 'kg/m³',
  },
};

export const codeNames = { 'aci318-19': 'ACI 318-19', 'aci318-14': 'ACI 318-14' } as const;
export const loadNames = { 'asce7-22': 'ASCE 7-22', 'asce7-16': 'ASCE 7-16' } as const;
export const unitSystemNames = { us: 'US', si: 'SI' } as const;
