/**
 * Own conversions of the independent check, to newtons and meters. Exact by definition: 1 in = 0.0254 m,
 * 1 lbf = 0.45359237 kg x 9.80665 m/s2.
 */
export const inch = 0.0254;
export const foot = 0.3048;
export const pound = 0.45359237 * 9.80665;
export const kip = 1000 * pound;
export const psi = pound / inch ** 2;

const headerUnits = {
  in: inch,
  ft: foot,
  mm: 1e-3,
  cm: 1e-2,
  m: 1,
  in2: inch ** 2,
  ft2: foot ** 2,
  mm2: 1e-6,
  m2: 1,
  lb: pound,
  kip,
  N: 1,
  kN: 1e3,
  MN: 1e6,
  'kip-ft': kip * foot,
  'kip-in': kip * inch,
  'kN-m': 1e3,
  'kN·m': 1e3,
  psi,
  ksi: 1000 * psi,
  MPa: 1e6,
  psf: pound / foot ** 2,
  kPa: 1e3,
  pcf: pound / foot ** 3,
  'kN/m3': 1e3,
};

/** Newton-meter size of one unit of each quantity in the building's own system. */
export const ownUnits = {
  us: {
    length: foot,
    thickness: inch,
    area: foot ** 2,
    force: kip,
    moment: kip * foot,
    strength: psi,
    steel: 1000 * psi,
    density: pound / foot ** 3,
    stiffness: kip / inch,
  },
  si: {
    length: 1,
    thickness: 1e-3,
    area: 1,
    force: 1e3,
    moment: 1e3,
    strength: 1e6,
    steel: 1e6,
    density: 1e3,
    stiffness: 1e6,
  },
};

export function headerUnit(name) {
  const size = headerUnits[name];
  if (size === undefined) throw new Error(`unit ${name} is not known here`);
  return size;
}
