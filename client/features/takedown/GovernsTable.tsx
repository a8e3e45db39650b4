import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { UnitSystem } from '#shared/engineering/input';
import { formatForce, formatMoment } from '#shared/format/force';

import type { Effect, Governing } from './governing.ts';

export interface GovernsTableProps {
  title: string;
  rows: readonly Governing[];
  units: UnitSystem;
}

const effects: Readonly<Record<Effect, string>> = {
  Pmax: 'Pmax',
  Pmin: 'Pmin',
  moment: 'Moment',
  shear: 'Shear',
};

/** What governs a story of the wall: value and combination of each effect. It follows pointer and keys in the diagrams. */
export function GovernsTable({ title, rows, units }: GovernsTableProps): ReactElement {
  return (
    <section aria-label="What governs" aria-live="polite" className="mb-4">
      <h3 className="border-b border-ink pb-[3px]">{title}</h3>
      {rows.length === 0 ? (
        <p className="note mt-2">The wall does not stand in this story.</p>
      ) : (
        <table className="gw-table gw-table-prose">
          <tbody>
            {rows.map(({ effect, value, action }) => (
              <tr key={effect}>
                <th scope="row" className="align-baseline! font-normal">
                  {effects[effect]}
                </th>
                <td className="num align-baseline! font-medium whitespace-nowrap!">
                  {effect === 'moment' ? formatMoment(value) : formatForce(value)}{' '}
                  {unitLabels[effect === 'moment' ? 'moment' : 'force'][units]}
                </td>
                <td className="align-baseline! text-note">
                  {action.combination}, {action.basis}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </section>
  );
}
