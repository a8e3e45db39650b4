import type { UnitSystem } from '../input.ts';
import { kilogramsPerPound, millimetersPerInch } from '../units.ts';

/** A reinforcing bar by ASTM A615/A615M: nominal diameter, nominal area and mass, in engine units. */
export interface Bar {
  readonly number: number;
  readonly diameterIn: number;
  readonly areaIn2: number;
  readonly massLbPerIn: number;
}

/** number, diameter in, area in2, weight lb/ft (inch-pound bars, ASTM A615) */
const inchPound: readonly (readonly [number, number, number, number])[] = [
  [3, 0.375, 0.11, 0.376],
  [4, 0.5, 0.2, 0.668],
  [5, 0.625, 0.31, 1.043],
  [6, 0.75, 0.44, 1.502],
  [7, 0.875, 0.6, 2.044],
  [8, 1, 0.79, 2.67],
  [9, 1.128, 1, 3.4],
  [10, 1.27, 1.27, 4.303],
  [11, 1.41, 1.56, 5.313],
  [14, 1.693, 2.25, 7.65],
  [18, 2.257, 4, 13.6],
];

/** number, diameter mm, area mm2, mass kg/m (soft-metric bars, ASTM A615M); No. 16 is 199 mm2 as printed, not 0.31 in2 */
const softMetric: readonly (readonly [number, number, number, number])[] = [
  [10, 9.5, 71, 0.56],
  [13, 12.7, 129, 0.994],
  [16, 15.9, 199, 1.552],
  [19, 19.1, 284, 2.235],
  [22, 22.2, 387, 3.042],
  [25, 25.4, 510, 3.973],
  [29, 28.7, 645, 5.06],
  [32, 32.3, 819, 6.404],
  [36, 35.8, 1006, 7.907],
  [43, 43, 1452, 11.38],
  [57, 57.3, 2581, 20.24],
];

const mm2PerIn2 = millimetersPerInch * millimetersPerInch;

/** The bars of each unit system, smallest first. Areas stay exact as tabulated: a soft-metric bar is converted, never swapped for its inch twin. */
export const barTables: Readonly<Record<UnitSystem, readonly Bar[]>> = {
  us: inchPound.map(([number, diameterIn, areaIn2, lbPerFt]) => ({
    number,
    diameterIn,
    areaIn2,
    massLbPerIn: lbPerFt / 12,
  })),
  si: softMetric.map(([number, mm, mm2, kgPerM]) => ({
    number,
    diameterIn: mm / millimetersPerInch,
    areaIn2: mm2 / mm2PerIn2,
    massLbPerIn: (kgPerM / kilogramsPerPound) * (millimetersPerInch / 1000),
  })),
};

const byNumber: Readonly<Record<UnitSystem, ReadonlyMap<number, Bar>>> = {
  us: new Map(barTables.us.map((bar) => [bar.number, bar])),
  si: new Map(barTables.si.map((bar) => [bar.number, bar])),
};

/** The bar of that number, or null where the system has none (contracts refuse such numbers before design). */
export function barOrNull(units: UnitSystem, number: number): Bar | null {
  return byNumber[units].get(number) ?? null;
}

/** The bar of that number; throws where the system has none, naming number and system. */
export function findBar(units: UnitSystem, number: number): Bar {
  const bar = byNumber[units].get(number);
  if (!bar) throw new Error(`no bar No. ${number} in ${units} units`);
  return bar;
}
