import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce } from '#shared/format/force';

import { Section } from '../../components/ui/Section.tsx';
import type { CollectorRow } from './collectors.ts';

export interface CollectorTableProps {
  rows: readonly CollectorRow[];
  names: readonly string[];
  caseText: string;
  units: UnitSystem;
  chosenWall: string;
  chosenLevel: string;
  onChooseLevel: (level: string) => void;
}

/** What each wall takes from each floor, for the design of collectors. */
export function CollectorTable(props: CollectorTableProps): ReactElement {
  const { rows, names, caseText, units, chosenWall, chosenLevel, onChooseLevel } = props;
  const force = unitLabels.force[units];
  const decimals = forceDecimals(rows.flatMap((row) => row.taken.map((value) => value ?? 0)));
  const print = (value: number | null): string => (value === null ? '–' : formatForce(value, decimals));
  return (
    <Section title="Collectors" aside={`what each wall takes from each floor, ${force}; ${caseText}`}>
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th>Floor</th>
              {names.map((name) => (
                <th key={name} className={`num ${name === chosenWall ? 'font-semibold underline' : ''}`}>
                  {name}
                </th>
              ))}
              <th className="num">
                Sum<span className="u">along the force</span>
              </th>
              <th className="num">
                Force<span className="u">of the level</span>
              </th>
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
                {row.taken.map((value, index) => (
                  <td key={names[index] ?? index} className="num">
                    {print(value)}
                  </td>
                ))}
                <td className="num">{row.along === null ? '–' : formatForce(row.along)}</td>
                <td className="num font-medium">{row.force === null ? '–' : formatForce(row.force)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="note mt-2">
        The shear of the story below the floor less that of the story above; along each wall from end 1 to end 2. Where
        the sum differs from the force, a transfer was assigned or skew walls push sideways.
      </p>
    </Section>
  );
}
