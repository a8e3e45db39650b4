const raised: Readonly<Record<string, string>> = { '2': '²', '3': '³' };

/** A unit as sheets print it: `m2` reads `m²`, `kN/m3` reads `kN/m³`; files keep the plain letters. */
export const printedUnit = (unit: string): string => unit.replace(/[23]$/, (power) => raised[power] ?? power);
