import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';

import { WallButton } from '../../components/drawing/WallButton.tsx';
import { Section } from '../../components/ui/Section.tsx';
import { gravityCases, type GravityCase } from './wallStories.ts';

export interface Reaction {
  readonly wall: string;
  /** level whose story is the wall's lowest */
  readonly level: string;
  readonly atBase: boolean;
  readonly gravity: Readonly<Record<GravityCase, number>>;
  readonly shear: number;
  readonly moment: number;
}

export interface ReactionTableProps {
  reactions: readonly Reaction[];
  /** sum of the shears along the story shear of the case */
  shearSum: number;
  caseText: string;
  /** gravity brought in against the sum over the walls */
  balanceText: string;
  units: UnitSystem;
  chosenWall: string;
  onChooseWall: (wall: string) => void;
}

/** What stands at the foot of every wall. */
export function ReactionTable(props: ReactionTableProps): ReactElement {
  const { reactions, shearSum, caseText, balanceText, units, chosenWall, onChooseWall } = props;
  const force = unitLabels.force[units];
  const shown = gravityCases.filter((name) => name === 'D' || reactions.some((one) => one.gravity[name] !== 0));
  const axialDecimals = forceDecimals(reactions.flatMap((one) => shown.map((name) => one.gravity[name])));
  const shearDecimals = forceDecimals(reactions.map((one) => one.shear));
  const floating = reactions.filter((one) => !one.atBase);
  const total = (name: GravityCase): number =>
    reactions.filter((one) => one.atBase).reduce((sum, one) => sum + one.gravity[name], 0);
  return (
    <Section title="Base reactions" aside={caseText}>
      <table className="gw-table">
        <thead>
          <tr>
            <th>Wall</th>
            {shown.map((name) => (
              <th key={name} className="num">
                {name}
                <span className="u">{force}</span>
              </th>
            ))}
            <th className="num">
              Shear<span className="u">{force}</span>
            </th>
            <th className="num">
              Moment<span className="u">{unitLabels.moment[units]}</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {reactions.map((one) => (
            <tr
              key={one.wall}
              className={`cursor-pointer ${one.wall === chosenWall ? 'on' : ''}`}
              onClick={() => onChooseWall(one.wall)}
            >
              <th scope="row">
                <WallButton wall={one.wall} chosen={one.wall === chosenWall} onChoose={onChooseWall} />
                {one.atBase ? null : <small className="text-note font-normal text-graphite">from {one.level}</small>}
              </th>
              {shown.map((name) => (
                <td key={name} className="num">
                  {formatForce(one.gravity[name], axialDecimals)}
                </td>
              ))}
              <td className="num">{formatForce(one.shear, shearDecimals)}</td>
              <td className="num">{formatMoment(one.moment)}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row" className="pl-2">
              Sum
            </th>
            {shown.map((name) => (
              <td key={name} className="num">
                {formatForce(total(name), axialDecimals)}
              </td>
            ))}
            <td className="num">{formatForce(shearSum, shearDecimals)}</td>
            <td className="num font-normal text-graphite">–</td>
          </tr>
        </tfoot>
      </table>
      <p className="note mt-2">
        {balanceText} The sum of shears is taken along the story shear of the lowest story.
        {floating.length > 0
          ? ` ${floating.map((one) => one.wall).join(', ')}: starts above the base, not in the sums; what it brings down is not yet assigned.`
          : ''}
      </p>
    </Section>
  );
}
