import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';

import type { BuildingResource } from '#shared/contracts/buildings';

import { paths } from '../../app/paths.ts';
import { Section } from '../../components/ui/Section.tsx';
import { countedCombinations, type LateralCase } from './countedCombinations.ts';

export interface CombinationsInForceProps {
  readonly building: BuildingResource;
  readonly cases: readonly LateralCase[];
}

const count = (value: number): string => value.toLocaleString('en-US');

/** The combinations that walls are designed for while the building brings none of its own. */
export function CombinationsInForce({ building, cases }: CombinationsInForceProps): ReactElement {
  const rows = countedCombinations(building, cases);
  const total = rows.reduce((sum, row) => sum + row.count, 0);
  return (
    <Section title="Combinations in force" aside="from the load standard in the settings">
      <table className="gw-table">
        <thead>
          <tr>
            <th>Name</th>
            <th>Expression</th>
            <th className="num">
              Load states<span className="u">cases, ±e, signs</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.name}>
              <th scope="row" className="font-medium">
                {row.name}
              </th>
              <td className="mono">{row.expression}</td>
              <td className="num">{count(row.count)}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row" colSpan={2}>
              All
            </th>
            <td className="num">{count(total)}</td>
          </tr>
        </tfoot>
      </table>
      <p className="note mt-2 max-w-[92ch]">
        SDS {building.sds}, rho {building.rho}, f for live load {building.liveFactor}: change them in{' '}
        <Link className="underline underline-offset-[3px]" to={paths.inputs(building.id, 'settings')}>
          Settings
        </Link>
        . {cases.length === 0 ? 'There are no lateral cases yet. ' : ''}Rows of your own take the place of all of these.
      </p>
    </Section>
  );
}
