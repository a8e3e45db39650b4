import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { Basis, UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce, formatShare } from '#shared/format/force';
import { formatAsListed, formatNumber } from '#shared/format/number';

import { WallButton } from '../../components/drawing/WallButton.tsx';
import { Section } from '../../components/ui/Section.tsx';
import type { StoryShares } from './storyShares.ts';

export interface ShareTableProps {
  shares: StoryShares;
  units: UnitSystem;
  level: string;
  caseName: string;
  basis: Basis;
  chosenWall: string | null;
  onChooseWall: (wall: string) => void;
}

/** Shares of the chosen story: rigidity, direct and torsional part where the basis has them, total, part of the story shear. */
export function ShareTable({
  shares,
  units,
  level,
  caseName,
  basis,
  chosenWall,
  onChooseWall,
}: ShareTableProps): ReactElement {
  const force = unitLabels.force[units];
  const decimals = forceDecimals(shares.walls.flatMap((wall) => [wall.direct, wall.torsional, wall.total]));
  const parted = shares.walls.some((wall) => wall.parted);
  const stiffness = units === 'us' ? 'kip/in' : 'kN/mm';
  return (
    <Section title={`Shares, ${level}, ${caseName}`} aside={`${basis}; along each wall from end 1 to end 2, ${force}`}>
      <table className="gw-table">
        <thead>
          <tr>
            <th>Wall</th>
            <th className="num">
              Rigidity<span className="u">{stiffness}</span>
            </th>
            <th className="num">
              k/Σk<span className="u">of story</span>
            </th>
            {parted ? (
              <>
                <th className="num">
                  Direct<span className="u">{force}</span>
                </th>
                <th className="num">
                  Torsional<span className="u">{force}</span>
                </th>
              </>
            ) : null}
            <th className="num">
              Total<span className="u">{force}</span>
            </th>
            <th className="num">
              Share<span className="u">of story</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {shares.walls.map((wall) => (
            <tr
              key={wall.wall}
              className={`cursor-pointer ${wall.wall === chosenWall ? 'on' : ''}`}
              onClick={() => onChooseWall(wall.wall)}
            >
              <th scope="row">
                <WallButton wall={wall.wall} chosen={wall.wall === chosenWall} onChoose={onChooseWall} />
              </th>
              <td className="num">{formatRigidity(wall.rigidity)}</td>
              <td className="num">{formatShare(wall.rigidityShare)}</td>
              {parted ? (
                <>
                  <td className="num">{formatForce(wall.direct, decimals)}</td>
                  <td className="num">{formatForce(wall.torsional, decimals)}</td>
                </>
              ) : null}
              <td className="num font-medium">{formatForce(wall.total, decimals)}</td>
              <td className="num">{wall.share === null ? '–' : formatShare(wall.share)}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row" colSpan={parted ? 5 : 3} className="pl-2">
              Sum along the story shear
            </th>
            <td className="num">{formatForce(shares.sum, 1)}</td>
            <td className="num">{shares.size > 0 ? formatShare(shares.sum / shares.size) : '–'}</td>
          </tr>
        </tfoot>
      </table>
    </Section>
  );
}

/** Three figures or more for rigidities of any size. */
const formatRigidity = (k: number): string => (Math.abs(k) >= 100 ? formatNumber(k, 0) : formatAsListed(k, 2));
