import type { UnitSystem } from '../engineering/input.ts';
import { barPattern, printBar, readBar } from './barNumbers.ts';
import { formatAsListed } from './number.ts';
import { refuse, type Parsed } from './parsed.ts';

/** Across: legs through the thickness; along: legs parallel to the wall. */
export interface TiesCallout {
  readonly bar: number;
  readonly spacing: number;
  readonly legsAcross: number;
  readonly legsAlong: number;
}

const pattern = new RegExp(
  String.raw`^${barPattern}\s*(?:@|at)\s*(\d+\.?\d*|\.\d+)\s*(?:"|″|in\.?|mm)?\s*(?:o\.?\s*c\.?|c\/c)?\s*,?\s*(\d+)\s*(?:[x×]\s*(\d+)\s*)?(?:legs?)?$`,
);

/** `#4@4, 7 legs` (two along), otherwise `#4@4, 7 x 3 legs`; `none`. */
export function printTies(ties: TiesCallout | null, units: UnitSystem): string {
  if (ties === null) return 'none';
  const legs = ties.legsAlong === 2 ? `${ties.legsAcross}` : `${ties.legsAcross} x ${ties.legsAlong}`;
  return `${printBar(ties.bar, units)}@${formatAsListed(ties.spacing)}, ${legs} legs`;
}

/** Reads what `printTies` prints, without comma or the word legs too. */
export function parseTies(text: string, units: UnitSystem): Parsed<TiesCallout | null> {
  const plain = text.trim().toLowerCase();
  if (plain === 'none') return { ok: true, value: null };
  const match = pattern.exec(plain);
  const [, digits, spacingText, across, along] = match ?? [];
  if (!digits || !spacingText || !across) {
    return refuse(`size @ spacing, legs, as ${units === 'us' ? '#4@4, 7 legs' : '13@100, 7 legs'}, or none`);
  }
  const bar = readBar(digits, units);
  if (!bar.ok) return bar;
  const spacing = Number(spacingText);
  const [least, most] = units === 'us' ? [1, 24] : [25, 600];
  if (spacing < least || spacing > most) {
    return refuse(`a tie spacing of ${least} to ${most} ${units === 'us' ? 'in' : 'mm'}`);
  }
  const [legsAcross, legsAlong] = [Number(across), along === undefined ? 2 : Number(along)];
  if (legsAcross < 2 || legsAcross > 40 || legsAlong < 2 || legsAlong > 40) return refuse('2 to 40 legs each way');
  return { ok: true, value: { bar: bar.value, spacing, legsAcross, legsAlong } };
}
