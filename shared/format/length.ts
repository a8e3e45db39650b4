import type { UnitSystem } from '../engineering/input.ts';
import { formatAsListed, formatNumber, minusSign } from './number.ts';

/** Plan lengths and elevations in a grid: ft with one decimal, m with two. */
export const formatPlanLength = (length: number, units: UnitSystem): string =>
  formatNumber(length, units === 'us' ? 1 : 2);

/** Thickness, spacing, lap: in as typed up to two decimals, mm whole. */
export const formatBarLength = (length: number, units: UnitSystem): string =>
  units === 'us' ? formatAsListed(length, 2) : formatNumber(length, 0);

/** Lengths in prose and on drawings: feet and inches to the nearest half inch, or meters with their unit. */
export function formatProseLength(length: number, units: UnitSystem): string {
  if (units === 'si') return `${formatNumber(length, 2)} m`;
  const halfInches = Math.round(Math.abs(length) * 24);
  const feet = Math.floor(halfInches / 24);
  const inches = (halfInches - feet * 24) / 2;
  const whole = Math.floor(inches);
  const text = `${formatNumber(feet, 0)}′-${whole}${inches > whole ? '½' : ''}″`;
  return length < 0 && halfInches > 0 ? minusSign + text : text;
}

/** Reads `26′-0″`, `26'-6 1/2"`, `26.5`, `7.92 m` back to ft or m; null where it is none of these. */
export function parseProseLength(text: string, units: UnitSystem): number | null {
  const plain = text.trim().replace(minusSign, '-').replace(/,/g, '');
  const feetInches = /^(-?)(\d+)\s*[′']\s*-?\s*(\d+)\s*(½|1\/2)?\s*[″"]$/.exec(plain);
  if (feetInches && units === 'us') {
    const [, sign, feet, inches, half] = feetInches;
    const length = Number(feet) + (Number(inches) + (half ? 0.5 : 0)) / 12;
    return sign ? -length : length;
  }
  const decimal = /^(-?\d+(?:\.\d*)?)\s*(ft|m)?$/.exec(plain);
  if (!decimal || (decimal[2] && (decimal[2] === 'm') !== (units === 'si'))) return null;
  return Number(decimal[1]);
}
