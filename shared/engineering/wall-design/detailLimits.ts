import type { UnitSystem } from '../input.ts';
import { millimetersPerInch } from '../units.ts';

/** Lengths that the standard prints as round numbers, in inches; SI buildings use the round numbers of the metric edition. */
export interface DetailLimits {
  /** the building's own bar length (in or mm) to inches */
  readonly toIn: number;
  /** 18 in or 450 mm (11.7.2.1, 11.7.3.1) */
  readonly spacingIn: number;
  /** 10 in or 250 mm: thicker walls take two curtains (11.7.2.3) */
  readonly oneCurtainThicknessIn: number;
  /** 4 in or 100 mm (Table 11.3.1.1) */
  readonly leastThicknessIn: number;
  /** 12 in or 300 mm: least development and lap (25.4.2.1, 25.5.2.1) */
  readonly leastDevelopmentIn: number;
  /** 6 in or 150 mm: least hook (25.4.3.1), farthest unsupported bar (25.7.2.3) */
  readonly sixIn: number;
  /** 1.5 in or 40 mm clear between vertical bars (25.2.3) */
  readonly clearIn: number;
  /** lengths for the site round up to whole inches or 10 mm; own units */
  readonly lengthStep: number;
  /** end-zone lengths grow in steps of 2 in or 50 mm; own units */
  readonly endZoneStep: number;
  /** longest stock bar, common practice: 60 ft or 18 m */
  readonly stockIn: number;
  /** larger vertical bars are coupled, not lapped (25.5.1.1): No. 11, soft-metric No. 36 */
  readonly largestLappedBar: number;
  /** Table 11.6.1: No. 5, soft-metric No. 16 */
  readonly smallBar: number;
}

export const detailLimits: Readonly<Record<UnitSystem, DetailLimits>> = {
  us: {
    toIn: 1,
    spacingIn: 18,
    oneCurtainThicknessIn: 10,
    leastThicknessIn: 4,
    leastDevelopmentIn: 12,
    sixIn: 6,
    clearIn: 1.5,
    lengthStep: 1,
    endZoneStep: 2,
    stockIn: 720,
    largestLappedBar: 11,
    smallBar: 5,
  },
  si: {
    toIn: 1 / millimetersPerInch,
    spacingIn: 450 / millimetersPerInch,
    oneCurtainThicknessIn: 250 / millimetersPerInch,
    leastThicknessIn: 100 / millimetersPerInch,
    leastDevelopmentIn: 300 / millimetersPerInch,
    sixIn: 150 / millimetersPerInch,
    clearIn: 40 / millimetersPerInch,
    lengthStep: 10,
    endZoneStep: 50,
    stockIn: 18000 / millimetersPerInch,
    largestLappedBar: 36,
    smallBar: 16,
  },
};

/** A length in inches rounded up to the site's step, in the building's own unit; a sliver of 1e-9 does not add a step. */
export function roundUpLength(lengthIn: number, limits: DetailLimits): number {
  return Math.ceil(lengthIn / limits.toIn / limits.lengthStep - 1e-9) * limits.lengthStep;
}
