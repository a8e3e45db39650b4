import { Link } from 'react-router-dom';

import type { BuildingListRow, BuildingState } from '#shared/contracts/buildings';

import { paths } from '../../app/paths.ts';
import { elevationView } from '../../data/elevationView.ts';
import { useTable } from '../../data/queries.ts';
import { sayWhen } from './sayWhen.ts';
import { SmallElevation } from './SmallElevation.tsx';

const codeNames: Readonly<Record<string, string>> = { 'aci318-19': 'ACI 318-19', 'aci318-14': 'ACI 318-14' };

function StateWord({ state }: { readonly state: BuildingState }) {
  if (state !== 'checked') return <>{state === 'in progress' ? 'In progress' : 'Ready for check'}</>;
  return (
    <span className="inline-flex items-center gap-1 font-medium text-lichen">
      <svg width={12} height={12} viewBox="0 0 12 12" aria-hidden="true">
        <path d="M1.5 6.5l3 3l6-7" fill="none" stroke="currentColor" strokeWidth={1.75} />
      </svg>
      Checked
    </span>
  );
}

/** One building of the list, with its elevation drawn from the levels and walls that are stored. */
export function BuildingRow({ building, now }: { readonly building: BuildingListRow; readonly now: Date }) {
  const levels = useTable(building.id, 'levels');
  const walls = useTable(building.id, 'walls');
  const view =
    levels.data === undefined || levels.data.rows.length === 0
      ? null
      : elevationView(levels.data.rows, walls.data?.rows ?? []);
  return (
    <tr className="relative">
      <td className="w-[170px] pl-2!">
        {view === null ? (
          <span className="note">no levels yet</span>
        ) : (
          <SmallElevation view={view} units={building.units} />
        )}
      </td>
      <td>
        <Link className="gw-building block text-head font-semibold hover:underline" to={paths.building(building.id)}>
          {building.name}
        </Link>
        <span className="note">{building.number === '' ? 'no number' : building.number}</span>
      </td>
      <td className="num">{building.levels}</td>
      <td className="num">
        {view === null ? '–' : view.height.toFixed(building.units === 'us' ? 1 : 2)}
        <span className="note block">{building.units === 'us' ? 'ft' : 'm'}</span>
      </td>
      <td className="num">{building.walls}</td>
      <td className="pl-6!">
        <StateWord state={building.state} />
      </td>
      <td>{codeNames[building.code] ?? building.code}</td>
      <td>{building.units.toUpperCase()}</td>
      <td>
        {sayWhen(building.changedAt, now)}
        <span className="note block">{building.changedBy ?? '–'}</span>
      </td>
    </tr>
  );
}
