import type { ReactElement, ReactNode } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import { drawSpread } from '#shared/drawing/drawSpread';
import type { Basis, UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce } from '#shared/format/force';

import { BasisMark } from '../../components/drawing/BasisMark.tsx';
import { DrawingSvg } from '../../components/drawing/DrawingSvg.tsx';
import { WallButton } from '../../components/drawing/WallButton.tsx';
import { Section } from '../../components/ui/Section.tsx';
import { saySpread } from './saySpread.ts';
import type { StoryBases } from './storyBases.ts';

export interface BasesTableProps {
  bases: StoryBases;
  units: UnitSystem;
  level: string;
  caseName: string;
  chosenBasis: Basis;
  onChooseBasis: (basis: Basis) => void;
  chosenWall: string | null;
  onChooseWall: (wall: string) => void;
  /** what the building does with several bases */
  children?: ReactNode;
}

const named: Readonly<Record<Basis, string>> = { rigid: 'Rigid', flexible: 'Flexible', compatible: 'Compatible' };

/** What every basis gives each wall of the story, side by side, with the spread on one scale. */
export function BasesTable(props: BasesTableProps): ReactElement {
  const { bases, units, level, caseName, chosenBasis, onChooseBasis, chosenWall, onChooseWall, children } = props;
  const force = unitLabels.force[units];
  const decimals = forceDecimals(bases.walls.flatMap((one) => one.values.map((value) => value ?? 0)));
  const said = saySpread(bases);
  return (
    <Section title={`The bases, ${level}, ${caseName}`} aside={`wall shear, ${force}`}>
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th>Wall</th>
              {bases.bases.map((basis) => (
                <th key={basis} className="num" aria-current={basis === chosenBasis ? 'true' : undefined}>
                  <button
                    type="button"
                    className={`min-h-[24px] hover:underline ${basis === chosenBasis ? 'font-semibold underline' : 'font-medium'}`}
                    aria-pressed={basis === chosenBasis}
                    onClick={() => onChooseBasis(basis)}
                  >
                    {named[basis]}
                  </button>
                  <span className="u">
                    <BasisMark basis={basis} />
                  </span>
                </th>
              ))}
              {bases.bases.length > 1 ? (
                <>
                  <th className="pl-3!">Spread</th>
                  <th className="num">
                    {' '}
                    <span className="u">{force}</span>
                  </th>
                </>
              ) : null}
            </tr>
          </thead>
          <tbody>
            {bases.walls.map((one) => (
              <tr
                key={one.wall}
                className={`cursor-pointer ${one.wall === chosenWall ? 'on' : ''}`}
                onClick={() => onChooseWall(one.wall)}
              >
                <th scope="row">
                  <WallButton wall={one.wall} chosen={one.wall === chosenWall} onChoose={onChooseWall} />
                </th>
                {bases.bases.map((basis, index) => {
                  const value = one.values[index] ?? null;
                  return (
                    <td key={basis} className={`num ${basis === chosenBasis ? 'font-medium' : ''}`}>
                      {value === null ? '–' : formatForce(value, decimals)}
                    </td>
                  );
                })}
                {bases.bases.length > 1 ? (
                  <>
                    <td className="pl-3!">
                      <DrawingSvg
                        drawing={drawSpread({
                          values: bases.bases.flatMap((basis, index) => {
                            const value = one.values[index] ?? null;
                            return value === null ? [] : [{ basis, value }];
                          }),
                          least: bases.least,
                          most: bases.most,
                        })}
                      />
                    </td>
                    <td className={`num ${one === bases.widest ? 'font-semibold' : ''}`}>
                      {formatForce(one.spread, decimals)}
                    </td>
                  </>
                ) : null}
              </tr>
            ))}
          </tbody>
          <tfoot>
            <tr>
              <th scope="row" className="pl-2">
                Sum<span className="sr-only"> along the story shear</span>
              </th>
              {bases.bases.map((basis, index) => (
                <td key={basis} className="num">
                  {formatForce(bases.sums[index] ?? 0, 1)}
                </td>
              ))}
              {bases.bases.length > 1 ? (
                <td colSpan={2} className="pl-3! font-normal text-graphite">
                  along the story shear
                </td>
              ) : null}
            </tr>
          </tfoot>
        </table>
      </div>
      {said === null ? null : (
        <p className="mt-2 max-w-[68ch] pl-2 text-data">
          <b className="font-semibold">{said.lead}</b> {said.rest}
        </p>
      )}
      {children}
    </Section>
  );
}
