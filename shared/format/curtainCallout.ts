import type { UnitSystem } from '../engineering/input.ts';
import { barPattern, printBar, readBar } from './barNumbers.ts';
import { formatAsListed } from './number.ts';
import { refuse, type Parsed } from './parsed.ts';

/** Distributed steel: spacing is each face, two curtains print as EF. */
export interface CurtainCallout {
  readonly curtains: 1 | 2;
  readonly bar: number;
  readonly spacing: number;
}

const pattern = new RegExp(
  String.raw`^${barPattern}\s*(?:@|at)\s*(\d+\.?\d*|\.\d+)\s*(?:"|″|in\.?|mm)?\s*(?:o\.?\s*c\.?|c\/c)?\s*,?\s*(e\.?\s*f\.?|each\s*face)?$`,
);

/** `#5@12 EF`, `16@200 EF`; one curtain without EF. */
export const printCurtains = ({ curtains, bar, spacing }: CurtainCallout, units: UnitSystem): string =>
  `${printBar(bar, units)}@${formatAsListed(spacing)}${curtains === 2 ? ' EF' : ''}`;

/** Reads what `printCurtains` prints, and `no. 5 @ 12" o.c. ef` alike. */
export function parseCurtains(text: string, units: UnitSystem): Parsed<CurtainCallout> {
  const match = pattern.exec(text.trim().toLowerCase());
  const [, digits, spacingText, faces] = match ?? [];
  if (!digits || !spacingText) {
    return refuse(units === 'us' ? 'bar @ spacing in inches, as #5@12 EF' : 'bar @ spacing in mm, as 16@200 EF');
  }
  const bar = readBar(digits, units);
  if (!bar.ok) return bar;
  const spacing = Number(spacingText);
  const [least, most] = units === 'us' ? [1, 60] : [25, 1500];
  if (spacing < least || spacing > most) {
    return refuse(`a spacing of ${least} to ${most} ${units === 'us' ? 'in' : 'mm'}`);
  }
  return { ok: true, value: { curtains: faces ? 2 : 1, bar: bar.value, spacing } };
}
