import { useQueryClient } from '@tanstack/react-query';
import type { ReactElement, ReactNode } from 'react';
import { Link } from 'react-router-dom';

import type { ResultDocument } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';

import { ErrorState } from '../../app/ErrorState.tsx';
import { PageFrame } from '../../app/PageFrame.tsx';
import { paths } from '../../app/paths.ts';
import { keys } from '../../data/keys.ts';
import { useResults, useTable } from '../../data/queries.ts';
import { StateNote } from '../ui/StateNote.tsx';
import { useLate } from '../ui/useLate.ts';

export interface ResultGateProps {
  buildingId: string;
  /** name of the page */
  page: string;
  children: (document: ResultDocument, walls: TableResource<'walls'>) => ReactNode;
}

/** Figures where they stand; else what is missing, what does not fit together, or what the server said. */
export function ResultGate({ buildingId, page, children }: ResultGateProps): ReactElement {
  const client = useQueryClient();
  const results = useResults(buildingId);
  const levels = useTable(buildingId, 'levels');
  const walls = useTable(buildingId, 'walls');
  const slow = useLate(results.isPending);
  const empty = levels.data?.rows.length === 0 || walls.data?.rows.length === 0;

  if (!results.isError && results.data && walls.data && !empty) return <>{children(results.data, walls.data)}</>;

  const error = results.error ?? walls.error ?? levels.error;
  return (
    <PageFrame title={page}>
      {empty ? (
        <NothingYet buildingId={buildingId} page={page} missing={levels.data?.rows.length === 0 ? 'levels' : 'walls'} />
      ) : error ? (
        <ErrorState
          error={error}
          place={page}
          buildingId={buildingId}
          onRetry={() => void client.invalidateQueries({ queryKey: keys.building(buildingId) })}
        />
      ) : slow ? (
        <StateNote art="filling" place={`${page}, computing`} title="Computing the building">
          <p>Shares, takedown and schedule follow in a moment. Nothing has to be done.</p>
        </StateNote>
      ) : (
        <p className="sr-only" role="status">
          Computing the building
        </p>
      )}
    </PageFrame>
  );
}

function NothingYet({ buildingId, page, missing }: { buildingId: string; page: string; missing: 'levels' | 'walls' }) {
  return (
    <StateNote
      art="empty"
      place={`${page}, no ${missing} yet`}
      title={`No ${missing} yet`}
      actions={
        <Link className="gw-button gw-button-primary" to={paths.inputs(buildingId, missing)}>
          Go to {missing}
        </Link>
      }
    >
      <p>
        {missing === 'levels'
          ? 'Figures start from levels, walls and forces. Bring the levels first: one row a level, from the top down.'
          : 'The levels stand. Bring the walls next: one row a wall, with its ends in plan, thickness and levels.'}
      </p>
    </StateNote>
  );
}
