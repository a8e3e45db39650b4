import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultTransferred } from '#shared/contracts/result';
import type { OverrideRow, UnitSystem } from '#shared/engineering/input';
import { formatForce, formatMoment, formatShare } from '#shared/format/force';

import { Section } from '../../components/ui/Section.tsx';

export interface AssignedSectionProps {
  overrides: readonly OverrideRow[];
  /** of the basis, case and variant in view, and of gravity */
  transferred: readonly ResultTransferred[];
  units: UnitSystem;
}

/** What engineers assigned, and what walls that start above the base bring down, each on a line of its own. */
export function AssignedSection({ overrides, transferred, units }: AssignedSectionProps): ReactElement | null {
  if (overrides.length === 0 && transferred.length === 0) return null;
  const heads = [
    { text: 'Axial', unit: unitLabels.force[units] },
    { text: 'Shear', unit: unitLabels.force[units] },
    { text: 'Moment', unit: unitLabels.moment[units] },
  ];
  const print = (value: number | null, format: (value: number) => string): string =>
    value === null ? '–' : format(value);
  return (
    <Section title="Transfers and assigned shares" aside="assigned values act in the story of their level">
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th>Line</th>
              <th>Level</th>
              <th>Wall</th>
              <th>Case</th>
              {heads.map(({ text, unit }) => (
                <th key={text} className="num">
                  {text}
                  <span className="u">{unit}</span>
                </th>
              ))}
              <th className="num">
                Share<span className="u">of story</span>
              </th>
              <th className="pl-3!">Reason</th>
            </tr>
          </thead>
          <tbody>
            {transferred.map((one) => (
              <tr key={`arrives ${one.wall} ${one.case} ${one.variant}`}>
                <th scope="row" className="font-normal">
                  arrives on the floor
                </th>
                <td>{one.level}</td>
                <td className="font-medium">{one.wall}</td>
                <td>{one.case}</td>
                <td className="num">{formatForce(one.axial)}</td>
                <td className="num">{formatForce(one.shear)}</td>
                <td className="num">{formatMoment(one.moment)}</td>
                <td className="num">–</td>
                <td className="pl-3! text-graphite">the wall starts above the base</td>
              </tr>
            ))}
            {overrides.map((one, index) => (
              <tr key={`${one.kind} ${one.level} ${one.wall} ${one.case ?? ''} ${index}`}>
                <th scope="row" className="font-normal">
                  {one.kind === 'transfer' ? 'transfer assigned' : 'share assigned'}
                </th>
                <td>{one.level}</td>
                <td className="font-medium">{one.wall}</td>
                <td>{one.case ?? 'every case'}</td>
                <td className="num">{print(one.axial, formatForce)}</td>
                <td className="num">{print(one.shear, formatForce)}</td>
                <td className="num">{print(one.moment, formatMoment)}</td>
                <td className="num">{print(one.share, formatShare)}</td>
                <td className="pl-3! whitespace-normal!">{one.reason}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Section>
  );
}
