import { NavLink, useLocation } from 'react-router-dom';

import { buildingPages, paths, type BuildingPage } from './paths.ts';
import { carriedSearch } from './useChoice.ts';

const names: Readonly<Record<BuildingPage, string>> = {
  inputs: 'Inputs',
  distribution: 'Distribution',
  takedown: 'Takedown',
  schedule: 'Schedule',
};

/** The pages of a building; story, wall and case go along. */
export function BuildingNav({ buildingId }: { readonly buildingId: string }) {
  const search = carriedSearch(useLocation().search);
  return (
    <nav className="gw-nav" aria-label="Building">
      {buildingPages.map((page) => (
        <NavLink key={page} to={`${paths.page(buildingId, page)}${search}`}>
          {names[page]}
        </NavLink>
      ))}
    </nav>
  );
}
