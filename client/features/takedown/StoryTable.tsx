import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';

import { Section } from '../../components/ui/Section.tsx';
import { gravityCases, type WallStory } from './wallStories.ts';

export interface StoryTableProps {
  wall: string;
  stories: readonly WallStory[];
  /** cases with their variant in words, in the order of the forces table */
  cases: readonly { readonly name: string; readonly variant: string }[];
  units: UnitSystem;
  chosenLevel: string;
  onChooseLevel: (level: string) => void;
}

/** One wall story by story: shear and moment of every case, axial of every kind of gravity. */
export function StoryTable({ wall, stories, cases, units, chosenLevel, onChooseLevel }: StoryTableProps): ReactElement {
  const force = unitLabels.force[units];
  const moment = unitLabels.moment[units];
  const standing = stories.filter((story) => story.gravity.size > 0 || story.lateral.size > 0);
  const shearDecimals = forceDecimals(standing.flatMap((story) => [...story.lateral.values()].map((one) => one.shear)));
  const axialDecimals = forceDecimals(standing.flatMap((story) => [...story.gravity.values()].map((one) => one.axial)));
  const eccentric = standing.some((story) => [...story.gravity.values()].some((one) => one.moment !== 0));
  const gravityMoment = (story: WallStory): number =>
    gravityCases.reduce((sum, name) => sum + (story.gravity.get(name)?.moment ?? 0), 0);
  return (
    <Section
      title={`${wall}, story by story`}
      aside="at the bottom of each story; compression positive; D with self-weight"
    >
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th rowSpan={2}>Level</th>
              <GroupHead span={cases.length} text={`Shear, ${force}`} />
              <GroupHead span={cases.length} text={`Moment, ${moment}`} />
              <GroupHead span={gravityCases.length} text={`Axial, ${force}`} />
              {eccentric ? (
                <th rowSpan={2} className="num">
                  Gravity moment<span className="u">{moment}</span>
                </th>
              ) : null}
            </tr>
            <tr>
              {(['shear', 'moment'] as const).flatMap((what) =>
                cases.map((one) => (
                  <th key={`${what} ${one.name}`} className="num">
                    {one.name}
                    <span className="u">{one.variant || ' '}</span>
                  </th>
                )),
              )}
              {gravityCases.map((name) => (
                <th key={name} className="num">
                  {name}
                  <span className="u"> </span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {standing.map((story) => (
              <tr
                key={story.level}
                className={`cursor-pointer ${story.level === chosenLevel ? 'on' : ''}`}
                onClick={() => onChooseLevel(story.level)}
              >
                <th scope="row" className="pl-2 font-medium">
                  {story.level}
                </th>
                {cases.map(({ name }) => (
                  <td key={`V ${name}`} className="num">
                    {print(story.lateral.get(name)?.shear, (value) => formatForce(value, shearDecimals))}
                  </td>
                ))}
                {cases.map(({ name }) => (
                  <td key={`M ${name}`} className="num">
                    {print(story.lateral.get(name)?.moment, formatMoment)}
                  </td>
                ))}
                {gravityCases.map((name) => (
                  <td key={name} className="num">
                    {print(story.gravity.get(name)?.axial, (value) => formatForce(value, axialDecimals))}
                  </td>
                ))}
                {eccentric ? <td className="num">{formatMoment(gravityMoment(story))}</td> : null}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Section>
  );
}

function GroupHead({ span, text }: { span: number; text: string }): ReactElement {
  return (
    <th colSpan={span} className="border-b-0! pl-3!">
      <span className="block border-b border-line text-note font-normal text-graphite">{text}</span>
    </th>
  );
}

const print = (value: number | undefined, format: (value: number) => string): string =>
  value === undefined ? '–' : format(value);
