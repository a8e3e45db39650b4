import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument, ResultLevel } from '#shared/contracts/result';
import type { HeightDiagramInput } from '#shared/drawing/heightDiagramTypes';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';
import { formatAsListed } from '#shared/format/number';

import type { ResultChoice } from '../../components/drawing/resultChoice.ts';
import { caseEnvelope, gravityCases, type Force, type WallStory } from './wallStories.ts';

interface Diagram {
  readonly title: string;
  readonly unit: string;
  readonly input: HeightDiagramInput;
}

const tickText = (value: number): string => formatAsListed(value, 1);

/** Axial (dead, and all gravity), shear and moment of the case in view with the envelope of its variants behind. */
export function heightDiagrams(
  document: ResultDocument,
  down: readonly ResultLevel[],
  wall: string,
  stories: readonly WallStory[],
  chosen: ResultChoice,
): readonly Diagram[] {
  const { force, moment } = unitLabels;
  const at = stories.findIndex((story) => story.level === chosen.level.level);
  const shared = { stories: down, chosen: chosen.level.level, tickText };
  const sumGravity = (story: WallStory, cases: readonly string[]): number | null =>
    story.gravity.size === 0 ? null : cases.reduce((sum, name) => sum + (story.gravity.get(name)?.axial ?? 0), 0);
  const lateral = (pick: (force: Force) => number): readonly (number | null)[] =>
    stories.map((story) => {
      const found = story.lateral.get(chosen.case);
      return found ? pick(found) : null;
    });
  const dead = stories.map((story) => sumGravity(story, ['D']));
  const all = stories.map((story) => sumGravity(story, gravityCases));
  const print = (value: number | null | undefined, format: (value: number) => string): string =>
    value === null || value === undefined ? '–' : format(value);
  const shears = lateral((one) => one.shear);
  const moments = lateral((one) => one.moment);
  const decimals = forceDecimals(shears.map((value) => value ?? 0));
  const axialDecimals = forceDecimals(all.map((value) => value ?? 0));
  return [
    {
      title: 'Axial',
      unit: force[document.units],
      input: {
        ...shared,
        shape: 'step',
        chosenNote: chosen.level.level,
        curves: [
          { name: 'D', style: 'solid', values: dead, text: print(dead[at], (v) => formatForce(v, axialDecimals)) },
          {
            name: 'all gravity',
            style: 'dashed',
            values: all,
            text: print(all[at], (v) => formatForce(v, axialDecimals)),
          },
        ],
      },
    },
    {
      title: `Shear ${chosen.case}`,
      unit: force[document.units],
      input: {
        ...shared,
        shape: 'step',
        chosenNote: chosen.level.level,
        envelope: caseEnvelope(document, down, wall, chosen.case, (one) => one.shear),
        curves: [
          {
            name: chosen.basis,
            style: 'solid',
            values: shears,
            text: print(shears[at], (v) => formatForce(v, decimals)),
          },
        ],
      },
    },
    {
      title: `Moment ${chosen.case}`,
      unit: moment[document.units],
      input: {
        ...shared,
        shape: 'bottoms',
        chosenNote: `${chosen.level.level}, bottom`,
        envelope: caseEnvelope(document, down, wall, chosen.case, (one) => one.moment),
        curves: [{ name: chosen.basis, style: 'solid', values: moments, text: print(moments[at], formatMoment) }],
      },
    },
  ];
}
