import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';

import { WallButton } from '../../components/drawing/WallButton.tsx';
import { Section } from '../../components/ui/Section.tsx';
import type { FoundationRow } from './foundation.ts';
import type { Effect } from './governing.ts';

export interface FoundationTableProps {
  rows: readonly FoundationRow[];
  units: UnitSystem;
  chosenWall: string;
  onChooseWall: (wall: string) => void;
}

const columns: readonly { readonly effect: Effect; readonly text: string }[] = [
  { effect: 'Pmax', text: 'Pmax' },
  { effect: 'Pmin', text: 'Pmin' },
  { effect: 'shear', text: 'Shear' },
  { effect: 'moment', text: 'Moment' },
];

/** Factored extremes at the foot of every wall, each with its combination and basis, and whether an edge lifts. */
export function FoundationTable({ rows, units, chosenWall, onChooseWall }: FoundationTableProps): ReactElement {
  const force = unitLabels.force[units];
  const moment = unitLabels.moment[units];
  const decimals = forceDecimals(rows.flatMap((row) => row.governing.map(({ value }) => value)));
  const lifting = rows.filter((row) => row.lifts);
  return (
    <Section
      title="Reactions for the foundation"
      aside="factored, worst of all combinations and bases; P downward positive"
    >
      <div className="overflow-x-auto">
        <table className="gw-table gw-table-prose">
          <thead>
            <tr>
              <th>Wall</th>
              {columns.map(({ effect, text }) => (
                <th key={effect}>
                  {text}
                  <span className="u">{effect === 'moment' ? moment : force}, combination, basis</span>
                </th>
              ))}
              <th>
                Least edge load<span className="u">{units === 'us' ? 'kip/ft' : 'kN/m'}, P/lw − 6M/lw²</span>
              </th>
              <th>Uplift</th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr
                key={row.wall}
                className={`cursor-pointer ${row.wall === chosenWall ? 'on' : ''}`}
                onClick={() => onChooseWall(row.wall)}
              >
                <th scope="row" className="align-top!">
                  <WallButton wall={row.wall} chosen={row.wall === chosenWall} onChoose={onChooseWall} />
                  {row.atBase ? null : <small className="text-note font-normal text-graphite">from {row.level}</small>}
                </th>
                {columns.map(({ effect }) => {
                  const found = row.governing.find((one) => one.effect === effect);
                  if (!found) return <td key={effect}>–</td>;
                  const { value, action } = found;
                  return (
                    <td key={effect}>
                      <span className="font-medium">
                        {effect === 'moment' ? formatMoment(value) : formatForce(value, decimals)}
                      </span>
                      <Source text={`${action.combination}, ${action.basis}`} />
                    </td>
                  );
                })}
                <td>
                  {row.edge === null ? (
                    '–'
                  ) : (
                    <>
                      <span className="font-medium">{formatForce(row.edge.value)}</span>
                      <Source text={`${row.edge.action.combination}, ${row.edge.action.basis}`} />
                    </>
                  )}
                </td>
                <td className={row.lifts ? 'font-semibold whitespace-nowrap!' : 'text-graphite'}>
                  {row.lifts ? 'one edge' : 'none'}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="note mt-2 max-w-[92ch]">
        {lifting.length === 0
          ? 'No combination leaves an edge without compression.'
          : `${lifting.map((row) => row.wall).join(', ')}: |M|/P exceeds lw/6 in at least one combination, so that an edge of the wall has no compression. Uplift goes to the foundation.`}
      </p>
    </Section>
  );
}

const Source = ({ text }: { text: string }): ReactElement => (
  <span className="block text-note text-graphite">{text}</span>
);
