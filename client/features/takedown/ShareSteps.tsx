import type { ReactElement } from 'react';

import type { UnitSystem } from '#shared/engineering/input';
import { unitLabels } from '#shared/contracts/quantities';
import { formatForce } from '#shared/format/force';

import type { ShareStep } from './shareSteps.ts';

export interface ShareStepsProps {
  title: string;
  steps: readonly ShareStep[];
  units: UnitSystem;
}

/** A wall's shear taken apart: from the story shear to what the wall carries. */
export function ShareSteps({ title, steps, units }: ShareStepsProps): ReactElement {
  return (
    <section aria-label={title} className="mt-4">
      <h3 className="border-b border-ink pb-[3px]">{title}</h3>
      <table className="gw-table">
        <tbody>
          {steps.map((step, index) => (
            <tr key={step.text}>
              <th scope="row" className={index === steps.length - 1 ? 'font-semibold' : 'font-normal'}>
                {step.text}
              </th>
              <td className="num font-medium">
                {step.added && step.value >= 0 ? '+' : ''}
                {formatForce(step.value)} {index === steps.length - 1 ? unitLabels.force[units] : ''}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
