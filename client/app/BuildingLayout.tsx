import { Suspense } from 'react';
import { Link, Outlet } from 'react-router-dom';

import type { BuildingResource } from '#shared/contracts/buildings';

import { useBuilding } from '../data/queries.ts';
import { BuildingNav } from './BuildingNav.tsx';
import { ErrorState } from './ErrorState.tsx';
import { Foot } from './Foot.tsx';
import { paths } from './paths.ts';
import { Strip } from './Strip.tsx';
import { useBuildingId } from './useBuildingId.ts';
import { usePageTitle } from './usePageTitle.ts';

const codeNames: Readonly<Record<BuildingResource['code'], string>> = {
  'aci318-19': 'ACI 318-19',
  'aci318-14': 'ACI 318-14',
};

const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

function Cell({ name, value, optional = false }: { name: string; value: string; optional?: boolean }) {
  return (
    <div className={`gw-cell ${optional ? 'gw-optional' : ''}`}>
      <b>{name}</b>
      <span>{value}</span>
    </div>
  );
}

/** Strip of one building and the page in it; what the person may not see is said here, before any page asks for figures. */
export function BuildingLayout() {
  const id = useBuildingId();
  const building = useBuilding(id);
  usePageTitle(building.data?.name);
  if (building.isError) {
    return (
      <div className="gw-frame gw-frame-wide">
        <Strip />
        <main className="gw-sheet">
          <ErrorState error={building.error} place="Building" onRetry={() => void building.refetch()} wholePage />
        </main>
        <Foot keys={[]} />
      </div>
    );
  }
  const { data } = building;
  return (
    <div className="gw-frame" data-units={data?.units}>
      <Strip>
        <Link className="gw-cell" to={paths.inputs(id, 'settings')}>
          <b>{data === undefined ? 'Building' : `Building ${data.number}`}</b>
          <span>{data?.name ?? ' '}</span>
        </Link>
        <BuildingNav buildingId={id} />
        <Cell name="State" value={data === undefined ? '' : capital(data.state)} />
        <Cell name="Code" value={data === undefined ? '' : codeNames[data.code]} optional />
        <Cell name="Units" value={data === undefined ? '' : data.units.toUpperCase()} optional />
      </Strip>
      {data === undefined ? null : (
        <Suspense>
          <Outlet />
        </Suspense>
      )}
    </div>
  );
}
