import type { ResultDocument } from '#shared/contracts/result';

import { sayVariant, type ResultChoice } from '../../components/drawing/resultChoice.ts';

export interface ShareStep {
  readonly text: string;
  readonly value: number;
  /** a part that is added to the one above */
  readonly added: boolean;
}

/**
 * From the story shear to the wall's own: direct part, torsion of the case as built, what the accidental eccentricity changes, and
 * their sum. Empty where the basis has no such parts or the wall does not stand in the story.
 */
export function shareSteps(
  document: ResultDocument,
  wall: string,
  chosen: ResultChoice,
  accidental: number,
): readonly ShareStep[] {
  const level = chosen.level.level;
  const find = (variant: string) =>
    document.distribution.find(
      (one) =>
        one.wall === wall &&
        one.level === level &&
        one.case === chosen.case &&
        one.basis === chosen.basis &&
        one.variant === variant,
    );
  const row = find(chosen.variant);
  const built = find('0') ?? row;
  if (!row || !built || built.direct === undefined || built.torsional === undefined) return [];
  const { vx = 0, vy = 0 } = chosen.level.shear[chosen.case] ?? {};
  const steps: ShareStep[] = [
    { text: `Story shear ${chosen.case}, ${level} and above`, value: Math.sqrt(vx * vx + vy * vy), added: false },
    { text: 'Direct part, along the wall', value: built.direct, added: false },
    { text: 'Torsional part, as built', value: built.torsional, added: true },
  ];
  if (chosen.variant !== '0') {
    const change = row.total - built.direct - built.torsional;
    steps.push({
      text: `Accidental eccentricity ${sayVariant(chosen.variant, accidental)}`,
      value: change,
      added: true,
    });
  }
  const lateral = document.lateral.find(
    (one) =>
      one.wall === wall &&
      one.level === level &&
      one.case === chosen.case &&
      one.basis === chosen.basis &&
      one.variant === chosen.variant,
  );
  const own = lateral?.shear ?? row.total;
  if (own !== row.total) steps.push({ text: 'Assigned by transfers', value: own - row.total, added: true });
  return [...steps, { text: `Wall shear, ${chosen.basis}`, value: own, added: false }];
}
