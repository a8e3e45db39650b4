import type { UnitSystem } from './input.ts';

/**
 * The one internal unit system (kip, inch, ksi; f'c in psi) and the only conversion factors in the product.
 * Exact by definition: 1 in = 25.4 mm, 1 lbf = 4.4482216152605 N (ISO 80000; also 1 lb = 0.45359237 kg).
 */
export const millimetersPerInch = 25.4;
export const newtonsPerPound = 4.4482216152605;
export const kilogramsPerPound = 0.45359237;

export const inchesPerFoot = 12;
export const poundsPerKip = 1000;
export const psiPerKsi = 1000;
/** 1 psi in MPa = N/mm2 */
export const megapascalsPerPsi = newtonsPerPound / (millimetersPerInch * millimetersPerInch);
/** 1 kip in kN */
export const kilonewtonsPerKip = newtonsPerPound;
/** 1 m in inches */
export const inchesPerMeter = 1000 / millimetersPerInch;
/** 1 pcf in kN/m3 */
export const kilonewtonsPerCubicMeterPerPcf =
  newtonsPerPound / ((12 * millimetersPerInch * 12 * millimetersPerInch * 12 * millimetersPerInch) / 1e6);

/** Factor from the building's own unit to the internal one: `value * factor`. */
export interface UnitFactors {
  /** ft or m to in */
  readonly planLength: number;
  /** in or mm to in */
  readonly barLength: number;
  /** ft2 or m2 to in2 */
  readonly area: number;
  /** kip or kN to kip */
  readonly force: number;
  /** kip-ft or kN-m to kip-in */
  readonly moment: number;
  /** psi or MPa to psi */
  readonly concreteStrength: number;
  /** ksi or MPa to ksi */
  readonly steelStrength: number;
  /** pcf or kN/m3 to pcf */
  readonly density: number;
  /** kip/in or kN/mm to kip/in */
  readonly stiffness: number;
  /** yd3 or m3 to in3 */
  readonly volume: number;
  /** lb or kg to lb */
  readonly mass: number;
}

const us: UnitFactors = {
  planLength: inchesPerFoot,
  barLength: 1,
  area: inchesPerFoot * inchesPerFoot,
  force: 1,
  moment: inchesPerFoot,
  concreteStrength: 1,
  steelStrength: 1,
  density: 1,
  stiffness: 1,
  volume: 36 * 36 * 36,
  mass: 1,
};

const si: UnitFactors = {
  planLength: inchesPerMeter,
  barLength: 1 / millimetersPerInch,
  area: inchesPerMeter * inchesPerMeter,
  force: 1 / kilonewtonsPerKip,
  moment: inchesPerMeter / kilonewtonsPerKip,
  concreteStrength: 1 / megapascalsPerPsi,
  steelStrength: 1 / (megapascalsPerPsi * psiPerKsi),
  density: 1 / kilonewtonsPerCubicMeterPerPcf,
  stiffness: millimetersPerInch / kilonewtonsPerKip,
  volume: inchesPerMeter * inchesPerMeter * inchesPerMeter,
  mass: 1 / kilogramsPerPound,
};

export const unitFactors: Readonly<Record<UnitSystem, UnitFactors>> = { us, si };

/** What a CSV header's unit measures and how many of the base unit (m, m2, N, N-m, Pa, N/m3) one of it is. */
export type HeaderDimension = 'length' | 'area' | 'force' | 'moment' | 'stress' | 'density';

const inch = millimetersPerInch / 1000;
const foot = 12 * inch;
const lbf = newtonsPerPound;
const kip = 1000 * lbf;

/** Units a CSV header may name in brackets or parentheses, in base SI units. Keys are compared as written, after trimming. */
export const headerUnits: Readonly<Record<string, { readonly dimension: HeaderDimension; readonly inBase: number }>> = {
  in: { dimension: 'length', inBase: inch },
  ft: { dimension: 'length', inBase: foot },
  mm: { dimension: 'length', inBase: 0.001 },
  cm: { dimension: 'length', inBase: 0.01 },
  m: { dimension: 'length', inBase: 1 },
  in2: { dimension: 'area', inBase: inch * inch },
  ft2: { dimension: 'area', inBase: foot * foot },
  mm2: { dimension: 'area', inBase: 1e-6 },
  m2: { dimension: 'area', inBase: 1 },
  lb: { dimension: 'force', inBase: lbf },
  kip: { dimension: 'force', inBase: kip },
  N: { dimension: 'force', inBase: 1 },
  kN: { dimension: 'force', inBase: 1000 },
  MN: { dimension: 'force', inBase: 1e6 },
  'kip-ft': { dimension: 'moment', inBase: kip * foot },
  'kip-in': { dimension: 'moment', inBase: kip * inch },
  'kN-m': { dimension: 'moment', inBase: 1000 },
  'kN·m': { dimension: 'moment', inBase: 1000 },
  psi: { dimension: 'stress', inBase: lbf / (inch * inch) },
  ksi: { dimension: 'stress', inBase: kip / (inch * inch) },
  MPa: { dimension: 'stress', inBase: 1e6 },
  psf: { dimension: 'stress', inBase: lbf / (foot * foot) },
  kPa: { dimension: 'stress', inBase: 1000 },
  pcf: { dimension: 'density', inBase: lbf / (foot * foot * foot) },
  'kN/m3': { dimension: 'density', inBase: 1000 },
};
