import type { UnitSystem } from '../engineering/input.ts';
import { barPattern, readBar } from './barNumbers.ts';
import { refuse, type Parsed } from './parsed.ts';

/** Bars of one end zone; null is none. */
export interface EndsCallout {
  readonly bar: number;
  readonly count: number;
}

const pattern = new RegExp(String.raw`^(?:\(\s*(\d+)\s*\)|(\d+)\s*(?=[-–x#n]))\s*[-–x]?\s*${barPattern}$`);

/** `(8)#9`, SI `8-25`, `none`. */
export function printEnds(ends: EndsCallout | null, units: UnitSystem): string {
  if (ends === null) return 'none';
  return units === 'us' ? `(${ends.count})#${ends.bar}` : `${ends.count}-${ends.bar}`;
}

/** Reads what `printEnds` prints, and `8 no. 9`, `8-#9`, `(8) 25` alike. */
export function parseEnds(text: string, units: UnitSystem): Parsed<EndsCallout | null> {
  const plain = text.trim().toLowerCase();
  if (plain === 'none') return { ok: true, value: null };
  const match = pattern.exec(plain);
  const [, bracketed, open, digits] = match ?? [];
  const countText = bracketed ?? open;
  if (!countText || !digits) return refuse(`(number)size, as ${units === 'us' ? '(8)#9' : '8-25'}, or none`);
  const bar = readBar(digits, units);
  if (!bar.ok) return bar;
  const count = Number(countText);
  if (count < 4 || count > 80 || count % 2 !== 0) {
    return refuse('an even number of bars from 4 to 80, half on each face');
  }
  return { ok: true, value: { bar: bar.value, count } };
}
