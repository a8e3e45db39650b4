import type { ReactElement, ReactNode } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultBalance } from '#shared/contracts/result';
import type { UnitSystem } from '#shared/engineering/input';
import { formatForce, formatMoment } from '#shared/format/force';
import { minusSign } from '#shared/format/number';

import { closedResidual } from '../../app/balanceInView.ts';
import { Section } from '../../components/ui/Section.tsx';

type Line = ResultBalance['lines'][number]['line'];

const names: Readonly<Record<Line, string>> = {
  'force x': 'Force x',
  'force y': 'Force y',
  torque: 'Torque about the origin',
  'overturning x': 'Overturning by forces in x',
  'overturning y': 'Overturning by forces in y',
  vertical: 'Vertical',
  'transfers x': 'Transfers assigned, x',
  'transfers y': 'Transfers assigned, y',
  'torque left open': 'Torque left open by shares',
  'sideways x': 'Sideways part, x',
  'sideways y': 'Sideways part, y',
};

export interface BalanceTableProps {
  /** of the case in view, and of every gravity case: the four lines of a story */
  balances: readonly ResultBalance[];
  title: string;
  units: UnitSystem;
  children?: ReactNode;
}

/** Applied against resisted at the story: force, torque, overturning and vertical, with the residual of the whole. */
export function BalanceTable({ balances, title, units, children }: BalanceTableProps): ReactElement {
  const residual = balances.reduce((worst, one) => Math.max(worst, Math.abs(one.residual)), 0);
  const closed = residual <= closedResidual;
  const lines = balances.flatMap((balance) =>
    balance.lines.map((one) => ({
      ...one,
      name: one.line === 'vertical' ? `Vertical, ${balance.case}` : names[one.line],
    })),
  );
  return (
    <Section title={title} aside="applied against the sum over the walls">
      <table className="gw-table">
        <thead>
          <tr>
            <th>Line</th>
            <th className="num">Applied</th>
            <th className="num">Resisted</th>
            <th className="num">Difference</th>
            <th className="pl-3">Unit</th>
          </tr>
        </thead>
        <tbody>
          {lines.map(({ name, line, applied, resisted }) => {
            const isMoment = line === 'torque' || line.startsWith('overturning');
            const print = isMoment ? formatMoment : formatForce;
            return (
              <tr key={name}>
                <th scope="row" className="font-normal">
                  {name}
                </th>
                <td className="num">{print(applied)}</td>
                <td className="num">{print(resisted)}</td>
                <td className="num">{sayResidual(resisted - applied)}</td>
                <td className="pl-3 text-graphite">{unitLabels[isMoment ? 'moment' : 'force'][units]}</td>
              </tr>
            );
          })}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row" colSpan={3}>
              Residual
            </th>
            <td className={`num ${closed ? '' : 'gw-problem text-oxide'}`}>{sayResidual(residual)}</td>
            <td className="pl-3 font-normal text-graphite">{closed ? 'closed' : 'broken'}</td>
          </tr>
        </tfoot>
      </table>
      <p className="note mt-2">
        Residual: the largest difference over the larger of the action and the sum of magnitudes; closed below 1e−9.
      </p>
      {children}
    </Section>
  );
}

/** A difference that is rounding reads in powers of ten, not as a row of zeros. */
export const sayResidual = (value: number): string =>
  value === 0 ? '0.0' : value.toExponential(1).replaceAll('-', minusSign);
