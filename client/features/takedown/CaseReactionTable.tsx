import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { Basis, UnitSystem } from '#shared/engineering/input';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';

import { sayVariant } from '../../components/drawing/resultChoice.ts';
import { Section } from '../../components/ui/Section.tsx';
import type { CaseReaction } from './caseReactions.ts';

export interface CaseReactionTableProps {
  wall: string;
  level: string;
  rows: readonly CaseReaction[];
  bases: readonly Basis[];
  accidental: number;
  units: UnitSystem;
}

/** Unfactored reactions of the wall at its foot by case, variant and basis. */
export function CaseReactionTable(props: CaseReactionTableProps): ReactElement {
  const { wall, level, rows, bases, accidental, units } = props;
  const decimals = forceDecimals(rows.flatMap((row) => row.forces.map((force) => force?.shear ?? 0)));
  return (
    <Section title={`${wall} at its foot, ${level}, by case and basis`} aside="cases as they were given, not factored">
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th>Case</th>
              <th>Eccentricity</th>
              {(['shear', 'moment'] as const).flatMap((what) =>
                bases.map((basis) => (
                  <th key={`${what} ${basis}`} className="num">
                    {what === 'shear' ? 'Shear' : 'Moment'}
                    <span className="u">
                      {basis}, {unitLabels[what === 'shear' ? 'force' : 'moment'][units]}
                    </span>
                  </th>
                )),
              )}
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr key={`${row.case} ${row.variant}`}>
                <th scope="row" className="font-medium">
                  {row.case}
                </th>
                <td>{sayVariant(row.variant, accidental)}</td>
                {row.forces.map((force, index) => (
                  <td key={`shear ${bases[index] ?? index}`} className="num">
                    {force === null ? '–' : formatForce(force.shear, decimals)}
                  </td>
                ))}
                {row.forces.map((force, index) => (
                  <td key={`moment ${bases[index] ?? index}`} className="num">
                    {force === null ? '–' : formatMoment(force.moment)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Section>
  );
}
