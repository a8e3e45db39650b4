import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultLevel } from '#shared/contracts/result';
import { basisStyles } from '#shared/drawing/basisStyles';
import { drawHeightDiagram } from '#shared/drawing/heightDiagram';
import type { Basis, UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce } from '#shared/format/force';
import { formatAsListed } from '#shared/format/number';

import { DrawingSvg } from '../../components/drawing/DrawingSvg.tsx';
import { Section } from '../../components/ui/Section.tsx';
import type { WallUnderBases } from './wallUnderBases.ts';

export interface WallBasesSectionProps {
  wall: string;
  caseText: string;
  down: readonly ResultLevel[];
  bases: readonly Basis[];
  rows: readonly WallUnderBases[];
  units: UnitSystem;
  chosenLevel: string;
  onChooseLevel: (level: string) => void;
}

/** One wall over all stories under every basis: the curves beside the table with the same figures. */
export function WallBasesSection(props: WallBasesSectionProps): ReactElement {
  const { wall, caseText, down, bases, rows, units, chosenLevel, onChooseLevel } = props;
  const force = unitLabels.force[units];
  const decimals = forceDecimals(rows.flatMap((row) => row.values.map((value) => value ?? 0)));
  const at = rows.find((row) => row.level === chosenLevel);
  const print = (value: number | null | undefined): string =>
    value === null || value === undefined ? '–' : formatForce(value, decimals);
  return (
    <Section title={`${wall} over the height, ${caseText}`} aside={`wall shear under each basis, ${force}`}>
      <div className="mt-2 grid gap-x-7 gap-y-4 min-[1100px]:grid-cols-[216px_minmax(0,1fr)]">
        <figure aria-label={`${wall} under each basis`} className="m-0 w-[216px]">
          <DrawingSvg
            drawing={drawHeightDiagram({
              stories: down,
              shape: 'step',
              chosen: chosenLevel,
              chosenNote: chosenLevel,
              tickText: (value) => formatAsListed(value, 1),
              curves: bases.map((basis, index) => ({
                name: basis,
                style: basisStyles[basis],
                values: rows.map((row) => row.values[index] ?? null),
                text: print(at?.values[index]),
              })),
            })}
          />
        </figure>
        <table className="gw-table h-fit">
          <thead>
            <tr>
              <th>Level</th>
              {bases.map((basis) => (
                <th key={basis} className="num first-letter:uppercase">
                  {basis}
                </th>
              ))}
              <th className="num">Spread</th>
              <th className="num">Of the largest</th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr
                key={row.level}
                className={`cursor-pointer ${row.level === chosenLevel ? 'on' : ''}`}
                onClick={() => onChooseLevel(row.level)}
              >
                <th scope="row" className="pl-2 font-medium">
                  {row.level}
                </th>
                {bases.map((basis, index) => (
                  <td key={basis} className="num">
                    {print(row.values[index])}
                  </td>
                ))}
                <td className="num">{print(row.spread)}</td>
                <td className="num text-graphite">{sayPart(row)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Section>
  );
}

function sayPart({ values, spread }: WallUnderBases): string {
  const largest = values.reduce<number>((most, value) => Math.max(most, Math.abs(value ?? 0)), 0);
  return largest === 0 ? '–' : `${formatAsListed((100 * spread) / largest, 0)} %`;
}
