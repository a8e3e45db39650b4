import type { UnitSystem } from '../engineering/input.ts';
import { refuse, type Parsed } from './parsed.ts';

/** Deformed bars of ASTM A615 and A706: inch-pound numbers, and the soft-metric numbers of the same bars. From memory. */
export const barNumbers: Readonly<Record<UnitSystem, readonly number[]>> = {
  us: [3, 4, 5, 6, 7, 8, 9, 10, 11, 14, 18],
  si: [10, 13, 16, 19, 22, 25, 29, 32, 36, 43, 57],
};

/** `#5` in US units, `16` in SI. */
export const printBar = (bar: number, units: UnitSystem): string => (units === 'us' ? `#${bar}` : `${bar}`);

/** A bar in words: `No. 5`. */
export const sayBar = (bar: number): string => `No. ${bar}`;

/** What a typed bar may begin with: `#5`, `No. 5`, `no 5`, `5`; used inside the patterns of the callouts. */
export const barPattern = String.raw`(?:#|no\.?)?\s*(\d+)`;

/** The number as a bar that exists in the unit system, or the list of those that do. */
export function readBar(digits: string, units: UnitSystem): Parsed<number> {
  const bar = Number(digits);
  if (barNumbers[units].includes(bar)) return { ok: true, value: bar };
  const list = barNumbers[units].map((number) => printBar(number, units)).join(', ');
  return refuse(`a bar of ${units === 'us' ? 'inch-pound' : 'metric'} size: ${list}`);
}
