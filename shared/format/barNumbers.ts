import type { UnitSystem } from '../engineering/input.ts';
import { barTables } from '../engineering/wall-design/bars.ts';
import { refuse, type Parsed } from './parsed.ts';

/** The bars of each unit system, as the engine has them. */
export const barNumbers: Readonly<Record<UnitSystem, readonly number[]>> = {
  us: barTables.us.map((bar) => bar.number),
  si: barTables.si.map((bar) => bar.number),
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
