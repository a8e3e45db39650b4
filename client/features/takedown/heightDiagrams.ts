import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument, ResultLevel } from '#shared/contracts/result';
import { basisOrder, basisStyles } from '#shared/drawing/basisStyles';
import type { HeightCurve, HeightDiagramInput } from '#shared/drawing/heightDiagramTypes';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';
import { formatAsListed } from '#shared/format/number';

import { variantUnder, type ResultChoice } from '../../components/drawing/resultChoice.ts';
import { axialRange } from './governing.ts';
import { caseEnvelope, gravityCases, wallStories, type Force, type WallStory } from './wallStories.ts';

interface Diagram {
  readonly title: string;
  readonly unit: string;
  readonly input: HeightDiagramInput;
}

const tickText = (value: number): string => formatAsListed(value, 1);

/**
 * Axial (dead, all gravity, and behind them Pmin to Pmax of the combinations), shear and moment of the case in view under every basis
 * by line style, with the envelope of bases and variants behind.
 */
export function heightDiagrams(
  document: ResultDocument,
  down: readonly ResultLevel[],
  wall: string,
  chosen: ResultChoice,
  level: string,
): readonly Diagram[] {
  const { force, moment } = unitLabels;
  const bases = basisOrder.filter((basis) => chosen.bases.includes(basis));
  const underBases = bases.map((basis) => ({
    basis,
    stories: wallStories(document, down, wall, {
      basis,
      variant: variantUnder(document, basis, chosen.case, chosen.variant),
    }),
  }));
  const stories = underBases[0]?.stories ?? [];
  const at = stories.findIndex((story) => story.level === level);
  const shared = { stories: down, chosen: level, tickText };
  const print = (value: number | null | undefined, format: (value: number) => string): string =>
    value === null || value === undefined ? '–' : format(value);
  const sumGravity = (story: WallStory, cases: readonly string[]): number | null =>
    story.gravity.size === 0 ? null : cases.reduce((sum, name) => sum + (story.gravity.get(name)?.axial ?? 0), 0);
  const lateral = (pick: (force: Force) => number, format: (value: number) => string): readonly HeightCurve[] =>
    underBases.map(({ basis, stories: own }) => {
      const values = own.map((story) => {
        const found = story.lateral.get(chosen.case);
        return found ? pick(found) : null;
      });
      return { name: basis, style: basisStyles[basis], values, text: print(values[at], format) };
    });
  const dead = stories.map((story) => sumGravity(story, ['D']));
  const all = stories.map((story) => sumGravity(story, gravityCases));
  const shears = underBases.flatMap(({ stories: own }) =>
    own.map((story) => story.lateral.get(chosen.case)?.shear ?? 0),
  );
  const decimals = forceDecimals(shears);
  const axialDecimals = forceDecimals(all.map((value) => value ?? 0));
  const printAxial = (value: number): string => formatForce(value, axialDecimals);
  return [
    {
      title: 'Axial',
      unit: force[document.units],
      input: {
        ...shared,
        shape: 'step',
        chosenNote: level,
        envelope: axialRange(
          document,
          wall,
          down.map((one) => one.level),
        ),
        curves: [
          { name: 'D', style: 'solid', values: dead, text: print(dead[at], printAxial) },
          { name: 'all gravity', style: 'dashed', values: all, text: print(all[at], printAxial) },
        ],
      },
    },
    {
      title: `Shear ${chosen.case}`,
      unit: force[document.units],
      input: {
        ...shared,
        shape: 'step',
        chosenNote: level,
        envelope: caseEnvelope(document, down, wall, chosen.case, (one) => one.shear),
        curves: lateral(
          (one) => one.shear,
          (value) => formatForce(value, decimals),
        ),
      },
    },
    {
      title: `Moment ${chosen.case}`,
      unit: moment[document.units],
      input: {
        ...shared,
        shape: 'bottoms',
        chosenNote: `${level}, bottom`,
        envelope: caseEnvelope(document, down, wall, chosen.case, (one) => one.moment),
        curves: lateral((one) => one.moment, formatMoment),
      },
    },
  ];
}
