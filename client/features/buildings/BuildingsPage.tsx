import { useEffect, useRef, useState, type KeyboardEvent } from 'react';
import { useNavigate } from 'react-router-dom';

import type { BuildingListRow } from '#shared/contracts/buildings';

import { ErrorState } from '../../app/ErrorState.tsx';
import { Foot } from '../../app/Foot.tsx';
import { paths } from '../../app/paths.ts';
import { Strip } from '../../app/Strip.tsx';
import { useCanEdit } from '../../app/useCanEdit.ts';
import { usePageTitle } from '../../app/usePageTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { StateNote } from '../../components/ui/StateNote.tsx';
import { useLate } from '../../components/ui/useLate.ts';
import { useBuildings, useSession } from '../../data/queries.ts';
import { BuildingRow } from './BuildingRow.tsx';
import { NewBuildingDialog } from './NewBuildingDialog.tsx';

const keys = [
  { keys: ['↑', '↓'], does: 'walk' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['/'], does: 'find' },
];

function found(rows: readonly BuildingListRow[], wanted: string): readonly BuildingListRow[] {
  const words = wanted.trim().toLowerCase();
  const list = rows.filter((row) => `${row.name} ${row.number}`.toLowerCase().includes(words));
  return [...list].sort((a, b) => (a.changedAt < b.changedAt ? 1 : a.changedAt > b.changedAt ? -1 : 0));
}

/** Up and Down walk the names of the list. */
function walk(event: KeyboardEvent<HTMLElement>): void {
  if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp') return;
  const links = [...event.currentTarget.querySelectorAll<HTMLElement>('a.gw-building')];
  const at = links.findIndex((link) => link === document.activeElement);
  const next = links[at < 0 ? 0 : at + (event.key === 'ArrowDown' ? 1 : -1)];
  if (next === undefined) return;
  event.preventDefault();
  next.focus();
}

export function BuildingsPage() {
  usePageTitle('Buildings');
  const buildings = useBuildings();
  const session = useSession();
  const canEdit = useCanEdit();
  const navigate = useNavigate();
  const [wanted, setWanted] = useState('');
  const [creating, setCreating] = useState(false);
  const [now] = useState(() => new Date());
  const finder = useRef<HTMLInputElement>(null);
  const late = useLate(buildings.isPending);

  useEffect(() => {
    const find = (event: globalThis.KeyboardEvent) => {
      if (event.key !== '/' || event.target instanceof HTMLInputElement) return;
      event.preventDefault();
      finder.current?.focus();
    };
    document.addEventListener('keydown', find);
    return () => document.removeEventListener('keydown', find);
  }, []);

  const all = buildings.data ?? [];
  const shown = found(all, wanted);
  const drafter = session.data?.person.role === 'drafter';
  return (
    <div className="gw-frame gw-frame-wide">
      <Strip>
        <div className="flex-1" />
        <div className="gw-cell">
          <b>Office</b>
          <span>{session.data?.office.name}</span>
        </div>
      </Strip>
      <main className="gw-sheet px-[40px]!" onKeyDown={walk}>
        <div className="gw-head px-[0]! pt-[20px]!">
          <div>
            <h1 className="gw-page-name">Buildings</h1>
            <div className="gw-sub">
              {all.length === 0 ? null : `${shown.length} of ${all.length}, last changed first`}
            </div>
          </div>
          <div className="gw-acts">
            {all.length === 0 ? null : (
              <input
                ref={finder}
                type="search"
                className="gw-input gw-input-low w-[220px]!"
                aria-label="Find a building"
                placeholder="Find by name or number"
                value={wanted}
                onChange={(event) => setWanted(event.target.value)}
              />
            )}
            {canEdit ? (
              <Button look="primary" onClick={() => setCreating(true)}>
                New building
              </Button>
            ) : null}
          </div>
        </div>
        {buildings.isError ? (
          <ErrorState error={buildings.error} place="Buildings" onRetry={() => void buildings.refetch()} />
        ) : buildings.isPending ? (
          late ? (
            <StateNote art="filling" place="Buildings, loading" title="Fetching the list">
              <p>The server has not answered yet.</p>
            </StateNote>
          ) : null
        ) : all.length === 0 ? (
          <StateNote
            art={drafter ? 'closed' : 'empty'}
            place={`Buildings, ${drafter ? 'none issued' : 'none yet'}`}
            title={drafter ? 'No revision has been issued yet' : 'No buildings yet'}
          >
            <p>
              {drafter
                ? 'Drafters see issued revisions. A building stands here once its first revision is issued; work in progress is not shown.'
                : canEdit
                  ? 'Start with a name and the units. Levels, walls, forces and gravity follow as tables, uploaded or typed.'
                  : 'An engineer of the office sets buildings up; each stands here from then on.'}
            </p>
          </StateNote>
        ) : (
          <table className="gw-table" aria-label="Buildings">
            <thead>
              <tr>
                <th>Elevation</th>
                <th>Building</th>
                <th className="num">Stories</th>
                <th className="num">Height</th>
                <th className="num">Wall lines</th>
                <th className="pl-6!">State</th>
                <th>Code</th>
                <th>Units</th>
                <th>Last changed</th>
              </tr>
            </thead>
            <tbody>
              {shown.map((building) => (
                <BuildingRow key={building.id} building={building} now={now} />
              ))}
              {shown.length === 0 ? (
                <tr>
                  <td colSpan={9} className="py-4! text-graphite">
                    No name or number holds “{wanted}”.
                  </td>
                </tr>
              ) : null}
            </tbody>
          </table>
        )}
        {shown.length === 0 ? null : (
          <p className="note mt-3">
            Elevations seen along y, at 1/2 px a foot where they fit, heights and widths to the same scale.
          </p>
        )}
      </main>
      <Foot keys={all.length === 0 ? [] : keys} />
      {creating ? (
        <NewBuildingDialog
          onClose={() => setCreating(false)}
          onCreated={(id) => void navigate(paths.inputs(id, 'levels'))}
        />
      ) : null}
    </div>
  );
}
