import type { UnitSystem } from '../engineering/input.ts';
import { parseCurtains, printCurtains, type CurtainCallout } from './curtainCallout.ts';
import { refuse, type Parsed } from './parsed.ts';

export type HorizontalEndCallout = 'hook' | 'u-bar' | 'in-core';

/** Horizontal bars with what they do at the wall's ends. A hook is usual and is not printed. */
export interface HorizontalCallout extends CurtainCallout {
  readonly end: HorizontalEndCallout;
}

const ends: readonly (readonly [HorizontalEndCallout, RegExp])[] = [
  ['hook', /[\s,]+hook(s|ed)?$/],
  ['u-bar', /[\s,]+u[\s-]?bars?$/],
  ['in-core', /[\s,]+in[\s-]?core$/],
];

/** `#4@10 EF`, `#4@10 EF u-bar`, SI `13@250 EF in-core`. */
export const printHorizontal = ({ end, ...curtains }: HorizontalCallout, units: UnitSystem): string =>
  `${printCurtains(curtains, units)}${end === 'hook' ? '' : ` ${end}`}`;

/** Reads what `printHorizontal` prints, and `#4 @ 10" ef, U bars` alike; without a word for the ends they are hooked. */
export function parseHorizontal(text: string, units: UnitSystem): Parsed<HorizontalCallout> {
  const plain = text.trim().toLowerCase();
  const found = ends.find(([, pattern]) => pattern.test(plain));
  const read = parseCurtains(found ? plain.replace(found[1], '') : plain, units);
  if (read.ok) return { ok: true, value: { ...read.value, end: found?.[0] ?? 'hook' } };
  if (!read.expected.startsWith('bar @ spacing')) return read;
  return refuse(`${read.expected}; hook, u-bar or in-core after it for the ends`);
}
