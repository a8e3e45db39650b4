import type { ReactElement } from 'react';

import type { Warning } from '#shared/engineering/input';
import { formatDrift } from '#shared/format/drift';
import { formatNumber } from '#shared/format/number';
import { formatRatio } from '#shared/format/ratio';

import { Section } from '../../components/ui/Section.tsx';
import { torsionClass, type DriftLimit, type LevelDrift } from './levelDrifts.ts';

export interface DriftTableProps {
  rows: readonly LevelDrift[];
  total: DriftLimit | null;
  /** case and variant in words */
  caseText: string;
  warnings: readonly Warning[];
  chosenLevel: string;
  onChooseLevel: (level: string) => void;
}

const print = (value: number | null, format: (value: number) => string): string =>
  value === null ? '–' : format(value);

/** Drift and irregularity of every level; where they can't be made, why. */
export function DriftTable(props: DriftTableProps): ReactElement {
  const { rows, total, caseText, warnings, chosenLevel, onChooseLevel } = props;
  const missing = warnings.find((one) => one.code === 'drift-not-available');
  if (rows.every((row) => row.edge === null)) return <NoDrift message={missing?.message} />;
  return (
    <Section
      title="Drift and torsion by level"
      aside={`${caseText}, from the whole-height solution; elastic, of the story height`}
    >
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th>Level</th>
              <th className="num">
                Drift x<span className="u">at the point</span>
              </th>
              <th className="num">
                Drift y<span className="u">at the point</span>
              </th>
              <th className="num">
                Edge<span className="u">larger</span>
              </th>
              <th className="num">
                Torsion<span className="u">ratio</span>
              </th>
              <th className="pl-3!">
                Class<span className="u">of torsion</span>
              </th>
              <th className="num">
                Ax<span className="u">one pass</span>
              </th>
              <th className="num">
                Stability<span className="u">θ</span>
              </th>
              <LimitHead text="Seismic" note="Cd/Ie" />
              <LimitHead text="Wind" note="service" />
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
                <td className="num">{print(row.x, formatDrift)}</td>
                <td className="num">{print(row.y, formatDrift)}</td>
                <td className="num">{print(row.edge, formatDrift)}</td>
                <td className="num">{print(row.torsionRatio, (ratio) => formatNumber(ratio, 2))}</td>
                <td className="pl-3! text-graphite">{print(row.torsionRatio, torsionClass)}</td>
                <td className="num">{print(row.ax, (ax) => formatNumber(ax, 2))}</td>
                <td className="num">{print(row.theta, (theta) => formatNumber(theta, 3))}</td>
                <LimitCells limit={row.seismic} />
                <LimitCells limit={row.wind} />
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="note mt-2 max-w-[92ch]">
        Seismic and wind: the worst case and variant against the limit, whatever case is in view. Torsion ratio and Ax
        are asked with accidental eccentricity; stability where floor gravity is given for every level.
        {total === null
          ? ''
          : ` Total wind drift ${formatDrift(total.demand)} of ${formatDrift(total.limit)}, ${total.governs}: ${sayLimit(total)}.`}
      </p>
    </Section>
  );
}

/** Drift is said to be missing rather than shown as zero. */
function NoDrift({ message }: { message: string | undefined }): ReactElement {
  return (
    <Section title="Drift">
      <p className="mt-2 font-medium">Drift: not available</p>
      <p className="mt-1 max-w-[68ch] text-data text-graphite">
        {message ??
          'Drift, torsion ratio and stability come only from the solution over the whole height of the building.'}
      </p>
      <p className="mt-1 max-w-[68ch] text-data text-graphite">
        Sharing each story by relative rigidity gives shares of force and no displacement.
      </p>
    </Section>
  );
}

const LimitHead = ({ text, note }: { text: string; note: string }): ReactElement => (
  <>
    <th className="num">
      {text}
      <span className="u">{note}</span>
    </th>
    <th className="num">
      Limit<span className="u">{text.toLowerCase()}</span>
    </th>
    <th className="num">
      Ratio<span className="u">{text.toLowerCase()}</span>
    </th>
  </>
);

const sayLimit = ({ ratio, ok }: DriftLimit): string => `${formatRatio(ratio)}${ok ? '' : ' over'}`;

function LimitCells({ limit }: { limit: DriftLimit | null }): ReactElement {
  if (limit === null)
    return (
      <>
        <td className="num">–</td>
        <td className="num">–</td>
        <td className="num">–</td>
      </>
    );
  return (
    <>
      <td className="num" title={limit.governs}>
        {formatDrift(limit.demand)}
      </td>
      <td className="num text-graphite">{formatDrift(limit.limit)}</td>
      <td className={`num ${limit.ok ? '' : 'gw-problem font-semibold text-oxide'}`}>{sayLimit(limit)}</td>
    </>
  );
}
