import type { ReactElement } from 'react';
import { Link, useLocation } from 'react-router-dom';

import type { ResultDocument } from '#shared/contracts/result';

import { paths } from '../../app/paths.ts';
import { carriedSearch } from '../../app/useChoice.ts';
import { weighWarnings } from '../../components/warnings/heldRows.ts';
import { warningsAnchor } from '../../components/warnings/WarningList.tsx';

export interface WeighLinkProps {
  buildingId: string;
  document: ResultDocument;
}

/** How many points there are to weigh, and the way to them. */
export function WeighLink({ buildingId, document }: WeighLinkProps): ReactElement | null {
  const { search } = useLocation();
  const count = weighWarnings(document).filter(({ warning }) => !warning.settled).length;
  if (count === 0) return null;
  return (
    <Link
      className="inline-flex min-h-[24px] items-center whitespace-nowrap text-ink underline decoration-line underline-offset-[3px] hover:decoration-ink"
      to={`${paths.distribution(buildingId)}${carriedSearch(search)}#${warningsAnchor}`}
    >
      {count === 1 ? '1 point to weigh' : `${count} points to weigh`}
    </Link>
  );
}
