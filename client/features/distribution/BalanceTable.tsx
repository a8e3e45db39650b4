import type { ReactElement, ReactNode } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultBalance } from '#shared/contracts/result';
import type { UnitSystem } from '#shared/engineering/input';
import { formatForce, formatMoment } from '#shared/format/force';
import { minusSign } from '#shared/format/number';

import { closedResidual } from '../../app/balanceInView.ts';
import type { ShareSum } from '../../app/shareSums.ts';
import { Section } from '../../components/ui/Section.tsx';
import type { BasisResidual } from './storyBalances.ts';

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
  /** of every basis; the one in view is told line by line */
  residuals: readonly BasisResidual[];
  /** shares that do not add up to what is resisted */
  lost: ShareSum | null;
  title: string;
  units: UnitSystem;
  children?: ReactNode;
}

/** lines that stand beside the balance: nothing has to close in them */
const informs = (line: Line): boolean =>
  line.startsWith('transfers') || line.startsWith('sideways') || line === 'torque left open';

/** Applied against resisted at the story: force, torque, overturning and vertical, with the residual of every basis. */
export function BalanceTable({ balances, residuals, lost, title, units, children }: BalanceTableProps): ReactElement {
  const broken = residuals.filter((one) => one.residual > closedResidual);
  const lines = balances.flatMap((balance) =>
    balance.lines.map((one) => ({
      ...one,
      closed: balance.residual <= closedResidual,
      name: one.line === 'vertical' ? `Vertical, ${balance.case}` : names[one.line],
    })),
  );
  return (
    <Section title={title} aside="applied against the sum over the walls">
      {broken.length === 0 && lost === null ? null : (
        <p className="gw-problem mt-2 font-semibold text-oxide" role="alert">
          {sayBroken(broken, lost, units)}
        </p>
      )}
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
          {lines.map(({ name, line, applied, resisted, closed }) => {
            const isMoment = line.startsWith('torque') || line.startsWith('overturning');
            const print = isMoment ? formatMoment : formatForce;
            return (
              <tr key={name}>
                <th scope="row" className="font-normal">
                  {name}
                </th>
                <td className="num">{print(applied)}</td>
                <td className="num">{informs(line) ? '–' : print(resisted)}</td>
                <td className="num">{informs(line) ? '–' : closed ? print(0) : sayResidual(resisted - applied)}</td>
                <td className="pl-3 text-graphite">{unitLabels[isMoment ? 'moment' : 'force'][units]}</td>
              </tr>
            );
          })}
        </tbody>
        <tfoot>
          {residuals.map(({ basis, residual }) => (
            <tr key={basis}>
              <th scope="row" colSpan={3}>
                Residual, {basis}
              </th>
              <td className={`num ${residual <= closedResidual ? '' : 'gw-problem text-oxide'}`}>
                {sayResidual(residual)}
              </td>
              <td className="pl-3 font-normal text-graphite">{residual <= closedResidual ? 'closed' : 'broken'}</td>
            </tr>
          ))}
        </tfoot>
      </table>
      <p className="note mt-2">
        Residual: the largest difference over the larger of the action and the sum of magnitudes; closed below 1e−9.
        {lines.some(({ line }) => informs(line)) ? ' A line without a difference stands beside the balance.' : ''}
      </p>
      {children}
    </Section>
  );
}

function sayBroken(broken: readonly BasisResidual[], lost: ShareSum | null, units: UnitSystem): string {
  const sentences = broken.map((one) => `${one.basis} leaves ${sayResidual(one.residual)} open`);
  if (lost !== null)
    sentences.push(
      `${lost.basis} shares at ${lost.level} add up to ${formatForce(lost.sum)} in ${lost.direction}, resisted are ${formatForce(lost.resisted)} ${unitLabels.force[units]}`,
    );
  return `Balance broken: ${sentences.join('; ')}. A load is lost on the way; do not use the figures of this case.`;
}

/** A residual reads in powers of ten, not as a row of zeros. */
export const sayResidual = (value: number): string =>
  value === 0 ? '0.0' : value.toExponential(1).replaceAll('-', minusSign);
